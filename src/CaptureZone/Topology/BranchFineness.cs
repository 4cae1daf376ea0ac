using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Topology;

/// <summary>
/// How finely the edge of a zone must be drawn so that little leaks through its chords. A chord of length l on a streamline that
/// turns by a over it cuts off a flow of L = |Q| l a / 8, out over one half and in over the other. Chords of equal L number
/// S / sqrt(8 L), S being the integral of sqrt(|Q| x curvature), and leak S sqrt(L / 2) in all.
/// </summary>
internal static class BranchFineness
{
    /// <summary>
    /// What may leak through the edges of a zone, as a share of the well's rate: the limit is 1e-3, and more leaks than
    /// is told here where two lines run along one streamline.
    /// </summary>
    private const double LeakShare = 7e-4;

    /// <summary>For each branch, the largest flow that a chord may cut off, m3/d; infinite for branches that edge no zone.</summary>
    /// <param name="stops">The field and where paths in it end.</param>
    /// <param name="branches">The branches, drawn coarsely.</param>
    /// <param name="extent">Where it matters, m.</param>
    internal static double[] Of(PathStops stops, IReadOnlyList<DividingBranch> branches, Envelope extent)
    {
        double[] allowed = new double[branches.Count];
        Array.Fill(allowed, double.PositiveInfinity);
        double[] bends = [.. branches.Select(branch => branch.IsStable ? BendOf(stops.Field, branch, extent) : 0)];
        foreach (Screen screen in stops.Screens)
        {
            Fate well = new(FateKind.Well, screen.Well);
            int[] edges = [.. Enumerable.Range(0, branches.Count).Where(i => IsEdge(branches[i], well))];
            double leak = LeakShare * screen.Rate / edges.Sum(i => bends[i]);
            foreach (int i in edges)
            {
                allowed[i] = Math.Min(allowed[i], 2 * leak * leak);
            }
        }

        return allowed;
    }

    private static bool IsEdge(DividingBranch branch, Fate well) =>
        branch.IsStable && (branch.Left == well) != (branch.Right == well);

    /// <summary>The integral of sqrt(|Q| x curvature) along a branch within the extent.</summary>
    private static double BendOf(FlowField field, DividingBranch branch, Envelope extent)
    {
        double bend = 0;
        for (int i = 2; i < branch.Points.Length; i++)
        {
            Complex before = branch.Points[i - 1].At - branch.Points[i - 2].At, after = branch.Points[i].At - branch.Points[i - 1].At;
            Complex at = branch.Points[i - 1].At;
            if (extent.Contains(at.Real, at.Imaginary) && before != Complex.Zero && after != Complex.Zero)
            {
                double turn = Math.Abs((after / before).Phase);
                double length = (Complex.Abs(before) + Complex.Abs(after)) / 2;
                bend += Math.Sqrt(Complex.Abs(field.DischargeAt(at)) * length * turn);
            }
        }

        return bend;
    }
}
