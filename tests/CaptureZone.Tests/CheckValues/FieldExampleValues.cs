using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Flow;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>Figures of field sites and of retarded travel.</summary>
public sealed class FieldExampleValues
{
    private const double GallonsPerCubicFoot = 1728.0 / 231;

    /// <summary>
    /// Case 13h, published, seen (San Joaquin County EHD, document 453869, p. 25): 63.30 to 62.70 ft over 110 ft is 0.0055.
    /// </summary>
    [Fact]
    public void A_gradient_between_two_levels_is_as_printed()
    {
        const double Gradient = 0.0054545;
        Assert.Equal(0.0055, Gradient, 5e-5);
        FlowField field = Of(new Aquifer(10, 0, 20, 0.3), new RegionalFlow(Gradient, 0, 63.30, 0), Bore).Field();
        Assert.Equal(62.70, field.HeadAt(110), 110 * 5e-8);
    }

    /// <summary>
    /// Case 15c, inputs published, seen (San Joaquin County EHD, document 590704, p. 399, printed K 588 gpd/ft2), outputs computed: T
    /// 10 000 gpd/ft, b 17 ft, i 0.005, water at 1.12 ft/d, reach 70 ft down-gradient; Q = 2 pi r T i = 21 991.1 gpd = 15.272 gpm,
    /// half widths 219.911 and 109.956 ft, n 0.3511; 1e-6 relative or half the last digit.
    /// </summary>
    [Fact]
    public void A_fuel_sites_well_reaches_as_far_and_as_wide_as_computed()
    {
        AssertPrinted(15.272, 21991.1 / 1440, 5e-4);
        AssertPrinted(10_000.0 / 17, 588.24, 5e-3);
        const double Conductivity = 10_000 / GallonsPerCubicFoot / 17;
        WellZone zone = Assert.Single(LoneWell(Conductivity, 17, 0.005, 21991.1 / GallonsPerCubicFoot, 0.3511).Answer().Wells).Zone!;
        AssertPrinted(70, zone.StagnationDistance!.Value, 70 * 2.3e-6);
        AssertDrawn(2 * 109.956, zone.WidthAtWell!.Value);
        AssertPrinted(2 * 219.911, zone.WidthUpgradient!.Value, 1e-3);
        PathEnd day = Confined(Conductivity, 17, 0.005, 0.3511, Bore).Tracer().Trace(0, Sense.Downstream, 1, null);
        Assert.Equal(1.12, day.Length, 1.12 * 5e-5 / 0.3511);
    }

    /// <summary>
    /// Case 13j: R = 2.7; 250 m at 0.12 m/d take water 2083.333 d and the contaminant 5625 d. Computed, formula seen (an EPA training
    /// page; R.A. Freeze and J.A. Cherry, <i>Groundwater</i>, 1979, eq. 9.14, from memory). The well is so weak that its pull shows
    /// only within millimetres; 1e-6 relative.
    /// </summary>
    [Fact]
    public void A_sorbing_contaminant_takes_R_times_as_long()
    {
        const double Discharge = 0.12 * 0.3 * 10, Reach = 1e-5;
        Model model = LoneWell(3.6, 10, 0.01, 2 * Math.PI * Discharge * Reach, 0.3);
        PathEnd water = model.Tracer().Trace(250, Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(FateKind.Well, water.Fate.Kind);
        AssertPrinted(2083.333, water.Time);
        PlumeAnswer plume = PlumeOf(model, 250, Reach / 100, 2.7);
        Assert.True(plume.Captured);
        AssertPrinted(5625, plume.Arrival!.P50);
    }

    /// <summary>
    /// Case 4e, published, from memory (Freeze and Cherry 1979): the contaminant's isochrone for t is the water's for t / R. R 2.5;
    /// tau 1 of the water, X up-gradient 2.1461932 (the unit case of the isochrones).
    /// </summary>
    [Fact]
    public void A_retarded_plume_at_the_waters_isochrone_arrives_after_R_times_its_time()
    {
        Model model = LoneWell(1, 1, 1, 2 * Math.PI, 1);
        AssertPrinted(2.5, PlumeOf(model, 2.1461932, 1e-4, 2.5).Arrival!.P50);
    }

    /// <summary>The answer for a square plume.</summary>
    private static PlumeAnswer PlumeOf(Model model, Complex at, double halfSide, double retardation)
    {
        Envelope square = new(at.Real - halfSide, at.Real + halfSide, at.Imaginary - halfSide, at.Imaginary + halfSide);
        Plume plume = new("plume", (Polygon)GeometryFactory.Default.ToGeometry(square), retardation);
        Questions questions = new([plume], [], null, 1);
        return Assert.Single(SiteAnalysis.Run(model, questions, new OneWorker(), null, CancellationToken.None).Plumes);
    }
}
