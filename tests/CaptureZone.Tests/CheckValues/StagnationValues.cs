using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;

namespace CaptureZone.Tests.CheckValues;

/// <summary>Stagnation points of published cases and of published formulas. "Seen" and "from memory" say how.</summary>
public sealed class StagnationValues
{
    private const double Relative = 1e-6;

    /// <summary>Exact definitions of foot and US gallon (NIST SP 811, from memory): m, m3/d and m/d.</summary>
    private const double Foot = 0.3048;
    private const double GallonPerMinute = 5.45099296896;
    private const double GallonPerDayPerSquareFoot = 0.003785411784 / (Foot * Foot);

    /// <summary>
    /// x0 = -Q / (2 pi T i), computed from the published formula (seen: J. Kuo, <i>Practical Design Calculations for Groundwater
    /// and Soil Remediation</i>, 2nd ed., CRC Press 2014, eq. 6.3; a county file quoting EPA/600/R-08/003, 2008).
    /// </summary>
    [Fact]
    public void One_well_in_confined_uniform_flow()
    {
        FlowField field = Confined(15, 20, 0.002, Math.PI, (0, 600));
        AssertAt(-159.15494, Only(field), Relative * 159);
    }

    /// <summary>
    /// Kuo 2014, example 6.6 (seen): 50 gpm, 1 000 gpd/ft2, gradient 0.015, 80 ft; recomputed -9.5493 ft, printed -9.6 ft, which is
    /// 9.5493 rounded by way of 9.55, so that 0.06 ft are allowed to the printed value.
    /// </summary>
    [Fact]
    public void A_textbook_well_in_uniform_flow()
    {
        FlowField field = Confined(1000 * GallonPerDayPerSquareFoot, 80 * Foot, 0.015, Math.PI, (0, 50 * GallonPerMinute));
        Complex feet = Only(field) / Foot;
        AssertAt(-9.5493, feet, 5e-5);
        AssertAt(-9.6, feet, 0.06);
    }

    /// <summary>
    /// Two equal wells across the flow at the spacing Q / (pi B U): one point of multiplicity 2 at Q / (2 pi B U). Factor 1 seen
    /// (Kuo 2014, table 6.1; D.A. Chin, <i>Water-Quality Engineering in Natural Systems</i>, 2nd ed. 2013, eqs 5.113 to 5.118) and
    /// from memory (I. Javandel and C.F. Tsang, Ground Water 24(5), 1986, 616); the point computed: root of 1 = sum s / (z - z_k).
    /// Lengths in Q / (pi B U).
    /// </summary>
    [Fact]
    public void Two_wells_at_the_critical_spacing_share_one_double_point()
    {
        FlowField field = Across(1, Math.PI, -0.5, 0.5);
        StagnationPoint point = Assert.Single(StagnationFinder.Find(field).Points);
        Assert.Equal(2, point.Multiplicity);
        AssertAt(0.5, point.At, 1e-5);
    }

    /// <summary>
    /// Three wells at 1.2646341 Q / (pi B U), computed: where the stream function of the points between the wells is that of the
    /// point in front (the published factor, 1.26, is this rounded: sources as for two wells).
    /// </summary>
    [Fact]
    public void Three_wells_at_the_critical_spacing_have_three_points_on_one_streamline()
    {
        const double Spacing = 1.2646341;
        FlowField field = Across(1, Math.PI, -Spacing, 0, Spacing);
        ImmutableArray<StagnationPoint> points = Points(field);
        Assert.Equal(3, points.Length);
        AssertAt(new Complex(0.364529, -0.950977), points[0].At, 1e-5);
        AssertAt(new Complex(0.364529, 0.950977), points[1].At, 1e-5);
        AssertAt(0.770941, points[2].At, 1e-5);
        Assert.Equal(0, field.FluxAcross(points[2].At, points[1].At) / Math.PI, 1e-5);
        Assert.Equal(0, field.FluxAcross(points[2].At, points[0].At) / Math.PI, 1e-5);
    }

    /// <summary>The same in metres: U 0.02 m/d, B 25 m, Q 500 m3/d each; spacings 318.3099 and 402.5455 m (computed, as above).</summary>
    [Fact]
    public void Critical_spacings_in_metres()
    {
        const double Flow = 0.02 * 25, Rate = 500;
        double two = Rate / (Math.PI * Flow), three = 402.5455;
        Assert.Equal(318.3099, two, Relative * two);
        StagnationPoint point = Assert.Single(Points(Across(Flow, Rate, -two / 2, two / 2)));
        Assert.Equal(2, point.Multiplicity);
        AssertAt(318.3099 / 2, point.At, Relative * two);
        FlowField field = Across(Flow, Rate, -three, 0, three);
        ImmutableArray<StagnationPoint> points = Points(field);
        Assert.Equal(0, field.FluxAcross(points[2].At, points[1].At) / Rate, Relative);
    }

    /// <summary>
    /// Kuo 2014, example 6.7 (seen): two wells of 50 gpm at the critical spacing 19.0986 ft; stagnation point at 9.5493 ft,
    /// printed 9.6 ft: a double one.
    /// </summary>
    [Fact]
    public void Two_textbook_wells_at_the_critical_spacing()
    {
        double rate = 50 * GallonPerMinute, conductivity = 1000 * GallonPerDayPerSquareFoot, thickness = 80 * Foot;
        double half = rate / (2 * Math.PI * conductivity * thickness * 0.015);
        Assert.Equal(19.0986, 2 * half / Foot, 5e-5);
        FlowField field = Confined(
            conductivity, thickness, 0.015, Math.PI, (new Complex(0, half), rate), (new Complex(0, -half), rate));
        StagnationPoint point = Assert.Single(Points(field));
        Assert.Equal(2, point.Multiplicity);
        AssertAt(-9.5493, point.At / Foot, 5e-5);
        AssertAt(-9.6, point.At / Foot, 0.06);
    }

    /// <summary>
    /// Water table, x0 = -Q L / (pi K (h1^2 - h2^2)) (abstract seen, formula from memory and derived again: S. Grubb, Ground Water
    /// 31(1), 1993, 27), and the head there (O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989, from memory).
    /// </summary>
    [Fact]
    public void One_well_under_a_water_table()
    {
        FlowField field = Field(new Aquifer(25, 0, null, 0.25), new RegionalFlow(0.002, Math.PI, 20, 1000), [(0, 400)]);
        StagnationPoint point = Assert.Single(Points(field));
        AssertAt(-63.661977, point.At, Relative * 63);
        Assert.Equal(17.3459, point.Head, 5e-5);
    }

    /// <summary>
    /// A well at (120 m, 0) beside a stream of constant head on x = 0 that gains 0.5 m2/d, by its image; Qc = pi d q = 188.49556 m3/d,
    /// x^2 = d^2 - Q d / (pi q), beyond Qc on the stream (abstract seen, formulas from memory and derived again: J.L. Wilson, Water
    /// Resour. Res. 29(10), 1993, 3503; J.M. Newsom and J.L. Wilson, Ground Water 26(6), 1988, 703).
    /// </summary>
    [Theory]
    [InlineData(0.5, 84.852814, 0)]
    [InlineData(2, 0, 120)]
    [InlineData(3, 0, 169.70563)]
    public void A_well_beside_a_gaining_stream(double share, double x, double y)
    {
        ImmutableArray<StagnationPoint> points = Points(BesideStream(share));
        AssertAt(new Complex(-x, -y), points[0].At, Relative * 120);
        AssertAt(new Complex(x, y), points[1].At, Relative * 120);
    }

    /// <summary>The same at Qc: the two points meet on the stream.</summary>
    [Fact]
    public void A_well_beside_a_gaining_stream_at_the_critical_rate()
    {
        StagnationPoint point = Assert.Single(Points(BesideStream(1)));
        Assert.Equal(2, point.Multiplicity);
        AssertAt(0, point.At, Relative * 120);
    }

    /// <summary>
    /// Extraction 100 m up-gradient of injection, T i = 0.6 m2/d: x^2 = a^2 - Q a / (pi Q0), a = 50 m, meeting at Qc = pi Q0 D / 2 =
    /// 94.24778 m3/d (from memory and derived again: C. DaCosta and R.R. Bennett, IASH Publ. 52, 1960; J. Luo and P.K. Kitanidis,
    /// J. Hydrology 295, 2004, 149).
    /// </summary>
    [Theory]
    [InlineData(75.398224, 22.3606798, 0)]
    [InlineData(188.49556, 0, 50)]
    [InlineData(471.2389, 0, 100)]
    public void Extraction_up_gradient_of_injection(double rate, double along, double across)
    {
        ImmutableArray<StagnationPoint> points = Points(Confined(15, 20, 0.002, 0, (-50, rate), (50, -rate)));
        AssertAt(new Complex(-along, -across), points[0].At, Relative * 100);
        AssertAt(new Complex(along, across), points[1].At, Relative * 100);
    }

    /// <summary>The pair of the case before at Qc.</summary>
    [Fact]
    public void Extraction_up_gradient_of_injection_at_the_critical_rate()
    {
        double critical = Math.PI * 0.6 * 100 / 2;
        Assert.Equal(94.24778, critical, Relative * critical);
        StagnationPoint point = Assert.Single(Points(Confined(15, 20, 0.002, 0, (-50, critical), (50, -critical))));
        Assert.Equal(2, point.Multiplicity);
        AssertAt(0, point.At, Relative * 100);
    }

    private static FlowField BesideStream(double share)
    {
        double rate = share * Math.PI * 120 * 0.5;
        return Confined(12.5, 20, 0.002, Math.PI, (120, rate), (-120, -rate));
    }

    /// <summary>Equal wells across a flow to the east.</summary>
    private static FlowField Across(double flow, double rate, params double[] norths) =>
        Confined(flow / 10, 10, 1, 0, [.. norths.Select(north => (new Complex(0, north), rate))]);

    private static FlowField Confined(
        double conductivity, double thickness, double gradient, double direction, params (Complex At, double Rate)[] wells) =>
        Field(
            new Aquifer(conductivity, 0, thickness, 0.25),
            new RegionalFlow(gradient, direction, 2 * thickness, new Complex(1000, 0)),
            wells);

    private static FlowField Field(Aquifer aquifer, RegionalFlow regional, (Complex At, double Rate)[] wells)
    {
        ImmutableArray<Element> elements =
        [
            .. wells.Select((well, i) => new Well($"W{i}", well.At, well.Rate, 0.1, WellPurpose.Other)),
        ];
        return FlowSystem.Assemble(new Model(aquifer, regional, elements)).Solve();
    }

    private static ImmutableArray<StagnationPoint> Points(FlowField field)
    {
        StagnationSet set = StagnationFinder.Find(field);
        Assert.True(set.Complete);
        Assert.Equal(set.Expected, set.Points.Sum(point => point.Multiplicity));
        return set.Points;
    }

    private static Complex Only(FlowField field) => Assert.Single(Points(field)).At;

    private static void AssertAt(Complex expected, Complex actual, double tolerance) =>
        Assert.InRange(Complex.Abs(expected - actual), 0, tolerance);
}
