using System.Collections.Immutable;
using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>A zero of the flow, seen from the sink nearest to it.</summary>
/// <param name="Sink">The sink.</param>
/// <param name="Offset">From the sink to the zero, m: all its digits are good also where it is much nearer to the sink than the
/// sink is to the origin.</param>
/// <param name="At">The place, m.</param>
/// <param name="Multiplicity">1; more where several zeros cannot be told apart.</param>
/// <param name="Residual">|W| there over |W0| + sum |s_j| / |z - z_j|, at most sqrt 2 too large.</param>
/// <param name="Radius">Radius of a disc about the place that holds exactly so many zeros, m.</param>
public readonly record struct RationalZero(int Sink, Complex Offset, Complex At, int Multiplicity, double Residual, double Radius);

/// <summary>The zeros of a rational flow.</summary>
/// <param name="Zeros">The zeros, in no particular order.</param>
/// <param name="Expected">How many there are by the degree, counted with multiplicity, those at infinity left out.</param>
/// <param name="AtInfinity">
/// How many are at infinity: because leading moments vanish up to rounding, or farther from the middle of the sinks' bounding box
/// than 1e6 diameters of the circle about it that holds all sinks, taken as at least 100 m.
/// </param>
/// <param name="Complete">Whether each zero has a disc of its own that holds it, so that none is missing.</param>
/// <param name="Rounds">Rounds of the iteration.</param>
public sealed record RationalZeros(ImmutableArray<RationalZero> Zeros, int Expected, int AtInfinity, bool Complete, int Rounds)
{
    private static readonly RationalZeros s_none = new([], 0, 0, true, 0);

    internal static RationalZeros Of(RationalFlow flow)
    {
        if (flow.Count == 0)
        {
            return s_none;
        }

        FarFlow far = FarFlow.Of(flow);
        int count = flow.Count - far.Beyond;
        Span<NearSink> zeros = stackalloc NearSink[count];
        Span<double> radius = stackalloc double[count];
        Span<int> first = stackalloc int[count];
        StartingPoints.Write(flow, far, zeros);
        int rounds = SimultaneousIteration.Run(flow, zeros);
        InclusionDiscs.Write(flow, far, zeros, radius);
        InclusionDiscs.Group(flow, zeros, radius, first);
        ImmutableArray<RationalZero> found = Gather(flow, zeros, radius, first, out bool complete);
        int tooFar = CountBeyond(far.Edge, far.Centre, found);
        return new RationalZeros(
            tooFar == 0 ? found : Within(far.Edge, far.Centre, found), count - tooFar, far.Beyond + tooFar, complete, rounds);
    }

    private static int CountBeyond(double edge, Complex centre, ImmutableArray<RationalZero> zeros)
    {
        int count = 0;
        foreach (RationalZero zero in zeros)
        {
            count += Complex.Abs(zero.At - centre) > edge ? zero.Multiplicity : 0;
        }

        return count;
    }

    private static ImmutableArray<RationalZero> Within(double edge, Complex centre, ImmutableArray<RationalZero> zeros) =>
        zeros.RemoveAll(zero => Complex.Abs(zero.At - centre) > edge);

    private static ImmutableArray<RationalZero> Gather(
        RationalFlow flow, Span<NearSink> zeros, Span<double> radius, Span<int> first, out bool complete)
    {
        ImmutableArray<RationalZero>.Builder found = ImmutableArray.CreateBuilder<RationalZero>(zeros.Length);
        complete = true;
        for (int i = 0; i < zeros.Length; i++)
        {
            int order = first[i] == i ? first.Count(i) : 0;
            if (order == 1)
            {
                found.Add(Zero(flow, zeros[i], 1, radius[i]));
            }
            else if (order > 1 && TryMerge(flow, zeros, radius, first, i, out RationalZero merged))
            {
                found.Add(merged);
            }
            else if (order > 1)
            {
                complete = false;
                AddAll(flow, zeros, radius, first, i, found);
            }
        }

        return found.DrainToImmutable();
    }

    private static bool TryMerge(
        RationalFlow flow, Span<NearSink> zeros, Span<double> radius, Span<int> first, int group, out RationalZero merged)
    {
        int order = first.Count(group);
        NearSink from = zeros[group];
        Complex mean = default;
        for (int i = group; i < zeros.Length; i++)
        {
            mean += first[i] == group ? (zeros[i].SeenFrom(from.Sink, flow).Offset - from.Offset) / order : 0;
        }

        NearSink centre = from.Moved(mean);
        double reach = Reach(flow, zeros, radius, first, group, centre);
        bool isOne = MultipleZero.TryFind(flow, centre, reach, order, out NearSink at);
        merged = Zero(flow, at, order, Reach(flow, zeros, radius, first, group, at));
        return isOne;
    }

    private static void AddAll(
        RationalFlow flow,
        Span<NearSink> zeros,
        Span<double> radius,
        Span<int> first,
        int group,
        ImmutableArray<RationalZero>.Builder found)
    {
        for (int i = group; i < zeros.Length; i++)
        {
            if (first[i] == group)
            {
                found.Add(Zero(flow, zeros[i], 1, radius[i]));
            }
        }
    }

    /// <summary>Radius about a place of a disc that holds the discs of a group, m.</summary>
    private static double Reach(
        RationalFlow flow, Span<NearSink> zeros, Span<double> radius, Span<int> first, int group, NearSink about)
    {
        double reach = 0;
        for (int i = group; i < zeros.Length; i++)
        {
            if (first[i] == group)
            {
                reach = Math.Max(reach, InclusionDiscs.Distance(flow, zeros[i], about) + radius[i]);
            }
        }

        return reach;
    }

    private static RationalZero Zero(RationalFlow flow, NearSink at, int multiplicity, double radius)
    {
        LiftedFlow near = flow.Lifted(at);
        double residual = Math.Sqrt(2) * Complex.Abs(near.Value) / near.Size;
        return new RationalZero(at.Sink, at.Offset, flow.Place(at.Sink) + at.Offset, multiplicity, residual, radius);
    }
}
