using CaptureZone.Outputs.Text;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What the calculation checks of itself, and how much rests on where the head is known.</summary>
internal static class ChecksSection
{
    public static IEnumerable<Block> Of(Facts facts)
    {
        yield return new Heading(1, "Checks of the calculation");
        yield return new Paragraph(
            "These checks show that the calculation solves its own equations. They do not show that the equations describe the site.");
        if (!facts.Answers.Checks.IsEmpty)
        {
            yield return new Table(
                "Checks that the calculation makes of itself.",
                [new("Check", 55), new("Value", 17, IsNumeric: true), new("Limit", 15, IsNumeric: true), new("Passed", 13)],
                [.. facts.Answers.Checks.Select(check => Row(check, facts.Print))]);
        }

        yield return new Paragraph(KnownHead(facts));
    }

    private static System.Collections.Immutable.ImmutableArray<string> Row(Check check, Printer print) =>
        [check.Name, print.Ratio(check.Value), print.Ratio(check.Limit), check.Passed ? "yes" : "NO"];

    private static string KnownHead(Facts facts) =>
        facts.Answers is { KnownHeadDistance: { } distance, KnownHeadSensitivity: { } change }
            ? $"Known head: it is held {facts.Print.Length(distance)} from the nearest well. If that distance were doubled, the drawdowns "
                + $"at the screens would change by at most {facts.Print.Length(change)}."
            : "Known head: without wells it has no influence on drawdowns.";
}
