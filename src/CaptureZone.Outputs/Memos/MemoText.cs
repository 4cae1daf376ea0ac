using CaptureZone.Outputs.Memos.Sections;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;

namespace CaptureZone.Outputs.Memos;

/// <summary>What the memo says: each section a pure function of the report.</summary>
public static class MemoText
{
    /// <summary>The memo of a report.</summary>
    /// <param name="report">The report.</param>
    /// <param name="mapFile">Name of the map's file, which lies beside the memo.</param>
    public static Memo Of(Report report, string mapFile)
    {
        Facts facts = new(report);
        ReportSettings settings = report.Site.Report;
        IEnumerable<Block> blocks =
        [
            .. Particulars.Of(facts),
            .. DecisionSection.Of(facts),
            .. SummarySection.Of(facts),
            .. MapSection.Of(facts, mapFile),
            .. ConceptualModelSection.Of(facts),
            .. InputsSection.Of(facts),
            .. MethodSection.Of(facts),
            .. WellsSection.Of(facts),
            .. HandCheckSection.Of(facts),
            .. PlumesSection.Of(facts),
            .. ChecksSection.Of(facts),
            .. LimitsSection.Of(),
            .. FieldSection.Of(facts),
            .. SignatureSection.Of(),
            .. SiteFileAppendix.Of(facts),
        ];
        return new(
            $"Ground-water capture zones: {report.Site.Title}",
            string.Join("  |  ", new[] { report.Site.Title, settings.Project, settings.Date }.Where(text => text.Length > 0)),
            settings.PreparedBy,
            Caution.Text,
            settings.Units == ReportUnits.Us ? Paper.Letter : Paper.A4,
            [.. Numbering.Of(blocks)]);
    }
}
