using System.Numerics;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.Tracing;

/// <summary>
/// Two wells of 300 m3/d 200 m apart across the flow, 25 years: their common edge runs into a stagnation point so straight that no two
/// angles on the screen tell its two ways apart.
/// </summary>
public sealed class TwinWellTests
{
    private const double Years25 = 25 * 365.25;

    private static readonly Model Twins = Confined(15, 20, 0.002, 0.25, 0.15, (new(0, -100), 300), (new(0, 100), 300));

    private static readonly Lazy<SiteAnswers> Answers = new(() => Twins.Answer(null, Years25));

    [Fact]
    public void Each_zone_holds_what_its_well_takes()
    {
        const double Area = 300 * Years25 / (0.25 * 20);
        Assert.All(Answers.Value.Wells, well =>
        {
            TravelTimeZone zone = Assert.Single(well.TravelTimeZones);
            Assert.True(zone.Polygon.IsValid);
            Assert.Equal(Area, zone.Area, 1e-3 * Area);
            Assert.InRange(zone.PoreVolumeError, 0, 1e-3);
        });
    }

    /// <summary>0.5 % of the radius of a circle of the zone's area: by paths from a grid of places.</summary>
    [Fact]
    public void Each_outline_is_within_half_a_percent_of_where_the_paths_have_it()
    {
        Tracer tracer = Twins.Tracer();
        Envelope box = new();
        Answers.Value.Wells.ToList().ForEach(well => box.ExpandToInclude(well.TravelTimeZones[0].Polygon.EnvelopeInternal));
        box.ExpandBy(0.05 * box.Width, 0.05 * box.Height);
        const int Side = 80;
        for (int i = 0; i < Side * Side; i++)
        {
            Complex at = new(
                box.MinX + (i % Side + 0.5) / Side * box.Width, box.MinY + (Math.Floor(i / (double)Side) + 0.5) / Side * box.Height);
            PathEnd end = tracer.Trace(at, Sense.Downstream, Years25, null);
            for (int well = 0; well < 2; well++)
            {
                Geometry zone = Answers.Value.Wells[well].TravelTimeZones[0].Polygon;
                Point place = zone.Factory.CreatePoint(new Coordinate(at.Real, at.Imaginary));
                bool arrives = end.Fate == new Fate(FateKind.Well, well);
                Assert.True(
                    zone.Contains(place) == arrives || zone.Boundary.Distance(place) <= 0.005 * Math.Sqrt(zone.Area / Math.PI),
                    $"{at} of well {well}");
            }
        }
    }
}
