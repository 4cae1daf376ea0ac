using System.Numerics;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Injection and extraction at equal rates 100 m apart, n 0.25, b 20 m. From memory, derived again, checked by quadrature and
/// tracking (M. Muskat 1937; C. DaCosta and R.R. Bennett, IASH Publ. 52, 1960, 524; D.B. Grove 1971; A.C. Gringarten and J.P. Sauty
/// 1975; M.J. Lippmann and C.F. Tsang, Ground Water 18(5), 1980, 452; J. Luo and P.K. Kitanidis, J. Hydrology 295, 2004, 149; D.
/// Banks 2009: abstract seen). Figures computed from the published formulas; 1e-6 relative.
/// </summary>
public sealed class DoubletValues
{
    /// <summary>So narrow that the angle at the bore is the angle at which a streamline leaves the axis.</summary>
    private const double Narrow = 1e-6;

    private static readonly Model Alone = Confined(15, 20, 0, 0.25, Narrow, (50, 300), (-50, -300));

    /// <summary>
    /// Case 8a, 300 m3/d without regional flow: first arrival pi n b D^2 / (3 Q); the share theta / pi of the water has arrived at
    /// t = (pi n b D^2 / Q) (1 - theta cot theta) / sin^2 theta, theta being the angle at which it left.
    /// </summary>
    [Theory]
    [InlineData(0, 174.53293)]
    [InlineData(0.05, 176.26566)]
    [InlineData(0.1, 181.58816)]
    [InlineData(0.25, 224.73052)]
    [InlineData(0.5, 523.59878)]
    [InlineData(0.75, 3514.5987)]
    [InlineData(0.9, 53197.682)]
    public void Without_regional_flow_this_share_has_arrived_after(double share, double time)
    {
        Complex start = -50 + Complex.FromPolarCoordinates(2 * Narrow, share * Math.PI);
        PathEnd end = Alone.Tracer().Trace(start, Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(new Fate(FateKind.Well, 0), end.Fate);
        AssertPrinted(time, end.Time);
    }

    /// <summary>Case 8a: in the end all that is pumped comes from the injection.</summary>
    [Fact]
    public void Without_regional_flow_all_water_goes_round()
    {
        SourceShare only = Assert.Single(Alone.Answer().Wells[0].Zone!.WaterFrom);
        Assert.Equal(new Fate(FateKind.Injection, 1), only.Source);
        Assert.Equal(300, only.Rate, 300 * 1e-12);
    }

    /// <summary>Case 8b, extraction up-gradient, T 300 m2/d, i 0.002, Qc = pi T i D / 2 = 94.24778 m3/d: share of injected water.</summary>
    [Theory]
    [InlineData(0.8, 75.398224, 0)]
    [InlineData(1, 94.24778, 0)]
    [InlineData(1.5, 141.37167, 0.091721113)]
    [InlineData(2, 188.49556, 0.18169011)]
    [InlineData(3, 282.74334, 0.30806801)]
    [InlineData(5, 471.2389, 0.45018486)]
    [InlineData(10, 942.4778, 0.6041813)]
    public void Extraction_up_gradient_of_injection_takes_this_share_of_it(double ofCritical, double rate, double share)
    {
        double exact = ofCritical * Math.PI * 0.6 * 100 / 2;
        AssertPrinted(rate, exact);
        WellZone zone = UpGradient(exact, Bore).Answer().Wells[0].Zone!;
        AssertPrinted(share, zone.WaterFrom.Where(from => from.Source.Kind == FateKind.Injection).Sum(from => from.Share), 5e-10);
    }

    /// <summary>Case 8b: the first injected water arrives.</summary>
    [Theory]
    [InlineData(141.37167, 855.44381, 2.309698)]
    [InlineData(188.49556, 475.66361, 1.712389)]
    [InlineData(282.74334, 254.69136, 1.375333)]
    [InlineData(471.2389, 132.59919, 1.193393)]
    [InlineData(942.4778, 60.418207, 1.087528)]
    public void Injected_water_breaks_through_against_the_flow_after(double rate, double time, double ofTimeWithoutFlow)
    {
        PathEnd end = UpGradient(rate, Bore).Tracer().Trace(-50 + 1.5 * Bore, Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(new Fate(FateKind.Well, 0), end.Fate);
        AssertPrinted(time, end.Time);
        PathEnd still = Confined(15, 20, 0, 0.25, Bore, (50, rate), (-50, -rate)).Tracer()
            .Trace(-50 + 1.5 * Bore, Sense.Downstream, double.PositiveInfinity, null);
        AssertPrinted(ofTimeWithoutFlow, end.Time / still.Time);
    }

    private static Model UpGradient(double rate, double bore) =>
        Confined(15, 20, 0.002, 0.25, bore, (50, rate), (-50, -rate));
}
