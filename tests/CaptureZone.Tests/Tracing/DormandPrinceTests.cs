using System.Numerics;
using System.Runtime.Intrinsics;
using CaptureZone.Flow;
using CaptureZone.Tracing;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.Tracing;

/// <summary>
/// The coefficients against what they must fulfil: J.C. Butcher's order conditions, one for every rooted tree (E. Hairer, S.P. Norsett,
/// G. Wanner, <i>Solving Ordinary Differential Equations I</i>, 2nd ed. 1993, section II.2, from memory).
/// </summary>
public sealed class DormandPrinceTests
{
    /// <summary>Rounding of the sums, whose terms reach 43.</summary>
    private const double Rounding = 1e-13;

    /// <summary>A rooted tree: the subtrees on its root, in a fixed order.</summary>
    private sealed record Tree(Tree[] Branches)
    {
        internal int Order => 1 + Branches.Sum(branch => branch.Order);

        internal double Density => Order * Branches.Aggregate(1.0, (product, branch) => product * branch.Density);
    }

    [Fact]
    public void Every_stage_stands_where_its_row_sums_to()
    {
        for (int stage = 1; stage < DormandPrince.Stages; stage++)
        {
            Assert.Equal(stage, DormandPrince.A(stage).Length);
            Assert.Equal(DormandPrince.C[stage], Sum(DormandPrince.A(stage)), Rounding);
        }
    }

    /// <summary>Trees of orders 1 to 8: 1, 1, 2, 4, 9, 20, 48, 115.</summary>
    [Fact]
    public void All_200_order_conditions_up_to_order_8_hold()
    {
        Tree[] trees = [.. Enumerable.Range(1, DormandPrince.Order).SelectMany(TreesOf)];
        Assert.Equal(200, trees.Length);
        foreach (Tree tree in trees)
        {
            Assert.Equal(1 / tree.Density, Dot(DormandPrince.B, Weights(tree)), Rounding);
        }
    }

    /// <summary>Were the order 9, these would hold as well: the test above can fail.</summary>
    [Fact]
    public void Order_conditions_of_order_9_do_not_hold() =>
        Assert.Contains(TreesOf(9), tree => Math.Abs(1 / tree.Density - Dot(DormandPrince.B, Weights(tree))) > 1e3 * Rounding);

    /// <summary>An estimate is the difference of two solutions: it vanishes for every tree up to the lower order.</summary>
    [Fact]
    public void Error_estimates_vanish_up_to_their_orders()
    {
        Assert.All(
            Enumerable.Range(1, 5).SelectMany(TreesOf), tree => Assert.Equal(0, Dot(DormandPrince.E5, Weights(tree)), Rounding));
        Assert.All(
            Enumerable.Range(1, 3).SelectMany(TreesOf), tree => Assert.Equal(1 / tree.Density, ThirdOrder(Weights(tree)), Rounding));
    }

    /// <summary>
    /// Of an injection and an extraction at equal rates without regional flow the streamlines are the circles through both wells
    /// (potential theory: angle at the circumference).
    /// </summary>
    [Fact]
    public void Halving_fixed_steps_divides_the_error_by_two_to_the_eighth()
    {
        FlowField field = Confined(15, 20, 0, 0.25, Bore, (50, 300), (-50, -300)).Field();
        double few = ErrorOnCircle(field, 4), more = ErrorOnCircle(field, 8), most = ErrorOnCircle(field, 16);
        Assert.InRange(Math.Log2(few / more), 7.5, 8.5);
        Assert.InRange(Math.Log2(more / most), 7.5, 8.5);
    }

    /// <summary>Half a turn about (0, 20) with fixed steps: how far from the circle's point of that arc length it ends.</summary>
    private static double ErrorOnCircle(FlowField field, int steps)
    {
        Complex centre = new(0, 20);
        double radius = Complex.Abs(50 - centre), start = 2.4, arc = 1.8;
        Stepper stepper = new(field, 1, Tracer.FineTolerance);
        Node node = stepper.Start(centre + Complex.FromPolarCoordinates(radius, start));
        Span<Vector256<double>> work = stackalloc Vector256<double>[Stepper.Workspace];
        for (int i = 0; i < steps; i++)
        {
            node = stepper.Step(node, radius * arc / steps, 1, work, out _);
        }

        return Complex.Abs(node.At - (centre + Complex.FromPolarCoordinates(radius, start - arc)));
    }

    private static double ThirdOrder(double[] weights) =>
        DormandPrince.Bh[0] * weights[0] + DormandPrince.Bh[1] * weights[8] + DormandPrince.Bh[2] * weights[11];

    /// <summary>The elementary weights of a tree at the stages, without the outer sum.</summary>
    private static double[] Weights(Tree tree)
    {
        double[] product = new double[DormandPrince.Stages];
        Array.Fill(product, 1);
        foreach (Tree branch in tree.Branches)
        {
            double[] inner = Weights(branch);
            for (int stage = 0; stage < product.Length; stage++)
            {
                product[stage] *= stage == 0 ? 0 : Dot(DormandPrince.A(stage), inner);
            }
        }

        return product;
    }

    /// <summary>All rooted trees of an order, each once.</summary>
    private static IEnumerable<Tree> TreesOf(int order) => Forests(order - 1, order - 1, int.MaxValue).Select(forest => new Tree(forest));

    /// <summary>
    /// All multisets of trees with a number of nodes in all; their trees in falling order, then falling place in that order.
    /// </summary>
    private static IEnumerable<Tree[]> Forests(int nodes, int largest, int places)
    {
        if (nodes == 0)
        {
            yield return [];
            yield break;
        }

        for (int first = Math.Min(nodes, largest); first >= 1; first--)
        {
            Tree[] choices = [.. TreesOf(first)];
            int most = first == largest ? Math.Min(places, choices.Length) : choices.Length;
            for (int place = 0; place < most; place++)
            {
                foreach (Tree[] rest in Forests(nodes - first, first, place + 1))
                {
                    yield return [choices[place], .. rest];
                }
            }
        }
    }

    private static double Sum(ReadOnlySpan<double> terms)
    {
        double sum = 0;
        foreach (double term in terms)
        {
            sum += term;
        }

        return sum;
    }

    private static double Dot(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        double sum = 0;
        for (int i = 0; i < a.Length; i++)
        {
            sum += a[i] * b[i];
        }

        return sum;
    }
}
