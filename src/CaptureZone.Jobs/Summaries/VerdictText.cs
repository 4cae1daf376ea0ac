using System.Collections.Immutable;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Text;
using CaptureZone.Zones;

namespace CaptureZone.Jobs.Summaries;

/// <summary>The verdict on a plume in one sentence that claims no more than a calculation can.</summary>
internal static class VerdictText
{
    /// <summary>The sentence.</summary>
    /// <param name="answer">What was found for the plume.</param>
    /// <param name="report">The report it belongs to.</param>
    public static string Of(PlumeAnswer answer, Report report)
    {
        Printer print = new(report.Site.Report.Units);
        return $"For the inputs in this file at steady state, the calculation predicts that {Captured(answer, report, print)}"
            + $"{Escapes(answer, report, print)}{Margin(answer, print)}; not yet shown in the field.";
    }

    private static string Captured(PlumeAnswer answer, Report report, Printer print)
    {
        if (answer.CapturedBy.IsEmpty)
        {
            return "none of the plume's area flows to a containment well";
        }

        ImmutableArray<string> names = [.. answer.CapturedBy.Select(share => FateText.WellName(share.Fate, report.Site.Model))];
        return $"{print.Percent(answer.CapturedFraction)} of the plume's area flows to containment "
            + $"{(names.Length == 1 ? "well" : "wells")} {string.Join(", ", names)}";
    }

    private static string Escapes(PlumeAnswer answer, Report report, Printer print) =>
        string.Concat(answer.EscapesTo.Select(share =>
            $"; {print.Percent(share.Fraction)} goes to {FateText.Destination(share.Fate, report.Site.Model)}"));

    private static string Margin(PlumeAnswer answer, Printer print) => answer.Margin switch
    {
        null => "",
        < 0 and var outside => $"; it reaches {print.Length(-outside)} beyond the capture zone",
        { } inside => $"; smallest margin {print.Length(inside)}",
    };
}
