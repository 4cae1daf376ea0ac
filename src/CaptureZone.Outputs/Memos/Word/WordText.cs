using System.Globalization;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Wordprocessing;
using W = DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>Runs, fields and paragraphs.</summary>
internal static class WordText
{
    /// <summary>A paragraph in a style.</summary>
    /// <param name="style">The style's id.</param>
    /// <param name="content">What stands in it.</param>
    public static W.Paragraph Paragraph(string style, params OpenXmlElement[] content)
    {
        W.Paragraph paragraph = new(new ParagraphProperties(new ParagraphStyleId { Val = style }));
        paragraph.Append(content);
        return paragraph;
    }

    /// <summary>A run on one line.</summary>
    /// <param name="text">Any text.</param>
    public static Run Run(string text) => new(Letters(PlainText.OnOneLine(text)));

    /// <summary>A run whose tabs are kept.</summary>
    /// <param name="line">One clean line.</param>
    public static Run RunWithTabs(string line)
    {
        Run run = new();
        string[] pieces = line.Split('\t');
        for (int i = 0; i < pieces.Length; i++)
        {
            if (i > 0)
            {
                run.Append(new TabChar());
            }

            run.Append(Letters(pieces[i]));
        }

        return run;
    }

    /// <summary>A field that an office program counts anew; the number is what shows until then.</summary>
    /// <param name="code">The field's code.</param>
    /// <param name="number">The number.</param>
    public static SimpleField Field(string code, int number) =>
        new(Run(number.ToString(CultureInfo.InvariantCulture))) { Instruction = code };

    /// <summary>A caption with its number.</summary>
    /// <param name="kind">"Table" or "Figure".</param>
    /// <param name="number">Its number.</param>
    /// <param name="text">Its text.</param>
    public static W.Paragraph Caption(string kind, int number, string text) =>
        Paragraph(WordStyles.Caption, Run(kind + " "), Field($" SEQ {kind} \\* ARABIC ", number), Run(". " + text));

    /// <summary>Space before and after a paragraph, twentieths of a point.</summary>
    /// <param name="before">Before it.</param>
    /// <param name="after">After it.</param>
    public static SpacingBetweenLines Space(int before, int after) => new()
    {
        Before = before.ToString(CultureInfo.InvariantCulture),
        After = after.ToString(CultureInfo.InvariantCulture),
    };

    private static W.Text Letters(string text) => new(text) { Space = SpaceProcessingModeValues.Preserve };
}
