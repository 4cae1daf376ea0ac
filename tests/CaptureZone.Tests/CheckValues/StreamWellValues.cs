using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>Wells beside straight boundaries, by their images: what a whole run answers.</summary>
public sealed class StreamWellValues
{
    private const double GallonsPerCubicFoot = 1728.0 / 231;
    private const double Held = 500;

    /// <summary>
    /// Case 7a, published and recomputed, seen (G.M. Fair, J.C. Geyer, D.A. Okun, 3rd ed. by N.K. Shammas and L.K. Wang 2011, example
    /// 3.8, pp. 91-93): 32 000 gpd/ft, 700 gpm, 1000 ft from the stream, screen 1 ft; in feet. Tolerance 0.5 %. The printed 2.56 ft
    /// at 1500 ft from the stream is an error of the source (it takes 1500 ft for the distance to the well, which is 500 ft): 8.07 ft
    /// is right.
    /// </summary>
    [Fact]
    public void A_textbook_well_beside_a_stream_draws_down()
    {
        Model model = BesideLine(
            32_000 / GallonsPerCubicFoot / 100, 100, 1000, 1, 700 * 1440 / GallonsPerCubicFoot, -1, Complex.Zero);
        SiteAnswers answers = model.Answer();
        Assert.Equal(38.1062, answers.Wells[0].DrawdownAtScreen, 0.005 * 38.1062);
        Assert.Equal(37.9, answers.Wells[0].DrawdownAtScreen, 0.0055 * 37.9);
        AssertPrinted(5.50776, Held - answers.Field.HeadAt(500));
        AssertPrinted(8.06872, Held - answers.Field.HeadAt(1500));
    }

    /// <summary>
    /// Case 7b, T 250 m2/d, 800 m3/d, 120 m from the line, screen 0.2 m: means round the screen, computed from the published formula, seen
    /// (the same, eq. 3.36); no-flow line with R 3000 m; 1e-6 relative.
    /// </summary>
    [Theory]
    [InlineData(-1, 0, 3.610946)]
    [InlineData(1, 2997.5990392, 6.183633)]
    public void The_mean_drawdown_round_the_screen_is(int image, double knownNorth, double drawdown)
    {
        Model model = BesideLine(12.5, 20, 120, 0.2, 800, image, new Complex(0, knownNorth));
        AssertPrinted(drawdown, Held - model.Answer().Wells[0].HeadAtScreen);
    }

    /// <summary>
    /// Case 7d, a stream that gains 0.5 m2/d, 120 m from the well, Qc = pi d q: stream water in what the well takes, here from the
    /// image. Computed from the published formula (J.L. Wilson, Water Resour. Res. 29(10), 1993, 3503, doi 10.1029/93WR01393:
    /// abstract seen, formulas from memory and derived again; J.M. Newsom and J.L. Wilson, Ground Water 26(6), 1988, 703, from
    /// memory); 1e-6 relative. The width far up-gradient is (1 - f) Q / q.
    /// </summary>
    [Theory]
    [InlineData(0.5, 0)]
    [InlineData(1, 0)]
    [InlineData(1.25, 0.04051933)]
    [InlineData(1.5, 0.09172111)]
    [InlineData(2, 0.1816901)]
    [InlineData(3, 0.308068)]
    [InlineData(5, 0.4501849)]
    [InlineData(10, 0.6041813)]
    [InlineData(50, 0.8205388)]
    public void A_well_beside_a_gaining_stream_takes_this_share_from_it(double ofCritical, double share)
    {
        double rate = ofCritical * Math.PI * 120 * 0.5;
        WellZone zone = Confined(12.5, 20, 0.002, 0.25, Bore, (120, rate), (-120, -rate)).Answer().Wells[0].Zone!;
        AssertPrinted(share, zone.WaterFrom.Where(from => from.Source.Kind == FateKind.Injection).Sum(from => from.Share), 5e-8);
        AssertPrinted((1 - share) * rate / 0.5, zone.WidthUpgradient!.Value);
    }

    private static Model BesideLine(
        double conductivity, double thickness, double distance, double bore, double rate, int image, Complex knownAt) =>
        Of(
            new Aquifer(conductivity, 0, thickness, 0.2),
            new RegionalFlow(0, 0, Held, knownAt),
            bore,
            (distance, rate),
            (-distance, image * rate));
}
