using CaptureZone.Outputs.Text;
using CaptureZone.Sites;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What the memo is about, for whom and by whom, and what it is not.</summary>
internal static class Particulars
{
    public static IEnumerable<Block> Of(Facts facts)
    {
        ReportSettings settings = facts.Site.Report;
        yield return new Form(
        [
            new("Site", Facts.OrNotGiven(facts.Site.Title)),
            new("Project or file number", Facts.OrNotGiven(settings.Project)),
            new("Date", Facts.OrNotGiven(settings.Date)),
            new("Prepared for", Facts.OrNotGiven(settings.PreparedFor)),
            new("Prepared by", Facts.OrNotGiven(settings.PreparedBy)),
        ]);
        yield return new Paragraph(Caution.Text, Tone.Caution);
    }
}
