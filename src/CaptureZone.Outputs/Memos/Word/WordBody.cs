using W = DocumentFormat.OpenXml.Wordprocessing;
using DocumentFormat.OpenXml;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>Each block of a memo as Word's elements.</summary>
/// <param name="page">The page.</param>
/// <param name="png">The picture.</param>
/// <param name="pictureId">The picture's relationship.</param>
internal sealed class WordBody(WordPage page, byte[] png, string pictureId)
{
    /// <summary>The elements of a block.</summary>
    /// <param name="block">The block.</param>
    public IEnumerable<OpenXmlElement> Of(Block block) => block switch
    {
        Heading heading => [Of(heading)],
        Paragraph paragraph => [WordText.Paragraph(StyleOf(paragraph.Tone), WordText.Run(paragraph.Text))],
        Bullets bullets => bullets.Items.Select(item => WordText.Paragraph(WordStyles.Bullet, WordText.Run(item))),
        Table table => WordTable.Of(table, page),
        Figure figure => WordFigure.Of(figure, png, pictureId, page),
        Form form => WordTable.Of(form, page),
        CodeText code => PlainText.Lines(code.Text).Select(line => WordText.Paragraph(WordStyles.Code, WordText.RunWithTabs(line))),
        _ => throw new ArgumentException($"No Word text for {block.GetType().Name}.", nameof(block)),
    };

    private static W.Paragraph Of(Heading heading)
    {
        string text = heading.Number.Length == 0 ? heading.Text : $"{heading.Number} {heading.Text}";
        W.Paragraph paragraph = WordText.Paragraph(WordStyles.Heading(heading.Level), WordText.Run(text));
        paragraph.ParagraphProperties!.PageBreakBefore = heading.StartsPage ? new() : null;
        return paragraph;
    }

    private static string StyleOf(Tone tone) => tone switch
    {
        Tone.Verdict => WordStyles.Verdict,
        Tone.Warning => WordStyles.Warning,
        Tone.Caution => WordStyles.Caution,
        _ => WordStyles.Normal,
    };
}
