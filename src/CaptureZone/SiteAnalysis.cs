using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using CaptureZone.Zones.Plumes;
using CaptureZone.Zones.TravelTimes;
using NetTopologySuite.Geometries;

namespace CaptureZone;

/// <summary>A step of long work that has begun.</summary>
/// <param name="Name">What is being done.</param>
/// <param name="Fraction">How much of the whole is done, 0 to 1.</param>
public readonly record struct Step(string Name, double Fraction);

/// <summary>Raised when a well takes more than the aquifer yields.</summary>
public sealed class DewateredException : Exception
{
    /// <summary>States which wells are dewatered.</summary>
    /// <param name="wells">Index of each, with the largest rate it could yield with the others held, m3/d (0 when none).</param>
    public DewateredException(IReadOnlyList<(int Well, double LargestRate)> wells)
        : base("Wells take more than the aquifer yields.") => Wells = wells;

    /// <summary>Index of each dewatered well, with the largest rate it could yield with the others held, m3/d.</summary>
    public IReadOnlyList<(int Well, double LargestRate)> Wells { get; }
}

/// <summary>Asks everything of a model in one go: the engine's front door, used by every command.</summary>
public static class SiteAnalysis
{
    /// <summary>Answers the questions.</summary>
    /// <param name="model">The model.</param>
    /// <param name="questions">The questions.</param>
    /// <param name="workers">Who does the work.</param>
    /// <param name="progress">Told of each step; may be null.</param>
    /// <param name="cancel">Stops the work.</param>
    /// <exception cref="DewateredException">A well takes more than the aquifer yields.</exception>
    public static SiteAnswers Run(
        Model model, Questions questions, IWorkers workers, IProgress<Step>? progress, CancellationToken cancel)
    {
        FlowField field = FlowSystem.Assemble(model).Solve();
        ScreenLevels levels = ScreenLevels.Of(field);

        progress?.Report(new Step("stagnation points and dividing streamlines", 0.05));
        Framing framing = Framing.Of(field, questions);
        FlowTopology topology = FlowTopology.Find(field, framing.Reach, framing.Extent, workers, cancel);

        progress?.Report(new Step("capture zones", 0.3));
        FaceMap map = FaceMap.Build(topology, framing.Radius, workers);
        cancel.ThrowIfCancellationRequested();
        bool IsContainment(Fate fate) => fate.Kind == FateKind.Well && ServesContainment(topology, fate.Feature);
        Geometry joint = map.ZoneOf(IsContainment);

        progress?.Report(new Step("travel-time zones, plumes and heads", 0.5));
        KnownHeadInfluence? knownHead = KnownHeadInfluence.Of(levels, field);
        Geometry extent = GeometryKit.Factory.ToGeometry(framing.Extent);
        WellAnswer[] wells = new WellAnswer[field.System.Wells.Length];
        PlumeAnswer[] plumes = new PlumeAnswer[questions.Plumes.Length];
        HeadContourMap? contours = null;
        workers.For(wells.Length + plumes.Length + 1, part =>
        {
            cancel.ThrowIfCancellationRequested();
            int plume = part - wells.Length;
            if (plume < 0)
            {
                wells[part] = AnswerOf(part, topology, map, levels, questions, extent);
            }
            else if (plume < plumes.Length)
            {
                plumes[plume] = PlumeJudge.Judge(topology, map, joint, plume, questions.Plumes[plume], IsContainment);
            }
            else
            {
                contours = HeadContours.Find(field, framing.Extent, questions.HeadUnit);
            }
        });
        cancel.ThrowIfCancellationRequested();

        progress?.Report(new Step("checks", 0.9));
        return new SiteAnswers
        {
            Field = field,
            Questions = questions,
            Extent = framing.Extent,
            StagnationPoints = topology.Points,
            StagnationComplete = topology.Complete,
            Wells = [.. wells],
            ContainmentZone = joint,
            Plumes = [.. plumes],
            Paths = ReportedPaths.Of(topology, questions.Plumes),
            Contours = contours!.Contours,
            ContourInterval = contours.Interval,
            Arrows = FlowArrows.Sample(field, framing.Extent, ArrowsAcross),
            Checks = SelfChecks.Of(topology, map, framing.Extent, wells, plumes, workers),
            Findings = Findings.Of(topology, levels, framing, questions, wells, plumes, knownHead),
            KnownHeadDistance = knownHead?.Distance,
            KnownHeadSensitivity = knownHead?.Sensitivity,
        };
    }

    /// <summary>Checks that the aquifer yields what the wells take: what <see cref="Run"/> checks first.</summary>
    /// <param name="model">The model.</param>
    /// <exception cref="DewateredException">A well takes more than the aquifer yields.</exception>
    public static void CheckYield(Model model) => ScreenLevels.Of(FlowSystem.Assemble(model).Solve());

    /// <summary>Flow arrows from one side of the extent to the other.</summary>
    private const int ArrowsAcross = 18;

    /// <summary>Wells at one place are one sink: it serves containment when one of them does.</summary>
    private static bool ServesContainment(FlowTopology topology, int well)
    {
        Well[] wells = topology.Field.System.Wells;
        return wells.Any(other => other.At == wells[well].At && other.Purpose == WellPurpose.Containment);
    }

    private static WellAnswer AnswerOf(
        int index, FlowTopology topology, FaceMap map, ScreenLevels levels, Questions questions, Geometry extent)
    {
        double rate = topology.Field.Parameters.Rates[index];
        if (!(rate > 0) || ScreenOf(topology, topology.Field.System.Wells[index]) is not { } screen)
        {
            return new WellAnswer(index, levels.Head(index), levels.Drawdown(index), rate > 0 ? levels.LargestRate(index) : null, null, []);
        }

        ImmutableArray<ScreenStretch> stretches = WaterOrigins.Stretches(topology, screen);
        return new WellAnswer(
            index,
            levels.Head(index),
            levels.Drawdown(index),
            levels.LargestRate(index),
            WellZones.Of(topology, map, screen, stretches, extent),
            TravelTimeZones.Of(topology, screen, stretches, questions.TravelTimes));
    }

    private static Screen? ScreenOf(FlowTopology topology, Well well)
    {
        foreach (Screen screen in topology.Stops.Screens)
        {
            if (topology.Field.System.Wells[screen.Well].At == well.At && screen.Rate > 0)
            {
                return screen;
            }
        }

        return null;
    }
}
