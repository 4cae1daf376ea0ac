using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Zones;

/// <summary>A stretch of a well's screen that takes water of one origin.</summary>
/// <param name="From">Angle at which it begins, radians counter-clockwise from east.</param>
/// <param name="To">Angle at which it ends; above <paramref name="From"/>, by a full turn at most.</param>
/// <param name="Inflow">What enters there, m3/d.</param>
/// <param name="Origin">Where that water comes from.</param>
/// <param name="Begin">The dividing branch at which it begins; null where the whole screen is one stretch without one.</param>
/// <param name="End">The dividing branch at which it ends.</param>
internal sealed record ScreenStretch(
    double From, double To, double Inflow, Fate Origin, DividingBranch? Begin, DividingBranch? End);

/// <summary>Where the water of a well comes from, told by the branches that arrive at its screen.</summary>
internal static class WaterOrigins
{
    /// <summary>Pieces that a full turn round a screen is divided into for the flow across it; any number above 2 is exact.</summary>
    private const int PiecesPerTurn = 16;

    /// <summary>The stretches of a screen, counter-clockwise.</summary>
    /// <param name="topology">The field's dividing streamlines.</param>
    /// <param name="screen">The screen of an extraction well.</param>
    internal static ImmutableArray<ScreenStretch> Stretches(FlowTopology topology, Screen screen)
    {
        DividingBranch[] arriving =
        [
            .. topology.Branches
                .Where(branch => !branch.IsStable && branch.End.Fate == new Fate(FateKind.Well, screen.Well))
                .OrderBy(branch => AngleAt(screen, branch)),
        ];
        if (arriving.Length == 0)
        {
            return [new ScreenStretch(0, 2 * Math.PI, screen.Rate, OnlyOrigin(topology, screen), null, null)];
        }

        ImmutableArray<ScreenStretch>.Builder stretches = ImmutableArray.CreateBuilder<ScreenStretch>();
        for (int i = 0; i < arriving.Length; i++)
        {
            DividingBranch begin = arriving[i], end = arriving[(i + 1) % arriving.Length];
            double from = AngleAt(screen, begin);
            double to = i + 1 < arriving.Length ? AngleAt(screen, end) : AngleAt(screen, end) + 2 * Math.PI;

            // Water on a branch moves toward the well, so that counter-clockwise of the branch is its right.
            stretches.Add(new ScreenStretch(from, to, Inflow(topology.Field, screen, from, to), begin.Right, begin, end));
        }

        return stretches.DrainToImmutable();
    }

    /// <summary>The well's water by origin, largest first.</summary>
    /// <param name="stretches">The stretches of its screen.</param>
    internal static ImmutableArray<SourceShare> Shares(ImmutableArray<ScreenStretch> stretches)
    {
        double total = stretches.Sum(stretch => stretch.Inflow);
        return
        [
            .. stretches
                .GroupBy(stretch => stretch.Origin)
                .Select(group => new SourceShare(group.Key, group.Sum(part => part.Inflow), group.Sum(part => part.Inflow) / total))
                .OrderByDescending(share => share.Rate),
        ];
    }

    /// <summary>
    /// The origin of all that enters a screen at which no dividing branch arrives. Of an equal pair without regional flow one
    /// streamline goes off to infinity all the same: no two starts are both on it.
    /// </summary>
    private static Fate OnlyOrigin(FlowTopology topology, Screen screen)
    {
        Fate east = OriginAt(0);
        return east.Kind == FateKind.Injection ? east : OriginAt(Math.PI / 2);

        Fate OriginAt(double angle) => topology.Tracer
            .Trace(screen.At + Complex.FromPolarCoordinates(screen.Radius, angle), Sense.Upstream, double.PositiveInfinity, null)
            .Fate;
    }

    private static double AngleAt(Screen screen, DividingBranch branch) => (branch.End.At - screen.At).Phase;

    /// <summary>What enters a screen between two angles, m3/d.</summary>
    /// <param name="field">The field.</param>
    /// <param name="screen">The screen.</param>
    /// <param name="from">Where the part begins, radians counter-clockwise from east.</param>
    /// <param name="to">Where it ends; not below <paramref name="from"/>.</param>
    internal static double Inflow(FlowField field, Screen screen, double from, double to)
    {
        int pieces = Math.Max(1, (int)Math.Ceiling(PiecesPerTurn * (to - from) / (2 * Math.PI)));
        double inflow = 0;
        for (int i = 0; i < pieces; i++)
        {
            Complex a = Complex.FromPolarCoordinates(screen.Radius, from + (to - from) * i / pieces);
            Complex b = Complex.FromPolarCoordinates(screen.Radius, from + (to - from) * (i + 1) / pieces);
            inflow -= field.FluxAcross(screen.At + a, screen.At + b);
        }

        return inflow;
    }
}
