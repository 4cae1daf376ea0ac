using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Capture zones of one well in uniform flow: distance to the stagnation point, widths, and the dividing streamline
/// x = -y / tan(2 pi T i y / Q). Formulas seen (J. Kuo, <i>Practical Design Calculations for Groundwater and Soil Remediation</i>, 2nd ed.,
/// CRC Press 2014, eq. 6.3; a county file quoting EPA/600/R-08/003, 2008), from memory in D.K. Todd, <i>Groundwater Hydrology</i>, 2nd ed.
/// 1980, and I. Javandel and C.F. Tsang, Ground Water 24(5), 1986, 616.
/// </summary>
public sealed class CaptureZoneValues
{
    private const double GallonsPerCubicFoot = 1728.0 / 231;
    private const double MinutesPerDay = 1440;

    private static readonly Model Base = LoneWell(15, 20, 0.002, 600, 0.25);
    private static readonly Model Textbook = LoneWell(1, 1, 1, 86.4, 0.25);
    private static readonly Model WaterTable =
        Of(new Aquifer(25, 0, null, 0.2), new RegionalFlow(0.002, Math.PI, 20, 1000), 0.15, (0, 400));

    /// <summary>Case 1a, K 15 m/d, b 20 m, i 0.002, Q 600 m3/d: computed from the published formula; tolerance 1e-6 relative.</summary>
    [Fact]
    public void A_well_of_600_m3_per_day_in_uniform_flow_has_the_widths_of_the_formulas()
    {
        WellZone zone = ZoneOf(Base);
        AssertPrinted(159.15494, zone.StagnationDistance!.Value);
        AssertDrawn(2 * 250, zone.WidthAtWell!.Value);
        AssertPrinted(1000, zone.WidthUpgradient!.Value);
        Assert.True(zone.Open);
    }

    /// <summary>Case 1a: half the zone's width up-gradient of the well.</summary>
    [Theory]
    [InlineData(0, 250)]
    [InlineData(1000, 434.73286)]
    [InlineData(5000, 484.62204)]
    public void Its_zone_widens_up_gradient(double x, double halfWidth)
    {
        Base.Tracer().AssertEdge(new Complex(x, halfWidth), -Complex.ImaginaryOne, 1e-6 * halfWidth);
        Base.Tracer().AssertEdge(new Complex(x, -halfWidth), Complex.ImaginaryOne, 1e-6 * halfWidth);
        WellZone zone = ZoneOf(Base, new Envelope(-1000, 6000, -1000, 1000));
        AssertDrawn(halfWidth, zone.Polygon.FirstIn(new Complex(x, 900), x).Imaginary);
    }

    /// <summary>Case 1a: the dividing streamline.</summary>
    [Theory]
    [InlineData(50, -153.8842)]
    [InlineData(100, -137.6382)]
    [InlineData(200, -64.98394)]
    [InlineData(300, 97.47591)]
    [InlineData(400, 550.5528)]
    [InlineData(450, 1384.958)]
    public void Its_edge_runs_through(double y, double x)
    {
        Base.Tracer().AssertEdge(new Complex(x, y), 1, Math.Max(1e-6 * Math.Abs(x), 5e-5));
        Base.Tracer().AssertEdge(new Complex(x, -y), 1, Math.Max(1e-6 * Math.Abs(x), 5e-5));
    }

    /// <summary>
    /// Case 1c, published (rounded) and recomputed, seen (Kuo 2014, example 6.6, pp. 227-228): 50 gpm, 1000 gpd/ft2, 0.015, 80 ft; in feet.
    /// Tolerance 0.05 ft; the printed 9.6 ft is 9.5493 rounded by way of 9.55.
    /// </summary>
    [Fact]
    public void A_textbook_well_of_50_gpm_has_the_printed_widths()
    {
        Model model = LoneWell(
            1000 / GallonsPerCubicFoot, 80, 0.015, 50 * MinutesPerDay / GallonsPerCubicFoot, 0.25);
        WellZone zone = ZoneOf(model);
        Assert.Equal(9.5493, zone.StagnationDistance!.Value, 5e-5);
        Assert.Equal(9.6, zone.StagnationDistance.Value, 0.051);
        AssertDrawn(2 * 15, zone.WidthAtWell!.Value);
        AssertPrinted(2 * 30, zone.WidthUpgradient!.Value);
    }

    /// <summary>
    /// Case 1d, a published table, seen (Kuo 2014, example 6.5, p. 226; Q / (B u) = 86.4 ft inferred from it): first as computed
    /// from the formula, then as printed; tolerance to the print 0.012 ft. Its row "y = 0, x = 0.00" is the formula's 0/0, whose
    /// limit is -13.751: not repeated here.
    /// </summary>
    [Theory]
    [InlineData(0.1, -13.751, -13.74)]
    [InlineData(1, -13.727, -13.73)]
    [InlineData(5, -13.140, -13.14)]
    [InlineData(10, -11.237, -11.24)]
    [InlineData(20, -2.338, -2.34)]
    [InlineData(30, 21.006, 21.01)]
    [InlineData(40, 168.773, 168.78)]
    public void A_textbook_envelope_runs_through(double y, double computed, double printed)
    {
        Tracer tracer = Textbook.Tracer();
        tracer.AssertEdge(new Complex(computed, y), 1, 5.001e-4);
        tracer.AssertEdge(new Complex(printed, y), 1, 0.012);
    }

    /// <summary>
    /// Case 1f: X = 1.19 Q / (T i) and Y = 7.48 Q / (T i) in ft3/d, gpd/ft and ft, published coefficients, seen (35 Ill. Adm. Code 671,
    /// appendix C); example computed: 100 000 ft3/d, 50 000 gpd/ft, 0.002. Tolerance to the rounded coefficients 0.1 %.
    /// </summary>
    [Fact]
    public void A_states_rule_in_mixed_units_comes_out()
    {
        WellZone zone = ZoneOf(LoneWell(50_000 / GallonsPerCubicFoot / 100, 100, 0.002, 100_000, 0.25));
        AssertPrinted(1190.562, zone.StagnationDistance!.Value);
        AssertPrinted(7480.519, zone.WidthUpgradient!.Value);
        Assert.Equal(1190, zone.StagnationDistance.Value, 1e-3 * 1190);
        Assert.Equal(7480, zone.WidthUpgradient.Value, 1e-3 * 7480);
    }

    /// <summary>
    /// Case 3a, K 25 m/d, heads 21 and 19 m 1000 m apart, Q 400 m3/d: computed from the published formulas (S. Grubb, Ground Water 31(1),
    /// 1993, 27, doi 10.1111/j.1745-6584.1993.tb00824.x: abstract seen, formulas from memory and derived again); 1e-6 relative.
    /// </summary>
    [Fact]
    public void A_well_under_a_water_table_has_the_widths_of_the_formulas()
    {
        WellZone zone = ZoneOf(WaterTable);
        AssertPrinted(63.661977, zone.StagnationDistance!.Value);
        AssertDrawn(2 * 100, zone.WidthAtWell!.Value);
        AssertPrinted(2 * 200, zone.WidthUpgradient!.Value);
    }

    /// <summary>Case 3a: the dividing streamline.</summary>
    [Theory]
    [InlineData(50, -50)]
    [InlineData(150, 150)]
    [InlineData(180, 553.983)]
    public void The_edge_under_a_water_table_runs_through(double y, double x)
    {
        WaterTable.Tracer().AssertEdge(new Complex(x, y), 1, 1e-6 * Math.Abs(x));
        WaterTable.Tracer().AssertEdge(new Complex(x, -y), 1, 1e-6 * Math.Abs(x));
    }

    private static WellZone ZoneOf(Model model, Envelope? extent = null) => Assert.Single(model.Answer(extent).Wells).Zone!;
}
