using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using CaptureZone.Zones.Plumes;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Zones;

/// <summary>What must hold for the answers of every site.</summary>
public static class Promises
{
    /// <summary>What may leak through the edges of a zone, and be missing in the water of a travel-time zone.</summary>
    private const double Thousandth = 1e-3;

    private const int PlumesPerSite = 20;

    /// <summary>Every check that the run makes of itself holds; side flow and pore volume among them.</summary>
    public static void AssertChecksHold(SiteAnswers answers)
    {
        Assert.Equal([], answers.Checks.Where(check => !check.Passed));
        foreach (WellAnswer well in answers.Wells)
        {
            Assert.InRange(well.Zone?.SideFlow ?? 0, 0, Thousandth);
            Assert.All(well.TravelTimeZones, zone => Assert.InRange(zone.PoreVolumeError, 0, Thousandth));
        }
    }

    /// <summary>No number is missing, but for the head at a stagnation point where the aquifer is dry.</summary>
    public static void AssertAllAreNumbers(SiteAnswers answers)
    {
        Assert.DoesNotContain(
            Figures.Of(answers), figure => double.IsNaN(figure.Value) && figure.Way != "answers.StagnationPoints.Head");
        Assert.All(
            answers.StagnationPoints.Where(point => double.IsNaN(point.Head)),
            point => Assert.InRange(answers.Field.FlowAt(point.At).Potential, double.NegativeInfinity, 0));
    }

    /// <summary>Every zone and travel-time zone is a valid polygon that is not empty.</summary>
    public static void AssertShapesAreValid(SiteAnswers answers)
    {
        IEnumerable<Geometry> shapes = answers.Wells
            .SelectMany(well => well.TravelTimeZones.Select(zone => zone.Polygon).Concat(well.Zone is { } zone ? [zone.Polygon] : []));
        Assert.All(shapes, shape => Assert.True(shape.IsValid && shape is Polygon or MultiPolygon && shape.Area > 0));
        Assert.All(answers.Wells.Select(well => well.Zone?.InExtent).OfType<Geometry>(), shape => Assert.True(shape.IsValid));
        Assert.True(answers.ContainmentZone.IsValid);
    }

    /// <summary>Wells at different places share no water.</summary>
    public static void AssertZonesDoNotOverlap(SiteAnswers answers, Model model)
    {
        WellAnswer[] zoned = [.. answers.Wells.Where(well => well.Zone is not null).DistinctBy(well => model.Wells[well.Well].At)];
        for (int i = 0; i < zoned.Length; i++)
        {
            for (int j = 0; j < i; j++)
            {
                Geometry a = zoned[i].Zone!.Polygon, b = zoned[j].Zone!.Polygon;
                Assert.InRange(GeometryKit.Intersection(a, b).Area, 0, 1e-12 * (a.Area + b.Area));
            }
        }
    }

    /// <summary>Water by origin sums to the rate.</summary>
    public static void AssertWaterIsAccountedFor(SiteAnswers answers, Model model)
    {
        foreach (WellAnswer well in answers.Wells)
        {
            if (well.Zone is { } zone)
            {
                double rate = model.Wells.Where(other => other.At == model.Wells[well.Well].At).Sum(other => other.Rate);
                Assert.Equal(1, zone.WaterFrom.Sum(share => share.Rate) / rate, 1e-9);
                Assert.Equal(1, zone.WaterFrom.Sum(share => share.Share), 1e-9);
                Assert.All(zone.WaterFrom, share => Assert.InRange(share.Rate, 0, rate * (1 + 1e-9)));
            }
        }
    }

    /// <summary>What topology decides about a plume, polygons confirm: captured when all of it lies in the zone, and only then.</summary>
    public static void AssertVerdictsAgree(SiteAnswers answers, Model model, int seed)
    {
        Random random = new(seed);
        FlowField field = answers.Field;
        Framing framing = Framing.Of(field, answers.Questions);
        FlowTopology topology = FlowTopology.Find(field, framing.Radius, framing.Extent, new OneWorker(), CancellationToken.None);
        bool IsChosen(Fate fate) =>
            fate.Kind == FateKind.Well && model.Wells[fate.Feature].Purpose == WellPurpose.Containment;
        for (int i = 0; i < PlumesPerSite; i++)
        {
            Plume plume = RandomSite.RandomPlume(random, i);
            bool captured = PlumeJudge.IsCaptured(topology, plume, IsChosen);
            double missing = 1 - GeometryKit.Intersection(plume.Outline, answers.ContainmentZone).Area / plume.Outline.Area;
            Assert.InRange(missing, captured ? -1e-9 : 1e-12, captured ? 1e-6 : 1);
        }
    }

    /// <summary>Two runs gave the same numbers, bit for bit.</summary>
    public static void AssertSameBits(SiteAnswers first, SiteAnswers second) =>
        Assert.Equal(
            Figures.Of(first).Select(figure => (figure.Way, BitConverter.DoubleToInt64Bits(figure.Value))),
            Figures.Of(second).Select(figure => (figure.Way, BitConverter.DoubleToInt64Bits(figure.Value))));
}
