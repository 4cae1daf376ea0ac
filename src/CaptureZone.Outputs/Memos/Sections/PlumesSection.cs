using CaptureZone.Zones;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>Where each plume's water goes, with what margin, and when it arrives.</summary>
internal static class PlumesSection
{
    public static IEnumerable<Block> Of(Facts facts) => facts.Answers.Plumes.IsEmpty
        ? []
        :
        [
            new Heading(1, "Results per plume"),
            .. facts.Plumes.SelectMany(plume => Of(plume.Plume, plume.Answer, facts)),
            new Paragraph(
                "Only containment wells count toward the share and the margins. A margin is the distance from the plume's outline to the "
                + "nearest edge of the containment wells' joint zone; it is negative where the plume sticks out, by the farthest point."),
        ];

    private static IEnumerable<Block> Of(Plume plume, PlumeAnswer answer, Facts facts)
    {
        yield return new Heading(2, $"Plume {plume.Name}");
        yield return new Table(
            $"Where the water of plume {plume.Name} is predicted to go.",
            [new("Destination", 50), new("Counts as", 30), new("Share of the plume's area", 20, IsNumeric: true)],
            [
                .. Verdict.Shares(answer.CapturedBy, facts).Select(share => Row(share, "containment")),
                .. Verdict.Shares(answer.EscapesTo, facts).Select(share => Row(share, "escape")),
            ]);
        yield return new Bullets([Margins(answer, facts), Arrival(plume, answer, facts)]);
    }

    private static System.Collections.Immutable.ImmutableArray<string> Row((string Destination, string Share) share, string countsAs) =>
        [share.Destination, countsAs, share.Share];

    private static string Margins(PlumeAnswer answer, Facts facts)
    {
        string share = answer.MarginShare is { } clean
            ? $"; clean water on the tighter side: {facts.Print.Percent(clean)} of the containment pumping"
            : "";
        return $"Margins: smallest {Margin(answer.Margin, facts)}; across the flow {Margin(answer.MarginSide, facts)}; toward the "
            + $"stagnation points {Margin(answer.MarginDowngradient, facts)}{share}.";
    }

    private static string Margin(double? metres, Facts facts) => metres is { } value ? facts.Print.Length(value) : "not defined";

    private static string Arrival(Plume plume, PlumeAnswer answer, Facts facts) => answer.Arrival is { } arrival
        ? $"Arrival of the plume's present water at the containment wells, with retardation {facts.Print.Ratio(plume.Retardation)}: "
            + $"{facts.Print.Time(arrival.P5)} for 5 %, {facts.Print.Time(arrival.P50)} for 50 %, {facts.Print.Time(arrival.P95)} for 95 % "
            + "of the area that flows there. These are not a clean-up time."
        : "Arrival: no water of the plume is predicted to reach a containment well.";
}
