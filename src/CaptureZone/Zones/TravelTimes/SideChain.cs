using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>
/// One side of a stretch of screen: from the well up its dividing streamline to the stagnation point, and on along the streamline
/// that flows into that point on the stretch's side. Late fronts cling to it.
/// </summary>
internal static class SideChain
{
    /// <summary>More stagnation points than any chain passes.</summary>
    private const int MostLinks = 64;

    /// <summary>The chain along one side of a stretch.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="branch">The branch that arrives at the well.</param>
    /// <param name="turn">-1 when the stretch lies to the right of the branch, seen with the flow; 1 to the left.</param>
    /// <param name="tolerance">Distance by which the chain may be thinned out, m.</param>
    internal static Polyline Of(FlowTopology topology, DividingBranch branch, int turn, double tolerance)
    {
        List<Complex> vertices = [.. Polyline.Thinned(branch, tolerance).Reverse()];
        DividingBranch next = topology.BranchAt(branch.Saddle, branch.Order + turn);
        for (int i = 0; i < MostLinks; i++)
        {
            vertices.AddRange(Polyline.Thinned(next, tolerance).Skip(1));
            if (next.End.Fate.Kind != FateKind.Stagnation)
            {
                break;
            }

            next = topology.Beyond(next, turn);
        }

        return new Polyline([.. vertices]);
    }
}
