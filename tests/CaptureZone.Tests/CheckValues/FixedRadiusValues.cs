using System.Numerics;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// The calculated fixed radius sqrt(Q t / (pi n H)) is the travel-time zone of a lone well without regional flow. Asked of the
/// engine in each source's own units.
/// </summary>
public sealed class FixedRadiusValues
{
    private const double CubicFeetPerGallon = 231.0 / 1728;
    private const double MinutesPerDay = 1440;

    /// <summary>
    /// Case 5a, from memory (EPA 440/6-87-010, 1987, example of the calculated fixed radius; its arithmetic closes): 694.4 gpm, n
    /// 0.2, 300 ft, 5 yr; printed 1138 ft, recomputed 1137.67 ft from its 48 793 668 ft3/yr, else 1137.63 ft in years of 365 d and
    /// 1138.02 ft in years of 365.25 d. Tolerance 1 ft to the print.
    /// </summary>
    [Theory]
    [InlineData(48_793_668.0 / 365, 365, 1137.67)]
    [InlineData(694.4 * MinutesPerDay * CubicFeetPerGallon, 365, 1137.63)]
    [InlineData(694.4 * MinutesPerDay * CubicFeetPerGallon, 365.25, 1138.02)]
    public void An_example_of_the_guidelines_comes_out(double rate, double daysPerYear, double radius)
    {
        double found = RadiusAfter(5 * daysPerYear, rate, 0.2, 300);
        Assert.Equal(radius, found, 5e-3);
        Assert.Equal(1138, found, 1.0);
    }

    /// <summary>
    /// Case 5b, published formula r = sqrt(Q t / (4524 n H)) with t in minutes, seen (35 Ill. Adm. Code 671, appendix A), example computed:
    /// 50 000 ft3/d, 2 628 000 min, n 0.21, 40 ft. 4524 is 1440 pi rounded: the two radii differ by 1.2e-5.
    /// </summary>
    [Fact]
    public void A_states_form_in_minutes_comes_out()
    {
        double found = RadiusAfter(2_628_000 / MinutesPerDay, 50_000, 0.21, 40);
        AssertPrinted(1859.524, found);
        Assert.Equal(1859.502, found, 1.3e-5 * 1859.502);
    }

    /// <summary>
    /// Case 5d, computed: 1500 m3/d, 1826.25 d, n 0.2, 30 m; pi r2 n H = Q t; 1e-6 relative, the polygon's area within 0.1 %.
    /// </summary>
    [Fact]
    public void The_zone_without_regional_flow_is_the_circle_of_that_radius()
    {
        AssertPrinted(381.21957, RadiusAfter(1826.25, 1500, 0.2, 30));
        WellAnswer well = Assert.Single(LoneWell(10, 30, 0, 1500, 0.2).Answer(null, 1826.25).Wells);
        TravelTimeZone zone = Assert.Single(well.TravelTimeZones);
        Assert.Equal(456562.5, zone.Area, 1e-3 * 456562.5);
        Assert.All(
            zone.Polygon.Coordinates,
            (Coordinate at) => AssertPrinted(381.21957, Complex.Abs(new Complex(at.X, at.Y))));
    }

    private static double RadiusAfter(double time, double rate, double porosity, double thickness)
    {
        Tracer tracer = LoneWell(10, thickness, 0, rate, porosity, bore: 0.01).Tracer();
        return Complex.Abs(tracer.Trace(Complex.FromPolarCoordinates(0.01, 0.7), Sense.Upstream, time, null).At);
    }
}
