using CaptureZone.Outputs;

namespace CaptureZone.Tests.Outputs;

public sealed class SampleReportTests
{
    [Fact]
    public void The_samples_polygons_are_valid_and_nested()
    {
        Report sample = SampleReport.Create();
        foreach (var well in sample.Answers.Wells.Where(well => well.Zone is not null))
        {
            Assert.True(well.Zone!.Polygon.IsValid);
            Assert.True(well.Zone.InExtent.IsValid && !well.Zone.InExtent.IsEmpty);
            Assert.Equal(3, well.TravelTimeZones.Length);
            Assert.All(well.TravelTimeZones, zone => Assert.True(zone.Polygon.IsValid && zone.Area > 0));
            Assert.True(well.TravelTimeZones[1].Area > well.TravelTimeZones[0].Area);
        }

        Assert.True(sample.Answers.ContainmentZone.IsValid);
        Assert.All(sample.Answers.Questions.Plumes, plume => Assert.True(plume.Outline.IsValid));
        Assert.True(sample.Answers.Contours.Length > 8);
        Assert.DoesNotContain(sample.Answers.Arrows, arrow => !double.IsFinite(arrow.Discharge.Real));
    }
}
