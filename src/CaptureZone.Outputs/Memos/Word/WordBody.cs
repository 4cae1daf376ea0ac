using System.Collections.Immutable;
using DocumentFormat.OpenXml;
using W = DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>Each block of a memo as Word's elements.</summary>
/// <param name="page">The page.</param>
/// <param name="png">The picture.</param>
/// <param name="pictureId">The picture's relationship.</param>
internal sealed class WordBody(WordPage page, byte[] png, string pictureId)
{
    /// <summary>The elements of all blocks.</summary>
    /// <param name="blocks">The blocks.</param>
    public IEnumerable<OpenXmlElement> Of(ImmutableArray<Block> blocks) =>
        blocks.SelectMany((block, i) => block is Paragraph && i + 1 < blocks.Length && blocks[i + 1] is Table or Form or Bullets
            ? KeptWithNext(Of(block))
            : Of(block));

    private IEnumerable<OpenXmlElement> Of(Block block) => block switch
    {
        Heading heading => [Of(heading)],
        Paragraph paragraph => [WordText.Paragraph(StyleOf(paragraph.Tone), WordText.Run(paragraph.Text))],
        Bullets bullets => Of(bullets),
        Table table => WordTable.Of(table, page),
        Figure figure => WordFigure.Of(figure, png, pictureId, page),
        Form form => WordTable.Of(form, page),
        CodeText code => PlainText.Lines(code.Text).Select(line => WordText.Paragraph(WordStyles.Code, WordText.RunWithTabs(line))),
        _ => throw new ArgumentException($"No Word text for {block.GetType().Name}.", nameof(block)),
    };

    /// <summary>A paragraph that introduces what follows does not stand alone at the foot of a page.</summary>
    private static IEnumerable<OpenXmlElement> KeptWithNext(IEnumerable<OpenXmlElement> elements) => elements.Select(element =>
    {
        ((W.Paragraph)element).ParagraphProperties!.KeepNext = new();
        return element;
    });

    /// <summary>No point of a list stands alone at the head or the foot of a page.</summary>
    private static IEnumerable<OpenXmlElement> Of(Bullets bullets)
    {
        const int SpaceBelowList = 120;
        int last = bullets.Items.Length - 1;
        return bullets.Items.Select((item, i) =>
        {
            W.Paragraph point = WordText.Paragraph(WordStyles.Bullet, WordText.Run(item));
            point.ParagraphProperties!.KeepNext = i != last && (i == 0 || i == last - 1) ? new() : null;
            point.ParagraphProperties.SpacingBetweenLines = i == last ? WordText.Space(0, SpaceBelowList) : null;
            return point;
        });
    }

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
