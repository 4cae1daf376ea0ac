using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Joint zones of equal wells on a line across the flow: factors c of the critical spacing c Q / (pi B U), and widths in Q / (B U).
/// Published, seen (J. Kuo, <i>Practical Design Calculations</i>, 2nd ed. 2014, table 6.1, p. 229; D.A. Chin, <i>Water-Quality Engineering
/// in Natural Systems</i>, 2nd ed. 2013, eqs 5.113 to 5.118), from memory in I. Javandel and C.F. Tsang, Ground Water 24(5), 1986, 616.
/// Lengths in Q / (pi B U) unless units are named.
/// </summary>
public sealed class WellLineValues
{
    /// <summary>
    /// Case 2a: c = 1 and 1.26 published, 1.2646341 computed (where the saddles are connected; the cube root of 2 in one
    /// textbook, 1.259921, is below it). Water passes between wells farther apart, and only there: at each gap a dividing
    /// streamline then goes on down-gradient, as the one in front always does. Tolerance 1e-5.
    /// </summary>
    [Theory]
    [InlineData(2, 1)]
    [InlineData(3, 1.2646341)]
    public void Water_passes_between_wells_farther_apart_than_the_critical_spacing(int wells, double critical)
    {
        Assert.Equal(1, StreamlinesOnward(wells, critical - 1e-5));
        Assert.Equal(wells == 2 ? 2 : 3, StreamlinesOnward(wells, critical + 1e-5));
    }

    /// <summary>
    /// A spacing rounded to any digit, as in tables, leaves two stagnation points so close together that they bound hardly any water: both
    /// wells' zones are what they are at the critical spacing all the same. Derived from the case before.
    /// </summary>
    [Theory]
    [InlineData(-1e-6)]
    [InlineData(-3e-7)]
    [InlineData(-1e-8)]
    [InlineData(-1e-9)]
    [InlineData(-1e-11)]
    [InlineData(-1e-13)]
    [InlineData(1e-13)]
    [InlineData(1e-11)]
    [InlineData(1e-9)]
    [InlineData(1e-8)]
    [InlineData(3e-7)]
    [InlineData(1e-6)]
    public void A_spacing_that_is_critical_but_for_its_rounding_changes_no_zone(double rounding)
    {
        SiteAnswers answers = Line(2, 1 + rounding).Answer(new Envelope(-5, 20, -10, 10));
        foreach (WellAnswer well in answers.Wells)
        {
            AssertPrinted(Math.PI, well.Zone!.WidthUpgradient!.Value);
            AssertDrawn(Math.PI / 2, well.Zone.WidthAtWell!.Value);
        }

        AssertDrawn(Math.PI, WidthAt(answers, 0));
    }

    /// <summary>Case 2b: exact for any spacing up to the critical one; of four wells the published factor is 1.2.</summary>
    [Theory]
    [InlineData(1, 1.0, 0.5, 1)]
    [InlineData(2, 0.6, 1, 2)]
    [InlineData(2, 1.0, 1, 2)]
    [InlineData(3, 0.9, 1.5, 3)]
    [InlineData(3, 1.2646341, 1.5, 3)]
    [InlineData(4, 0.9, 2, 4)]
    [InlineData(4, 1.2, 2, 4)]
    public void Joint_widths_do_not_depend_on_the_spacing(int wells, double spacing, double atWells, double farUpgradient)
    {
        Model line = Line(wells, spacing);
        AssertHalfWidth(line, 0, atWells * Math.PI / 2);
        SiteAnswers answers = line.Answer(new Envelope(-10, 40, -20, 20));
        AssertDrawn(atWells * Math.PI, WidthAt(answers, 0));
        AssertPrinted(farUpgradient * Math.PI, answers.Wells.Sum(well => well.Zone!.WidthUpgradient!.Value));
    }

    /// <summary>Case 2e, U 0.02 m/d, B 25 m, 500 m3/d each at 402.5455 m: computed, as 2a and 2b; 1e-6 relative.</summary>
    [Fact]
    public void Three_wells_in_metres_have_the_computed_widths()
    {
        Model site = Confined(0.2, 25, 0.1, 0.25, Bore, (new(0, -402.5455), 500), (0, 500), (new(0, 402.5455), 500));
        AssertHalfWidth(site, 0, 1500 / 2);
        SiteAnswers answers = site.Answer(new Envelope(-1000, 6000, -3000, 3000));
        AssertDrawn(1500, WidthAt(answers, 0));
        AssertPrinted(3000, answers.Wells.Sum(well => well.Zone!.WidthUpgradient!.Value));
    }

    /// <summary>
    /// Case 2g, two of those wells at the critical spacing, 318.30989 m: half width of the envelope, computed from the published
    /// formula, seen (Chin 2013, eq. 5.117); 1e-6 relative.
    /// </summary>
    [Fact]
    public void Two_wells_at_the_critical_spacing_have_the_envelope_of_the_formula()
    {
        const double Half = 318.30989 / 2;
        Model site = Confined(0.2, 25, 0.1, 0.25, Bore, (new(0, -Half), 500), (new(0, Half), 500));
        SiteAnswers answers = site.Answer(new Envelope(-1000, 6000, -3000, 3000));
        (double X, double HalfWidth)[] rows = [(-50, 461.07757), (0, 500), (200, 607.41081), (1000, 789.64904), (5000, 940.85233)];
        Assert.All(rows, row => AssertHalfWidth(site, row.X, row.HalfWidth));
        Assert.All(rows, row => AssertDrawn(2 * row.HalfWidth, WidthAt(answers, row.X)));
    }

    /// <summary>
    /// Case 2f, published (rounded) and recomputed, seen (Kuo 2014, example 6.7, pp. 229-231): two wells of 50 gpm, Q / (B u) = 60 ft,
    /// 19.0986 ft apart; half widths 30 and 60 ft. Tolerance 0.06 ft to the print, here in feet.
    /// </summary>
    [Fact]
    public void Two_textbook_wells_have_the_printed_widths()
    {
        const double Half = 9.5493;
        SiteAnswers answers = Confined(1, 1, 1, 0.25, Bore, (new(0, -Half), 60), (new(0, Half), 60))
            .Answer(new Envelope(-100, 400, -200, 200));
        AssertDrawn(2 * 30, WidthAt(answers, 0));
        AssertPrinted(2 * 60, answers.Wells.Sum(well => well.Zone!.WidthUpgradient!.Value));
    }

    private static int StreamlinesOnward(int wells, double spacing) => Line(wells, spacing).Answer().Paths
        .Count(path => path.Role == PathRole.DividesOrigins && path.Fate.Kind == FateKind.Far);

    private static void AssertHalfWidth(Model model, double x, double halfWidth)
    {
        model.Tracer().AssertEdge(new Complex(x, halfWidth), -Complex.ImaginaryOne, 1e-6 * halfWidth);
        model.Tracer().AssertEdge(new Complex(x, -halfWidth), Complex.ImaginaryOne, 1e-6 * halfWidth);
    }

    private static double WidthAt(SiteAnswers answers, double x)
    {
        Complex north = new(x, answers.Extent.MaxY), south = new(x, answers.Extent.MinY);
        return (answers.ContainmentZone.FirstIn(north, south) - answers.ContainmentZone.FirstIn(south, north)).Imaginary;
    }

    /// <summary>Wells of rate pi in a discharge of one.</summary>
    private static Model Line(int wells, double spacing) => Confined(
        1, 1, 1, 0.25, Bore, [.. Enumerable.Range(0, wells).Select(i => (new Complex(0, (i - (wells - 1) / 2.0) * spacing), Math.PI))]);
}
