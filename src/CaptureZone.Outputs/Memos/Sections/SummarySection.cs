using System.Globalization;
using CaptureZone.Outputs.Text;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What is wrong comes first, then what the reader must know, then what is predicted.</summary>
internal static class SummarySection
{
    public static IEnumerable<Block> Of(Facts facts) =>
    [
        new Heading(1, "Summary"),
        .. Failures(facts).Concat(Findings(facts)).Concat(Unusual(facts)).Select(text => new Paragraph(text, Tone.Warning)),
        .. facts.Plumes.SelectMany(plume => new Block[]
        {
            new Heading(2, $"Plume {plume.Plume.Name}"),
            new Paragraph(Verdict.Sentence(plume.Answer, facts), Tone.Verdict),
            new Paragraph(Verdict.Rest(plume.Answer, facts)),
        }),
        .. facts.Answers.Plumes.IsEmpty ? [new Paragraph(WithoutPlume(facts))] : Array.Empty<Block>(),
    ];

    private static IEnumerable<string> Failures(Facts facts) =>
        from check in facts.Answers.Checks
        where !check.Passed
        select $"Failed check: {check.Name} is {facts.Print.Ratio(check.Value)}, the limit is {facts.Print.Ratio(check.Limit)}. "
            + "Do not rely on the results of this memo before the cause is found.";

    private static IEnumerable<string> Findings(Facts facts) =>
        facts.Answers.Findings.Select(finding => "Warning: " + FindingText.Of(finding, facts.Report).Text);

    private static IEnumerable<string> Unusual(Facts facts) => facts.Site.Warnings.Select(complaint =>
        string.Create(CultureInfo.InvariantCulture, $"Unusual input (line {complaint.Line} of the site file): {complaint.Text}"));

    private static string WithoutPlume(Facts facts)
    {
        string wells = Facts.Names(facts.Zones.Select(zone => zone.Well.Name));
        return wells.Length == 0
            ? "No plume and no extraction well is given; no zone is computed."
            : $"No plume is given. For the inputs in Table 1 at steady state, the calculation predicts the zones of {wells}; "
                + "not yet shown in the field.";
    }
}
