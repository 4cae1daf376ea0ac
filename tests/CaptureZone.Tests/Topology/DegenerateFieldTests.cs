using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;

namespace CaptureZone.Tests.Topology;

public sealed class DegenerateFieldTests
{
    private const double Q = 300;
    private static readonly Complex s_centre = new(1000, -700);

    [Fact]
    public void Without_wells_the_water_stands_still_nowhere() => AssertNone(Zeros(0.6, []));

    [Fact]
    public void One_well_without_regional_flow_has_no_stagnation_point() => AssertNone(Zeros(0, [(0, Q)]));

    [Fact]
    public void Wells_that_stand_idle_have_no_stagnation_point() => AssertNone(Zeros(0.6, [(0, 0), (100, 0)]));

    [Fact]
    public void A_doublet_without_regional_flow_has_no_stagnation_point() => AssertNone(Zeros(0, [(0, Q), (100, -Q)]));

    [Fact]
    public void One_well_has_its_stagnation_point_downstream()
    {
        RationalZero zero = Assert.Single(Zeros(0.6, [(s_centre, Q)]).Zeros);
        AssertAt(Q / (2 * Math.PI * 0.6), zero.At - s_centre);
    }

    [Fact]
    public void Several_wells_without_regional_flow_have_one_fewer_stagnation_points()
    {
        RationalZeros zeros = Zeros(0, [(0, 100), (100, 300)]);
        Assert.True(zeros.Complete);
        AssertAt(25, Assert.Single(zeros.Zeros).At);
    }

    [Fact]
    public void Wells_at_one_place_are_one_well()
    {
        RationalZeros zeros = Zeros(0.6, [(s_centre, 100), (0, 50), (s_centre, 200)]);
        RationalZeros merged = Zeros(0.6, [(s_centre, 300), (0, 50)]);
        Assert.Equal(2, zeros.Expected);
        Assert.Equal(merged.Zeros.ToArray(), zeros.Zeros.ToArray());
    }

    [Fact]
    public void Wells_at_one_place_whose_rates_cancel_are_no_well() =>
        Assert.Equal(
            Zeros(0.6, [(0, 50)]).Zeros.ToArray(),
            Zeros(0.6, [(s_centre, 100), (0, 50), (s_centre, -100)]).Zeros.ToArray());

    [Theory]
    [InlineData(3)]
    [InlineData(4)]
    [InlineData(5)]
    [InlineData(8)]
    [InlineData(12)]
    [InlineData(60)]
    public void Equal_wells_on_a_regular_polygon_have_one_stagnation_point_of_full_multiplicity_at_its_centre(int corners)
    {
        RationalZeros zeros = Zeros(0, Polygon(corners, _ => Q));
        RationalZero zero = Assert.Single(zeros.Zeros);
        Assert.True(zeros.Complete);
        Assert.Equal(corners - 1, zero.Multiplicity);
        AssertAt(s_centre, zero.At);
    }

    /// <summary>W is proportional to z^(n/2 - 1) / (z^n - a^n) by the symmetry: n/2 - 1 zeros at the centre.</summary>
    [Theory]
    [InlineData(4)]
    [InlineData(6)]
    [InlineData(12)]
    [InlineData(60)]
    public void Rates_that_alternate_on_a_regular_polygon_leave_the_others_at_infinity(int corners)
    {
        RationalZeros zeros = Zeros(0, Polygon(corners, k => k % 2 == 0 ? Q : -Q));
        RationalZero zero = Assert.Single(zeros.Zeros);
        Assert.True(zeros.Complete);
        Assert.Equal(corners / 2 - 1, zero.Multiplicity);
        Assert.Equal(corners / 2 + 1, zeros.AtInfinity);
        AssertAt(s_centre, zero.At);
    }

    /// <summary>W is proportional to 1 / (z (z^n - a^n)): all moments vanish but the last.</summary>
    [Theory]
    [InlineData(2)]
    [InlineData(5)]
    [InlineData(60)]
    public void A_well_that_takes_what_a_polygon_of_wells_puts_in_has_no_stagnation_point(int corners)
    {
        RationalZeros zeros = Zeros(0, [.. Polygon(corners, _ => -Q), (s_centre, corners * Q)]);
        AssertNone(zeros);
        Assert.Equal(corners + 1, zeros.AtInfinity);
    }

    /// <summary>Three wells without regional flow: sum s_j / (z - z_j) is a quadratic over a cubic.</summary>
    [Fact]
    public void Three_wells_whose_rates_sum_to_zero_have_one_stagnation_point()
    {
        // 1/z + 1/(z - 100) - 2/(z - 300) = (-500 z + 30 000) / ..., zero at 60.
        RationalZeros zeros = Zeros(0, [(0, Q), (100, Q), (300, -2 * Q)]);
        Assert.True(zeros.Complete);
        AssertAt(60, Assert.Single(zeros.Zeros).At);
    }

    [Theory]
    [InlineData(1e-3, true)]
    [InlineData(1e-5, true)]
    [InlineData(1e-8, false)]
    [InlineData(1e-13, false)]
    public void A_stagnation_point_beyond_a_million_sites_counts_as_at_infinity(double excess, bool isFinite)
    {
        // 1/z = (1 - e)/(z - 100) at z = 100 / e.
        RationalZeros zeros = Zeros(0, [(0, Q), (100, -Q * (1 - excess))]);
        Assert.True(zeros.Complete);
        Assert.Equal(isFinite ? 1 : 0, zeros.Zeros.Length);
        foreach (RationalZero zero in zeros.Zeros)
        {
            Assert.Equal(100 / excess, zero.At.Real, 1e-9 * 100 / excess);
        }
    }

    [Fact]
    public void A_well_too_weak_to_move_the_origin_keeps_every_digit_of_its_stagnation_point()
    {
        // 5 km away the flow is 0.6 - 300 / (2 pi 5000) at the weak well, even to 14 digits over so small a distance.
        RationalZeros zeros = Zeros(0.6, [(0, Q), (5000, 1e-9)]);
        double there = 0.6 - Q / (2 * Math.PI * 5000);
        RationalZero zero = Assert.Single(zeros.Zeros, zero => zero.Sink == 1);
        Assert.Equal(1, zero.Offset.Real / (1e-9 / (2 * Math.PI * there)), 1e-12);
        Assert.InRange(zero.Radius, 0, 1e-6 * Complex.Abs(zero.Offset));
    }

    [Fact]
    public void Wells_along_the_flow_may_have_stagnation_points_to_both_sides()
    {
        // Extraction 100 m upstream of equal injection, W0 = 0.3: z (z - 100) = -100 q / (2 pi 0.3).
        RationalZeros zeros = Zeros(0.3, [(0, Q), (100, -Q)]);
        double side = Math.Sqrt(100 * Q / (2 * Math.PI * 0.3) - 2500);
        AssertAt(new Complex(50, -side), zeros.Zeros.MinBy(zero => zero.At.Imaginary).At);
        AssertAt(new Complex(50, side), zeros.Zeros.MaxBy(zero => zero.At.Imaginary).At);
    }

    /// <summary>Two equal wells across the flow, from just within to just beyond the spacing at which their points meet.</summary>
    [Fact]
    public void Stagnation_points_that_all_but_meet_are_certified_one_or_two()
    {
        // Powers of ten of the deviation: up to the first rounding hides it, from the second on it must be resolved.
        const double TogetherTo = -15, ApartFrom = -12.5, Flow = 0.5;
        for (double exponent = -17; exponent < -1; exponent += 0.25)
        {
            foreach (int sign in new[] { -1, 1 })
            {
                double half = Q / (2 * Math.PI * Flow) * (1 + sign * Math.Pow(10, exponent));
                RationalZeros zeros = Zeros(Flow, [(s_centre + new Complex(0, half), Q), (s_centre - new Complex(0, half), Q)]);
                Assert.True(zeros.Complete);
                Assert.Equal(2, zeros.Zeros.Sum(zero => zero.Multiplicity));
                Assert.All(zeros.Zeros, zero => Assert.InRange(zero.Residual, 0, 1e-12));
                Assert.InRange(zeros.Zeros.Length, exponent < ApartFrom ? 1 : 2, exponent < TogetherTo ? 1 : 2);
            }
        }
    }

    [Fact]
    public void What_is_not_wells_in_uniform_flow_is_refused()
    {
        Model model = new(new Aquifer(10, 0, 20, 0.25), new RegionalFlow(0.001, 0, 30, 0), [new Unknown("ditch")]);
        Assert.Throws<NotSupportedException>(() => StagnationFinder.Find(FlowSystem.Assemble(model).Solve()));
    }

    [Fact]
    public void A_stagnation_point_tells_the_head_there()
    {
        ImmutableArray<Element> wells = [new Well("W", s_centre, Q, 0.1, WellPurpose.Other)];
        FlowField field = FlowSystem.Assemble(
            new Model(new Aquifer(10, 0, 20, 0.25), new RegionalFlow(0.001, 0, 30, s_centre - 500), wells)).Solve();
        StagnationSet set = StagnationFinder.Find(field);
        StagnationPoint point = Assert.Single(set.Points);
        Assert.True(set.Complete);
        Assert.Equal(1, set.Expected);
        Assert.InRange(set.Residual, 0, 1e-12);
        Assert.Equal(StagnationKind.Saddle, point.Kind);
        Assert.Equal(field.HeadAt(point.At), point.Head);
    }

    private sealed record Unknown(string Name) : Element(Name)
    {
        public override void Contribute(SystemBuilder to)
        {
        }
    }

    private static (Complex At, double Rate)[] Polygon(int corners, Func<int, double> rate) =>
    [
        .. Enumerable.Range(0, corners)
            .Select(k => (s_centre + Complex.FromPolarCoordinates(200, 2 * Math.PI * k / corners), rate(k))),
    ];

    private static RationalZeros Zeros(Complex uniform, (Complex At, double Rate)[] wells) =>
        RationalFlow.Of(uniform, [.. wells.Select(well => well.At)], [.. wells.Select(well => well.Rate)]).Zeros();

    private static void AssertNone(RationalZeros zeros)
    {
        Assert.True(zeros.Complete);
        Assert.Equal(0, zeros.Expected);
        Assert.Empty(zeros.Zeros);
    }

    private static void AssertAt(Complex expected, Complex actual) => Assert.InRange(Complex.Abs(expected - actual), 0, 1e-10);
}
