using System.Globalization;
using System.Text;

namespace CaptureZone.Outputs.Memos;

/// <summary>Writes a memo as Markdown (CommonMark with tables), lines ended by LF.</summary>
public static class MarkdownWriter
{
    /// <summary>Characters that Markdown could take for its own.</summary>
    private const string Special = "\\`*_[]<>|#~&$";

    /// <summary>Characters of a line to be filled in by hand.</summary>
    private const int LineToFillIn = 40;

    /// <summary>The memo's text.</summary>
    /// <param name="memo">The memo.</param>
    public static string Write(Memo memo) =>
        $"# {Escape(memo.Title)}\n\n"
        + string.Concat(memo.Blocks.Select(block => Text(block) + "\n\n"))
        + $"---\n\n*{Escape(memo.Caution)}*\n";

    private static string Text(Block block) => block switch
    {
        Heading heading => $"{new string('#', heading.Level + 1)} {Numbered(heading)}",
        Paragraph paragraph => Text(paragraph),
        Bullets bullets => string.Join('\n', bullets.Items.Select(item => $"- {Escape(item)}")),
        Table table => Text(table),
        Figure figure => Text(figure),
        Form form => string.Join('\n', form.Lines.Select(Text)),
        CodeText code => Text(code),
        _ => throw new ArgumentException($"No Markdown for {block.GetType().Name}.", nameof(block)),
    };

    private static string Numbered(Heading heading) =>
        heading.Number.Length == 0 ? Escape(heading.Text) : $"{heading.Number} {Escape(heading.Text)}";

    private static string Text(Paragraph paragraph) => paragraph.Tone switch
    {
        Tone.Verdict or Tone.Warning => $"> **{Escape(paragraph.Text)}**",
        Tone.Caution => $"*{Escape(paragraph.Text)}*",
        _ => Escape(paragraph.Text),
    };

    private static string Text(Table table)
    {
        StringBuilder text = new();
        text.Append(CultureInfo.InvariantCulture, $"**Table {table.Number}.** {Escape(table.Caption)}\n\n");
        text.Append(Row(table.Columns.Select(column => column.Header))).Append('\n');
        text.Append('|').AppendJoin('|', table.Columns.Select(column => column.IsNumeric ? " ---: " : " --- ")).Append("|\n");
        return text.AppendJoin('\n', table.Rows.Select(row => Row(row))).ToString();
    }

    private static string Row(IEnumerable<string> cells) => "| " + string.Join(" | ", cells.Select(Inline)) + " |";

    private static string Text(Figure figure) => string.Create(
        CultureInfo.InvariantCulture,
        $"![{Escape(figure.AlternativeText)}]({figure.File})\n\n**Figure {figure.Number}.** {Escape(figure.Caption)}");

    private static string Text(FormLine line) =>
        $"- {Escape(line.Label)}: {(line.Value.Length == 0 ? new string('_', LineToFillIn) : Inline(line.Value))}";

    /// <summary>Fenced by more back-ticks than the text has in a row anywhere, so that nothing in it ends the fence.</summary>
    private static string Text(CodeText code)
    {
        string text = string.Join('\n', PlainText.Lines(code.Text));
        string fence = "```";
        while (text.Contains(fence, StringComparison.Ordinal))
        {
            fence += '`';
        }

        return $"{fence}toml\n{text}\n{fence}";
    }

    /// <summary>The start of a block as Markdown that shows it letter by letter.</summary>
    private static string Escape(string text)
    {
        string line = PlainText.OnOneLine(text).Trim();
        return MarkerIn(line) is >= 0 and var marker
            ? $"{line[..marker]}\\{line[marker]}{Inline(line[(marker + 1)..])}"
            : Inline(line);
    }

    /// <summary>Text inside a line as Markdown that shows it letter by letter.</summary>
    private static string Inline(string text)
    {
        StringBuilder escaped = new(text.Length);
        foreach (char character in PlainText.OnOneLine(text))
        {
            escaped.Append(Special.Contains(character, StringComparison.Ordinal) ? "\\" : "").Append(character);
        }

        return escaped.ToString();
    }

    /// <summary>Where the line starts with what Markdown would read as a list's mark or a rule; -1 where it does not.</summary>
    private static int MarkerIn(string line)
    {
        int digits = line.TakeWhile(char.IsAsciiDigit).Count();
        char mark = line.ElementAtOrDefault(digits), next = line.ElementAtOrDefault(digits + 1);
        bool isMark = digits > 0
            ? mark is '.' or ')' && next is ' ' or '\0'
            : mark is '-' or '+' or '=' && (next is ' ' or '\0' || next == mark);
        return isMark ? digits : -1;
    }
}
