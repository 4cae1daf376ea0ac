using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>What the user must know of a run, most serious first.</summary>
internal static class Findings
{
    /// <summary>Drawdown at the known head above this share of the largest drawdown is told.</summary>
    private const double InfluenceShare = 0.1;

    /// <summary>Points across the extent at which it is looked for dry places.</summary>
    private const int DryGrid = 60;

    /// <summary>All findings.</summary>
    internal static ImmutableArray<Finding> Of(
        FlowTopology topology,
        ScreenLevels levels,
        Framing framing,
        Questions questions,
        IReadOnlyList<WellAnswer> wells,
        IReadOnlyList<PlumeAnswer> plumes,
        KnownHeadInfluence? knownHead) =>
    [
        .. plumes.SelectMany(plume => OfPlume(topology.Field, questions, plume)).OrderBy(finding => finding.Kind),
        .. topology.Complete ? Array.Empty<Finding>() : [new Finding(FindingKind.StagnationIncomplete, "", "", 0, 0)],
        .. wells.SelectMany(well => OfLevels(topology.Field, levels, well)).OrderBy(finding => finding.Kind),
        .. OfKnownHead(wells, knownHead),
        .. OfDryPlaces(topology.Field, framing.Extent),
        .. wells.SelectMany(well => OfWell(topology, well)).OrderBy(finding => finding.Kind),
        .. questions.Plumes
            .Where(plume => !framing.Extent.Contains(plume.Outline.EnvelopeInternal))
            .Select(plume => new Finding(FindingKind.PlumeOutsideExtent, plume.Name, "", 0, 0)),
    ];

    private static IEnumerable<Finding> OfPlume(FlowField field, Questions questions, PlumeAnswer plume)
    {
        string name = questions.Plumes[plume.Plume].Name;
        foreach (PlumeShare share in plume.EscapesTo)
        {
            if (share.Fate.Kind == FateKind.Well)
            {
                yield return new Finding(
                    FindingKind.PlumeReachesOtherWell, name, field.System.Wells[share.Fate.Feature].Name, share.Fraction, 0);
            }
        }

        if (!plume.Captured)
        {
            yield return new Finding(FindingKind.PlumeEscapes, name, "", 1 - plume.CapturedFraction, 0);
        }
    }

    private static IEnumerable<Finding> OfLevels(FlowField field, ScreenLevels levels, WellAnswer answer)
    {
        Well well = field.System.Wells[answer.Well];
        Aquifer aquifer = field.AquiferAt(well.At);
        if (!(field.Parameters.Rates[answer.Well] > 0))
        {
            yield break;
        }

        double half = levels.ThicknessOff(answer.Well) / 2;
        if (levels.Thickness(answer.Well) < half)
        {
            yield return new Finding(FindingKind.LevelBelowHalf, well.Name, "", levels.Thickness(answer.Well), half);
        }
        else if (answer.HeadAtScreen < aquifer.Top)
        {
            yield return new Finding(FindingKind.LevelBelowTop, well.Name, "", answer.HeadAtScreen, aquifer.Top.Value);
        }
    }

    private static IEnumerable<Finding> OfKnownHead(IReadOnlyList<WellAnswer> wells, KnownHeadInfluence? knownHead)
    {
        double largest = wells.Select(well => Math.Abs(well.DrawdownAtScreen)).DefaultIfEmpty(0).Max();
        if (knownHead is not null && Math.Abs(knownHead.DrawdownThere) > InfluenceShare * largest)
        {
            yield return new Finding(
                FindingKind.KnownHeadInfluenced, "", "", knownHead.DrawdownThere, InfluenceShare * largest);
        }
    }

    private static IEnumerable<Finding> OfDryPlaces(FlowField field, Envelope extent)
    {
        int dry = 0;
        for (int i = 0; i < DryGrid * DryGrid; i++)
        {
            double x = extent.MinX + extent.Width * (i % DryGrid + 0.5) / DryGrid;
            double y = extent.MinY + extent.Height * (i / DryGrid + 0.5) / DryGrid;
            dry += field.FlowAt(new Complex(x, y)).Potential <= 0 ? 1 : 0;
        }

        if (dry > 0)
        {
            yield return new Finding(FindingKind.DryInExtent, "", "", (double)dry / (DryGrid * DryGrid), 0);
        }
    }

    private static IEnumerable<Finding> OfWell(FlowTopology topology, WellAnswer answer)
    {
        Well[] wells = topology.Field.System.Wells;
        Well well = wells[answer.Well];
        if (topology.Points.Any(point => Complex.Abs(point.At - well.At) <= well.Radius))
        {
            yield return new Finding(FindingKind.StagnationInsideScreen, well.Name, "", 0, 0);
        }

        if (answer.Zone is { Open: true, WidthUpgradient: null })
        {
            yield return new Finding(FindingKind.WholeAquifer, well.Name, "", 0, 0);
        }

        foreach (Well other in wells[..answer.Well].Where(other => other.At == well.At))
        {
            yield return new Finding(FindingKind.WellsCoincide, other.Name, well.Name, 0, 0);
        }
    }
}
