using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Tracing;

namespace CaptureZone.Topology;

/// <summary>
/// One branch of a dividing streamline. A branch that flows into its saddle (stable) parts water by where it goes to; one that
/// flows out of it (unstable) parts water by where it comes from.
/// </summary>
/// <param name="Saddle">Index of the stagnation point.</param>
/// <param name="Order">Its place among the branches of that point, counter-clockwise; even ones flow out, odd ones flow in.</param>
/// <param name="Points">
/// Its vertices from the stagnation point outward, to the centre of the well or to the stagnation point in which it ends; times from
/// the second vertex on, the first being infinitely far in time.
/// </param>
/// <param name="End">How it ends, followed away from its stagnation point.</param>
/// <param name="Left">Stable: the destination of the water on its left, seen with the flow. Unstable: the origin of that water.</param>
/// <param name="Right">The same on its right.</param>
public sealed record DividingBranch(
    int Saddle, int Order, ImmutableArray<PathPoint> Points, PathEnd End, Fate Left, Fate Right)
{
    /// <summary>Whether it flows into its saddle.</summary>
    public bool IsStable => Order % 2 != 0;

    /// <summary>Where the branch was launched, next to its stagnation point, m.</summary>
    public Complex Launch => Points[1].At;
}
