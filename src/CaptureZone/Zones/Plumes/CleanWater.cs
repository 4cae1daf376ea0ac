using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Zones.Plumes;

/// <summary>
/// The clean water that enters the chosen wells between the edge of their joint zone and a captured plume, told at the screens: from
/// where the streamline along an edge arrives, round the screen to the first arrival from the plume; past a gap between two chosen
/// wells, on at the next one. Flows between neighbouring angles of a screen all have one sign, so that nothing cancels.
/// </summary>
internal static class CleanWater
{
    /// <summary>The least clean water over all edges, m3/d; null when no edge is followed by plume water.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="outline">Points of the plume's outline.</param>
    /// <param name="isChosen">Tells whether a destination is a chosen well.</param>
    internal static double? Least(FlowTopology topology, IReadOnlyList<Complex> outline, Func<Fate, bool> isChosen)
    {
        ImmutableDictionary<int, Intake> intakes = topology.Stops.Screens
            .Where(screen => screen.Rate > 0 && isChosen(new Fate(FateKind.Well, screen.Well)))
            .ToImmutableDictionary(screen => screen.Well, screen => Intake.Of(topology, screen));
        foreach (Complex start in outline)
        {
            PathEnd end = topology.Scout.Trace(start, Sense.Downstream, double.PositiveInfinity, null);
            if (end.Fate.Kind == FateKind.Well && intakes.TryGetValue(end.Fate.Feature, out Intake? intake))
            {
                intake.Arrivals.Add((end.At - intake.Screen.At).Phase);
            }
        }

        return topology.Branches
            .Where(branch => branch.IsStable && isChosen(branch.Left) != isChosen(branch.Right))
            .SelectMany(edge => new[] { 1, -1 }.Select(turn => FromEdge(topology, intakes, edge, turn)))
            .Min();
    }

    /// <summary>Counter-clockwise of an edge, seen from its stagnation point, its water leaves by the next branch, clockwise by the one before.</summary>
    private static double? FromEdge(
        FlowTopology topology, ImmutableDictionary<int, Intake> intakes, DividingBranch edge, int turn)
    {
        double water = 0;
        DividingBranch arriving = topology.BranchAt(edge.Saddle, edge.Order + turn);
        for (int passed = 0; passed <= topology.Branches.Length; passed++)
        {
            if (arriving.End.Fate.Kind == FateKind.Stagnation)
            {
                arriving = topology.Beyond(arriving, turn);
                continue;
            }

            if (arriving.End.Fate.Kind != FateKind.Well || !intakes.TryGetValue(arriving.End.Fate.Feature, out Intake? intake))
            {
                return null;
            }

            ScreenStretch? stretch = intake.Stretches.FirstOrDefault(part => (turn > 0 ? part.Begin : part.End)?.Launch == arriving.Launch);
            if (stretch is null)
            {
                return null;
            }

            if (intake.FirstArrival(stretch, turn) is { } angle)
            {
                return water + (turn > 0
                    ? WaterOrigins.Inflow(topology.Field, intake.Screen, stretch.From, angle)
                    : WaterOrigins.Inflow(topology.Field, intake.Screen, angle, stretch.To));
            }

            water += stretch.Inflow;
            DividingBranch last = turn > 0 ? stretch.End! : stretch.Begin!;
            arriving = topology.BranchAt(last.Saddle, last.Order + 2 * turn);
        }

        return null;
    }

    /// <summary>A chosen well's screen with the angles at which plume water arrives.</summary>
    private sealed record Intake(Screen Screen, ImmutableArray<ScreenStretch> Stretches, List<double> Arrivals)
    {
        internal static Intake Of(FlowTopology topology, Screen screen) =>
            new(screen, WaterOrigins.Stretches(topology, screen), []);

        /// <summary>The first arrival within a stretch, from its beginning (turn 1) or from its end (turn -1).</summary>
        internal double? FirstArrival(ScreenStretch stretch, int turn)
        {
            double? first = null;
            foreach (double arrival in Arrivals)
            {
                double angle = arrival + 2 * Math.PI * Math.Ceiling((stretch.From - arrival) / (2 * Math.PI));
                if (angle <= stretch.To && !(turn > 0 ? angle >= first : angle <= first))
                {
                    first = angle;
                }
            }

            return first;
        }
    }
}
