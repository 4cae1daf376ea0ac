namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>All that is needed to compute the same again.</summary>
internal static class SiteFileAppendix
{
    public static IEnumerable<Block> Of(Facts facts) =>
    [
        new Heading(1, "Appendix: site file") { IsCounted = false, StartsPage = true },
        new Form(
        [
            new("File", facts.Site.FileName),
            new("SHA-256", facts.Site.Sha256),
            new("Program", $"capturezone {facts.Report.ProgramVersion}"),
        ]),
        new CodeText(facts.Site.Text),
    ];
}
