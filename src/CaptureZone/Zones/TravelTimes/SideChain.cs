using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>
/// One side of a stretch of screen: from the well up its dividing streamline to the stagnation point, and on along the streamline
/// that flows into that point on the stretch's side. Late fronts cling to it.
/// </summary>
internal sealed class SideChain
{
    /// <summary>More stagnation points than any chain passes.</summary>
    private const int MostLinks = 64;

    private readonly Complex[] _vertices;

    private SideChain(List<Complex> vertices) => _vertices = [.. vertices];

    /// <summary>A place near the chain.</summary>
    /// <param name="Distance">Distance to the chain, m.</param>
    /// <param name="Segment">Index of the nearest piece's first vertex.</param>
    /// <param name="Nearest">The nearest place on the chain, m.</param>
    internal readonly record struct Foot(double Distance, int Segment, Complex Nearest);

    /// <summary>The chain along one side of a stretch.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="branch">The branch that arrives at the well.</param>
    /// <param name="turn">-1 when the stretch lies to the right of the branch, seen with the flow; 1 to the left.</param>
    internal static SideChain Of(FlowTopology topology, DividingBranch branch, int turn)
    {
        List<Complex> vertices = [.. branch.Points.Reverse().Select(point => point.At)];
        DividingBranch next = topology.BranchAt(branch.Saddle, branch.Order + turn);
        for (int i = 0; i < MostLinks; i++)
        {
            vertices.AddRange(next.Points.Skip(1).Select(point => point.At));
            if (next.End.Fate.Kind != FateKind.Stagnation)
            {
                break;
            }

            next = BeyondConnection(topology, next, turn);
        }

        return new SideChain(vertices);
    }

    /// <summary>The foot of a place on the chain.</summary>
    /// <param name="at">The place, m.</param>
    internal Foot FootOf(Complex at)
    {
        Foot best = new(double.PositiveInfinity, 0, default);
        double bestSquare = double.PositiveInfinity;
        for (int i = 1; i < _vertices.Length; i++)
        {
            Complex a = _vertices[i - 1], along = _vertices[i] - a, to = at - a;
            double square = along.Real * along.Real + along.Imaginary * along.Imaginary;
            double share = square > 0 ? Math.Clamp((to.Real * along.Real + to.Imaginary * along.Imaginary) / square, 0, 1) : 0;
            double dx = to.Real - share * along.Real, dy = to.Imaginary - share * along.Imaginary;
            double distance = dx * dx + dy * dy;
            if (distance < bestSquare)
            {
                bestSquare = distance;
                best = new Foot(0, i - 1, a + share * along);
            }
        }

        return best with { Distance = Math.Sqrt(bestSquare) };
    }

    /// <summary>The chain's vertices between two feet, in the order from the first to the second.</summary>
    /// <param name="from">The first.</param>
    /// <param name="to">The second.</param>
    internal IEnumerable<Complex> Between(Foot from, Foot to)
    {
        for (int i = from.Segment + 1; i <= to.Segment; i++)
        {
            yield return _vertices[i];
        }

        for (int i = from.Segment; i > to.Segment; i--)
        {
            yield return _vertices[i];
        }
    }

    /// <summary>A branch that comes out of another stagnation point goes on along what flows into that point on the same side.</summary>
    private static DividingBranch BeyondConnection(FlowTopology topology, DividingBranch branch, int turn)
    {
        int saddle = branch.End.Fate.Feature;
        Complex centre = topology.Points[saddle].At;
        Complex arrival = branch.End.At - centre;
        int count = 2 * (topology.Points[saddle].Multiplicity + 1);
        int best = 0;
        double bestCosine = double.NegativeInfinity;
        for (int order = 0; order < count; order += 2)
        {
            Complex direction = topology.BranchAt(saddle, order).Launch - centre;
            double cosine = (direction * Complex.Conjugate(arrival)).Real / (Complex.Abs(direction) * Complex.Abs(arrival));
            (best, bestCosine) = cosine > bestCosine ? (order, cosine) : (best, bestCosine);
        }

        return topology.BranchAt(saddle, best + turn);
    }
}
