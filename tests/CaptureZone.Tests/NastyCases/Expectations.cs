using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Sites;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using NetTopologySuite.Geometries.Utilities;

namespace CaptureZone.Tests.NastyCases;

/// <summary>
/// What must come of each site of this folder. Regional flow is 1 m2/d toward the east where a file does not say otherwise; figures
/// follow from superposition (O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989), worked out in the file's comments.
/// </summary>
internal static class Expectations
{
    /// <summary>Agreement of a zone's area in two runs, relative: its edges are chords.</summary>
    private const double SameArea = 1e-6;

    /// <summary>Agreement of places, m.</summary>
    private const double SamePlace = 1e-6;

    /// <summary>By the file's name, without its ending.</summary>
    internal static ImmutableDictionary<string, Action<SiteDocument>> ByName { get; } = new Dictionary<string, Action<SiteDocument>>
    {
        ["weak-well"] = A_stagnation_point_inside_the_screen_is_told_and_the_zone_stands,
        ["lone-well-without-flow"] = One_well_without_regional_flow_draws_on_the_whole_aquifer,
        ["several-wells-without-flow"] = Several_wells_without_regional_flow_share_the_aquifer_at_saddles,
        ["two-wells-at-one-place"] = Two_wells_at_one_place_have_the_zone_of_their_sum,
        ["plume-outside-extent"] = A_plume_outside_the_extent_is_judged_all_the_same,
        ["zero-wells"] = Without_wells_nothing_is_captured,
        ["clustered-wells"] = Wells_within_metres_share_what_one_well_would_take,
        ["double-root"] = At_the_critical_spacing_the_two_stagnation_points_are_one,
        ["saddle-connection"] = Two_equal_wells_have_zones_that_mirror_each_other,
        ["monkey-saddle"] = Three_equal_wells_meet_in_one_stagnation_point_of_multiplicity_two,
        ["doublet-in-flow"] = A_doublet_along_the_flow_goes_round_in_a_closed_zone,
        ["doublet-without-flow"] = A_doublet_without_regional_flow_is_open_and_lives_on_its_injection_well,
        ["runs-dry"] = A_water_table_that_runs_dry_has_no_head_there,
        ["dewatered"] = A_dewatered_well_is_told_its_largest_rate,
        ["well-in-plume"] = A_plume_round_its_well_is_captured,
        ["plume-on-the-edge"] = A_plume_that_touches_the_edge_is_captured_and_one_beyond_is_not,
        ["supply-well-drinks"] = A_supply_well_that_takes_plume_water_is_told_first,
        ["injection-inside-zone"] = Injected_water_inside_the_zone_is_counted,
        ["known-head-near-well"] = A_known_head_near_a_well_is_told,
        ["coordinates-small"] = A_site_about_the_origin_equals_itself_on_a_national_grid,
        ["coordinates-large"] = A_site_on_a_national_grid_keeps_its_digits,
        ["collinear-wells"] = Wells_along_the_flow_share_the_water_of_a_strip,
        ["sixty-wells"] = Sixty_wells_have_sixty_stagnation_points,
    }.ToImmutableDictionary(StringComparer.Ordinal);

    private static void A_stagnation_point_inside_the_screen_is_told_and_the_zone_stands(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal("W-1", Told(answers, FindingKind.StagnationInsideScreen).Subject);
        WellZone zone = Assert.Single(answers.Wells).Zone!;
        Assert.Equal(0.5, zone.WaterFrom.Sum(share => share.Rate), 1e-9);
        Assert.Equal(0.5, zone.WidthUpgradient!.Value, 1e-9);
    }

    private static void One_well_without_regional_flow_draws_on_the_whole_aquifer(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal("W-1", Told(answers, FindingKind.WholeAquifer).Subject);
        Assert.Empty(answers.StagnationPoints);
        WellZone zone = Assert.Single(answers.Wells).Zone!;
        AssertOpen(zone);
        Assert.Equal(answers.Extent.Area, zone.AreaInExtent, SameArea * answers.Extent.Area);
        AssertRates(zone, (FateKind.Far, 400));
    }

    private static void Several_wells_without_regional_flow_share_the_aquifer_at_saddles(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal(2, answers.StagnationPoints.Length);
        Assert.All(answers.StagnationPoints, point => Assert.Equal(StagnationKind.Saddle, point.Kind));
        Assert.All(answers.Wells, well => AssertOpen(well.Zone!));
        Assert.Equal(answers.Extent.Area, answers.Wells.Sum(well => well.Zone!.AreaInExtent), SameArea * answers.Extent.Area);
    }

    private static void Two_wells_at_one_place_have_the_zone_of_their_sum(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Finding told = Told(answers, FindingKind.WellsCoincide);
        Assert.Equal(["Deep", "Shallow"], new[] { told.Subject, told.Other }.Order(StringComparer.Ordinal));
        Assert.Single(answers.StagnationPoints);
        foreach (WellAnswer well in answers.Wells)
        {
            Assert.Equal(300, well.Zone!.WidthUpgradient!.Value, 1e-6);
            Assert.Equal(300 / (2 * Math.PI), well.Zone.StagnationDistance!.Value, SamePlace);
            AssertSameArea(answers.ContainmentZone, well.Zone.Polygon);
        }
    }

    private static void A_plume_outside_the_extent_is_judged_all_the_same(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal("Fuel", Told(answers, FindingKind.PlumeOutsideExtent).Subject);
        PlumeAnswer plume = Assert.Single(answers.Plumes);
        Assert.True(plume.Captured);
        Assert.True(plume.Margin > 0);
    }

    private static void Without_wells_nothing_is_captured(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Empty(answers.Wells);
        Assert.Empty(answers.StagnationPoints);
        PlumeAnswer plume = Assert.Single(answers.Plumes);
        Assert.False(plume.Captured);
        Assert.Equal(0, plume.CapturedFraction);
        Assert.Null(plume.Margin);
        Told(answers, FindingKind.PlumeEscapes);
    }

    private static void Wells_within_metres_share_what_one_well_would_take(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal(5, answers.StagnationPoints.Length);
        Assert.All(answers.Wells, well => AssertRates(well.Zone!, (FateKind.Far, site.Model.Wells[well.Well].Rate)));
    }

    private static void At_the_critical_spacing_the_two_stagnation_points_are_one(SiteDocument site)
    {
        // Rounding e of the numbers moves a double root by sqrt(e): some millionths of a metre.
        const double RootOfRounding = 1e-5;
        SiteAnswers answers = Run(site);
        Assert.Equal(2, answers.StagnationPoints.Sum(point => point.Multiplicity));
        Complex centre = Middle(site);
        Assert.All(answers.StagnationPoints, point => Assert.InRange(Complex.Abs(point.At - centre - 50), 0, RootOfRounding));
        Assert.All(answers.Wells, well => AssertRates(well.Zone!, (FateKind.Far, 100 * Math.PI)));
    }

    private static void Two_equal_wells_have_zones_that_mirror_each_other(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Complex centre = Middle(site);
        Assert.Equal([20, 80], answers.StagnationPoints.Select(point => Math.Round((point.At - centre).Real, 6)));
        Assert.All(answers.StagnationPoints, point => Assert.Equal(0, (point.At - centre).Imaginary, SamePlace));
        Assert.Contains(answers.Paths, path => path.Fate.Kind == FateKind.Stagnation);
        Geometry north = answers.Wells[0].Zone!.InExtent, south = answers.Wells[1].Zone!.InExtent;
        AssertSameArea(north, south);
        Geometry mirrored = new AffineTransformation().Scale(1, -1).Transform(south);
        mirrored = AffineTransformation.TranslationInstance(0, 2 * centre.Imaginary).Transform(mirrored);
        Assert.InRange(north.SymmetricDifference(mirrored).Area, 0, 1e-4 * north.Area);
    }

    private static void Three_equal_wells_meet_in_one_stagnation_point_of_multiplicity_two(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        StagnationPoint point = Assert.Single(answers.StagnationPoints);
        Assert.Equal(2, point.Multiplicity);
        Complex centre = site.Model.Wells.Aggregate(Complex.Zero, (sum, well) => sum + well.At) / 3;
        Assert.InRange(Complex.Abs(point.At - centre), 0, SamePlace);
        Assert.Equal(6, answers.Paths.Length);
        foreach (WellAnswer well in answers.Wells)
        {
            AssertOpen(well.Zone!);
            Assert.Equal(100, well.Zone!.StagnationDistance!.Value, SamePlace);
            AssertSameArea(answers.Wells[0].Zone!.Polygon, well.Zone.Polygon);
        }
    }

    private static void A_doublet_along_the_flow_goes_round_in_a_closed_zone(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        double side = Math.Sqrt(100 * 100 + 100 * 2 * 200 / (2 * Math.PI));
        Complex centre = Middle(site);
        Assert.Equal(2, answers.StagnationPoints.Length);
        Assert.Equal(-side, (answers.StagnationPoints[0].At - centre).Real, SamePlace);
        Assert.Equal(side, (answers.StagnationPoints[1].At - centre).Real, SamePlace);
        WellZone zone = answers.Wells[1].Zone!;
        Assert.False(zone.Open);
        Assert.True(zone.Area > 0);
        Assert.Equal(side - 100, zone.StagnationDistance!.Value, SamePlace);
        AssertRates(zone, (FateKind.Injection, 200));
    }

    private static void A_doublet_without_regional_flow_is_open_and_lives_on_its_injection_well(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Empty(answers.StagnationPoints);
        AssertOpen(answers.Wells[1].Zone!);
        AssertRates(answers.Wells[1].Zone!, (FateKind.Injection, 200));
    }

    private static void A_water_table_that_runs_dry_has_no_head_there(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Told(answers, FindingKind.DryInExtent);
        Assert.True(double.IsNaN(answers.Field.HeadAt(site.Frame.ToLocal(350, 0))));
        Assert.True(double.IsFinite(answers.Field.HeadAt(site.Frame.ToLocal(150, 0))));
        Assert.Contains(answers.Paths, path => path.Role == PathRole.FromPlume && path.Fate.Kind == FateKind.Dry);
        Assert.False(Assert.Single(answers.Plumes).Captured);
    }

    private static void A_dewatered_well_is_told_its_largest_rate(SiteDocument site)
    {
        DewateredException thrown = Assert.Throws<DewateredException>(() => Run(site));
        (int well, double largest) = Assert.Single(thrown.Wells);
        Assert.Equal(0, well);
        Assert.InRange(largest, 1, 4999);
        Assert.Equal(largest, Assert.Single(AtRate(0.999).Wells).LargestRate!.Value, 1e-6 * largest);
        Assert.Throws<DewateredException>(() => AtRate(1.001));

        SiteAnswers AtRate(double share)
        {
            Well pump = Assert.Single(site.Model.Wells);
            return NastyCaseTests.Run(site.Model with { Elements = [pump with { Rate = share * largest }] }, site.Questions);
        }
    }

    private static void A_plume_round_its_well_is_captured(SiteDocument site)
    {
        PlumeAnswer plume = Assert.Single(Run(site).Plumes);
        Assert.True(plume.Captured);

        // The edge is at x = y / tan(2 pi Q0 y / Q): nearest downstream of the plume's corners at y = +-20.
        Assert.Equal(20 / Math.Tan(2 * Math.PI * 20 / 400) - 20, plume.MarginDowngradient!.Value, 1e-3);
        Assert.True(plume.Arrival!.P5 > 0);
    }

    private static void A_plume_that_touches_the_edge_is_captured_and_one_beyond_is_not(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.True(answers.Plumes[0].Captured);
        Assert.Equal(0, answers.Plumes[0].Margin!.Value, 1e-3);
        Assert.False(answers.Plumes[1].Captured);

        // 1 m along the y-axis, where the edge falls by Q / (2 pi 100 Q0) = 0.64 per metre; it is nearly straight over so short a way.
        double slope = 400 / (2 * Math.PI * 100);
        Assert.Equal(-1 / Math.Sqrt(1 + slope * slope), answers.Plumes[1].Margin!.Value, 0.01);
    }

    private static void A_supply_well_that_takes_plume_water_is_told_first(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Finding first = answers.Findings[0];
        Assert.Equal((FindingKind.PlumeReachesOtherWell, "Solvent", "PW-1"), (first.Kind, first.Subject, first.Other));
        Assert.InRange(first.Value, 0.1, 0.9);
        Assert.False(answers.Plumes[0].Captured);
    }

    private static void Injected_water_inside_the_zone_is_counted(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        AssertRates(answers.Wells[0].Zone!, (FateKind.Far, 500), (FateKind.Injection, 100));
        Assert.Equal(3, answers.Wells[0].TravelTimeZones.Length);
        Assert.All(answers.Wells[0].TravelTimeZones, timed => Assert.InRange(Math.Abs(timed.PoreVolumeError), 0, 1e-3));
    }

    private static void A_known_head_near_a_well_is_told(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Finding told = Told(answers, FindingKind.KnownHeadInfluenced);
        Assert.True(told.Value > told.Limit);
        Assert.Equal(5, answers.KnownHeadDistance!.Value, 1e-9);
    }

    private static void A_site_about_the_origin_equals_itself_on_a_national_grid(SiteDocument site)
    {
        SiteAnswers near = Run(site), far = Run(NastyCaseTests.Read("coordinates-large"));
        Assert.Equal(near.Plumes[0].Margin!.Value, far.Plumes[0].Margin!.Value, 1e-5);
        foreach ((WellAnswer here, WellAnswer there) in near.Wells.Zip(far.Wells).Where(pair => pair.First.Zone is not null))
        {
            Assert.Equal(1, there.Zone!.AreaInExtent / here.Zone!.AreaInExtent, SameArea);
            Assert.All(
                here.TravelTimeZones.Zip(there.TravelTimeZones),
                pair => Assert.Equal(1, pair.Second.Area / pair.First.Area, SameArea));
        }
    }

    private static void A_site_on_a_national_grid_keeps_its_digits(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal(3, answers.StagnationPoints.Length);
        Assert.All(answers.Wells, well => Assert.InRange(Complex.Abs(site.Model.Wells[well.Well].At), 0, 3000));
    }

    private static void Wells_along_the_flow_share_the_water_of_a_strip(SiteDocument site)
    {
        SiteAnswers answers = Run(site);
        Assert.Equal(4, answers.StagnationPoints.Sum(point => point.Multiplicity));
        Assert.All(answers.Wells, well => AssertRates(well.Zone!, (FateKind.Far, site.Model.Wells[well.Well].Rate)));
        Assert.Equal(450, answers.Wells.Sum(well => well.Zone!.WidthUpgradient!.Value), 1e-6);
    }

    /// <summary>Stagnation points only: the edges of so many zones leak more than the 0.1 % of a rate that a whole run allows itself.</summary>
    private static void Sixty_wells_have_sixty_stagnation_points(SiteDocument site)
    {
        StagnationSet set = StagnationFinder.Find(FlowSystem.Assemble(site.Model).Solve());
        Assert.True(set.Complete);
        Assert.Equal(60, set.Points.Sum(point => point.Multiplicity));
        Assert.InRange(set.Residual, 0, 1e-10);
    }

    private static SiteAnswers Run(SiteDocument site) => NastyCaseTests.Run(site.Model, site.Questions);

    private static Finding Told(SiteAnswers answers, FindingKind kind) => Assert.Single(answers.Findings, finding => finding.Kind == kind);

    private static void AssertOpen(WellZone zone)
    {
        Assert.True(zone.Open);
        Assert.Null(zone.Area);
    }

    private static void AssertRates(WellZone zone, params (FateKind Source, double Rate)[] expected)
    {
        Assert.Equal(expected.Select(share => share.Source), zone.WaterFrom.Select(share => share.Source.Kind));
        Assert.All(expected.Zip(zone.WaterFrom), pair => Assert.Equal(pair.First.Rate, pair.Second.Rate, 1e-6 * pair.First.Rate));
    }

    private static void AssertSameArea(Geometry expected, Geometry actual) =>
        Assert.Equal(expected.Area, actual.Area, SameArea * expected.Area);

    /// <summary>Midway between the two wells of a site.</summary>
    private static Complex Middle(SiteDocument site) => (site.Model.Wells[0].At + site.Model.Wells[1].At) / 2;
}
