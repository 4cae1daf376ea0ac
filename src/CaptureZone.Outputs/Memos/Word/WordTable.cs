using System.Collections.Immutable;
using System.Globalization;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Wordprocessing;
using W = DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>Tables and forms of the Word memo.</summary>
internal static class WordTable
{
    /// <summary>A table of at most so many rows is kept on one page; a longer one may break between rows.</summary>
    private const int RowsKeptTogether = 12;

    /// <summary>Left and right in every cell, twentieths of a point: 1.8 mm.</summary>
    private const short CellMargin = 100;

    /// <summary>A form's labels take this share of the width; the rest holds a SHA-256 on one line.</summary>
    private const double LabelShare = 0.27;

    /// <summary>The table with its caption above it, and a space below.</summary>
    /// <param name="table">The table.</param>
    /// <param name="page">The page.</param>
    public static IEnumerable<OpenXmlElement> Of(Table table, WordPage page)
    {
        int[] widths = Widths([.. table.Columns.Select(column => column.Width)], page.TextWidth);
        W.Table grid = Grid(widths, new TableBorders(
            Rule<TopBorder>(8), Rule<BottomBorder>(8), Rule<InsideHorizontalBorder>(4, WordStyles.Pale)));
        grid.Append(HeaderRow(table, widths));
        for (int i = 0; i < table.Rows.Length; i++)
        {
            bool keepNext = table.Rows.Length <= RowsKeptTogether && i + 1 < table.Rows.Length;
            grid.Append(Row(table, table.Rows[i], widths, keepNext));
        }

        return [WordText.Caption("Table", table.Number, table.Caption), grid, WordText.Paragraph(WordStyles.Gap)];
    }

    /// <summary>The form, and a space below.</summary>
    /// <param name="form">The form.</param>
    /// <param name="page">The page.</param>
    public static IEnumerable<OpenXmlElement> Of(Form form, WordPage page)
    {
        int[] widths = Widths([LabelShare, 1 - LabelShare], page.TextWidth);
        W.Table grid = Grid(widths, new TableBorders());
        foreach (FormLine line in form.Lines)
        {
            grid.Append(Row(line, widths, keepNext: line != form.Lines[^1]));
        }

        return [grid, WordText.Paragraph(WordStyles.Gap)];
    }

    private static W.Table Grid(int[] widths, TableBorders borders)
    {
        TableProperties properties = new(
            new TableWidth { Width = Text(widths.Sum()), Type = TableWidthUnitValues.Dxa });
        if (borders.HasChildren)
        {
            properties.Append(borders);
        }

        properties.Append(
            new TableLayout { Type = TableLayoutValues.Fixed },
            new TableCellMarginDefault(
                new TableCellLeftMargin { Width = CellMargin, Type = TableWidthValues.Dxa },
                new TableCellRightMargin { Width = CellMargin, Type = TableWidthValues.Dxa }));
        return new(properties, new TableGrid(widths.Select(width => new GridColumn { Width = Text(width) })));
    }

    private static TableRow HeaderRow(Table table, int[] widths)
    {
        TableRow row = new(new TableRowProperties(new CantSplit(), new TableHeader()));
        for (int i = 0; i < widths.Length; i++)
        {
            W.Paragraph paragraph = Aligned(WordStyles.HeaderCell, table.Columns[i].Header, table.Columns[i].IsNumeric);
            Shading ground = new() { Val = ShadingPatternValues.Clear, Color = "auto", Fill = WordStyles.Ground };
            row.Append(Cell(widths[i], paragraph, ground, new TableCellVerticalAlignment { Val = TableVerticalAlignmentValues.Bottom }));
        }

        return row;
    }

    private static TableRow Row(Table table, ImmutableArray<string> cells, int[] widths, bool keepNext)
    {
        TableRow row = new(new TableRowProperties(new CantSplit()));
        for (int i = 0; i < widths.Length; i++)
        {
            W.Paragraph paragraph = Aligned(WordStyles.Cell, cells[i], table.Columns[i].IsNumeric);
            paragraph.ParagraphProperties!.KeepNext = keepNext ? new() : null;
            row.Append(Cell(widths[i], paragraph));
        }

        return row;
    }

    /// <summary>A line to be filled in by hand is ruled and tall enough for a pen.</summary>
    private static TableRow Row(FormLine line, int[] widths, bool keepNext)
    {
        const uint PenHeight = 560;
        bool isOpen = line.Value.Length == 0;
        TableRow row = new(new TableRowProperties(new CantSplit()));
        if (isOpen)
        {
            row.TableRowProperties!.Append(new TableRowHeight { Val = PenHeight, HeightType = HeightRuleValues.AtLeast });
        }

        W.Paragraph label = WordText.Paragraph(WordStyles.Label, WordText.Run(line.Label));
        W.Paragraph value = WordText.Paragraph(WordStyles.Value, WordText.Run(line.Value));
        label.ParagraphProperties!.KeepNext = keepNext ? new() : null;
        value.ParagraphProperties!.KeepNext = keepNext ? new() : null;
        TableCellVerticalAlignment bottom = new() { Val = TableVerticalAlignmentValues.Bottom };
        row.Append(Cell(widths[0], label, (OpenXmlElement)bottom.CloneNode(true)));
        row.Append(isOpen ? Cell(widths[1], value, new TableCellBorders(Rule<BottomBorder>(4)), bottom) : Cell(widths[1], value, bottom));
        return row;
    }

    private static TableCell Cell(int width, W.Paragraph paragraph, params OpenXmlElement[] look)
    {
        TableCellProperties properties = new(new TableCellWidth { Width = Text(width), Type = TableWidthUnitValues.Dxa });
        properties.Append(look);
        return new(properties, paragraph);
    }

    private static W.Paragraph Aligned(string style, string text, bool isNumeric)
    {
        W.Paragraph paragraph = WordText.Paragraph(style, WordText.Run(text));
        paragraph.ParagraphProperties!.Justification = isNumeric ? new() { Val = JustificationValues.Right } : null;
        return paragraph;
    }

    private static TBorder Rule<TBorder>(uint eighths, string colour = WordStyles.Ink)
        where TBorder : BorderType, new() => new() { Val = BorderValues.Single, Size = eighths, Space = 0, Color = colour };

    private static int[] Widths(double[] shares, int total) => [.. shares.Select(share => (int)(share / shares.Sum() * total))];

    private static string Text(int twentieths) => twentieths.ToString(CultureInfo.InvariantCulture);
}
