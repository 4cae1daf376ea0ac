using System.Globalization;
using System.Text;

namespace CaptureZone.Outputs.Memos;

/// <summary>Writes a memo as Markdown (CommonMark with tables), lines ended by LF.</summary>
public static class MarkdownWriter
{
    /// <summary>Characters that Markdown could take for its own.</summary>
    private const string Special = "\\`*_[]<>|#~&$";

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

    private static string Row(IEnumerable<string> cells) => "| " + string.Join(" | ", cells.Select(Escape)) + " |";

    private static string Text(Figure figure) => string.Create(
        CultureInfo.InvariantCulture,
        $"![{Escape(figure.AlternativeText)}]({figure.File})\n\n**Figure {figure.Number}.** {Escape(figure.Caption)}");

    private static string Text(FormLine line) =>
        $"- {Escape(line.Label)}: {(line.Value.Length == 0 ? new string('_', 40) : Escape(line.Value))}";

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

    /// <summary>The text as Markdown that shows it letter by letter.</summary>
    /// <param name="text">Any text.</param>
    internal static string Escape(string text)
    {
        string line = PlainText.OnOneLine(text).Trim();
        int marker = MarkerIn(line);
        StringBuilder escaped = new(line.Length + 8);
        for (int i = 0; i < line.Length; i++)
        {
            escaped.Append(i == marker || Special.Contains(line[i], StringComparison.Ordinal) ? "\\" : "").Append(line[i]);
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
