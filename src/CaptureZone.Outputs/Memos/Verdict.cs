using System.Collections.Immutable;
using CaptureZone.Outputs.Text;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Memos;

/// <summary>The verdict in words that promise no more than a calculation can.</summary>
internal static class Verdict
{
    /// <summary>What is predicted for a plume, in the one form that is used.</summary>
    /// <param name="answer">The plume's answer.</param>
    /// <param name="facts">The memo's facts.</param>
    public static string Sentence(PlumeAnswer answer, Facts facts)
    {
        string margin = answer.Margin is { } metres ? facts.Print.Length(metres) : "not defined";
        return "For the inputs in Table 1 at steady state, the calculation predicts that "
            + $"{facts.Print.Percent(answer.CapturedFraction)} of the plume's area flows to containment wells {Wells(answer, facts)}, "
            + $"smallest margin {margin}; not yet shown in the field.";
    }

    /// <summary>Where the water of the rest of the plume goes.</summary>
    /// <param name="answer">The plume's answer.</param>
    /// <param name="facts">The memo's facts.</param>
    public static string Rest(PlumeAnswer answer, Facts facts) => answer.EscapesTo.IsEmpty
        ? "No part of the plume is predicted to flow elsewhere."
        : "The rest is predicted to flow "
            + string.Join(", ", Shares(answer.EscapesTo, facts).Select(share => $"to {share.Destination} ({share.Share})"))
            + '.';

    /// <summary>Destinations with their shares.</summary>
    /// <param name="shares">Shares of the plume's area.</param>
    /// <param name="facts">The memo's facts.</param>
    public static IEnumerable<(string Destination, string Share)> Shares(ImmutableArray<PlumeShare> shares, Facts facts) =>
        shares.Select(share => (FateText.Destination(share.Fate, facts.Site.Model), facts.Print.Percent(share.Fraction)));

    /// <summary>The wells that take it, or, when none does, those that should.</summary>
    private static string Wells(PlumeAnswer answer, Facts facts)
    {
        string[] names = answer.CapturedBy.IsEmpty
            ? [.. facts.Containment.Select(well => well.Name)]
            : [.. answer.CapturedBy.Select(share => FateText.WellName(share.Fate, facts.Site.Model))];
        return names.Length == 0 ? "(none pumps)" : Facts.Names(names);
    }
}
