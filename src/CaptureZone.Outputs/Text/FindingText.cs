namespace CaptureZone.Outputs.Text;

/// <summary>A finding in words.</summary>
/// <param name="Code">Its code for machines; lower case, words joined by hyphens; fixed once given.</param>
/// <param name="Text">One sentence in the report's units.</param>
public sealed record FindingSentence(string Code, string Text);

/// <summary>Puts findings into words.</summary>
public static class FindingText
{
    /// <summary>Code and sentence of a finding.</summary>
    /// <param name="finding">The finding.</param>
    /// <param name="report">The report it belongs to; its units are used.</param>
    /// <exception cref="ArgumentOutOfRangeException">The kind has no sentence.</exception>
    public static FindingSentence Of(Finding finding, Report report) => Of(finding, new Printer(report.Site.Report.Units));

    private static FindingSentence Of(Finding finding, Printer print) => finding.Kind switch
    {
        FindingKind.PlumeReachesOtherWell => new(
            "plume-reaches-other-well",
            $"Water of {print.Percent(finding.Value)} of the area of plume {finding.Subject} flows to well {finding.Other}, "
            + "which is not a containment well."),
        FindingKind.PlumeEscapes => new(
            "plume-escapes",
            $"Water of {print.Percent(finding.Value)} of the area of plume {finding.Subject} passes the containment wells."),
        FindingKind.LevelBelowHalf => new(
            "level-below-half",
            $"At well {finding.Subject} {print.Length(finding.Value)} of saturated thickness is left, less than half of that "
            + $"without pumping ({print.Length(finding.Limit)})."),
        FindingKind.LevelBelowTop => new(
            "level-below-top",
            $"The level at the screen of well {finding.Subject}, {print.Elevation(finding.Value)}, is below the aquifer's top, "
            + $"{print.Elevation(finding.Limit)}."),
        FindingKind.KnownHeadInfluenced => new("known-head-influenced", KnownHead(finding, print)),
        FindingKind.DryInExtent => new(
            "dry-in-extent",
            $"The water table meets the aquifer's base within the extent: {print.Percent(finding.Value)} of the extent is dry."),
        FindingKind.StagnationInsideScreen => new(
            "stagnation-inside-screen",
            $"Well {finding.Subject} is so weak that its stagnation point lies inside its screen; its zone is not drawn true."),
        FindingKind.WholeAquifer => new(
            "whole-aquifer",
            $"Without regional flow well {finding.Subject} draws on the whole aquifer; its zone has no bounds."),
        FindingKind.WellsCoincide => new(
            "wells-coincide",
            $"Wells {finding.Subject} and {finding.Other} stand at one place and are computed as one."),
        FindingKind.PlumeOutsideExtent => new(
            "plume-outside-extent",
            $"Plume {finding.Subject} lies outside the extent; it is judged, but the map does not show it."),
        FindingKind.StagnationIncomplete => new(
            "stagnation-incomplete",
            "It is not certain that every stagnation point was found; zones and verdicts may be incomplete."),
        _ => throw new ArgumentOutOfRangeException(nameof(finding), finding.Kind, "The kind has no sentence."),
    };

    private static string KnownHead(Finding finding, Printer print)
    {
        double drawdown = Math.Abs(finding.Value);
        string moves = finding.Value < 0 ? "raise" : "lower";
        return $"Wells would {moves} the head where it is held by {print.Length(drawdown)}, more than a tenth of the largest "
            + $"drawdown in the extent ({print.Length(finding.Limit)}); choose a place farther from the wells.";
    }
}
