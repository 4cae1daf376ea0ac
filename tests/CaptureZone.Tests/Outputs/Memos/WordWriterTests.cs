using CaptureZone.Outputs;
using CaptureZone.Outputs.Memos;
using CaptureZone.Outputs.Memos.Word;
using CaptureZone.Sites;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Packaging;
using DocumentFormat.OpenXml.Validation;
using DocumentFormat.OpenXml.Wordprocessing;
using M = CaptureZone.Outputs.Memos;
using W = DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Tests.Outputs.Memos;

public sealed class WordWriterTests
{
    /// <summary>A white PNG of 3 x 2 pixels.</summary>
    private static readonly byte[] Picture = Convert.FromBase64String(
        "iVBORw0KGgoAAAANSUhEUgAAAAMAAAACCAIAAAASFvFNAAAADklEQVR42mP4DwMMcBYAs2AR7yvfVyQAAAAASUVORK5CYII=");

    [Theory]
    [InlineData(ReportUnits.Metric)]
    [InlineData(ReportUnits.Us)]
    public void The_document_is_valid(ReportUnits units)
    {
        using WordprocessingDocument document = Open(Write(SampleReport.Create(units)));
        Assert.Empty(new OpenXmlValidator(FileFormatVersions.Microsoft365).Validate(document).Select(error => error.Description));
    }

    [Fact]
    public void The_same_report_gives_the_same_bytes_in_every_culture()
    {
        byte[] first = Write(SampleReport.Create());
        Assert.Equal(first, Write(SampleReport.Create()));
        Assert.Equal(first, Cultures.Under("de-DE", () => Write(SampleReport.Create())));
        Assert.Equal(first, Cultures.Under("tr-TR", () => Write(SampleReport.Create())));
    }

    [Fact]
    public void Both_files_say_the_same()
    {
        Memo memo = MemoText.Of(SampleReport.Create(), "map.png");
        string word = Text(WordWriter.Write(memo, Picture));
        IEnumerable<string> said = memo.Blocks.SelectMany(block => block switch
        {
            M.Paragraph paragraph => [paragraph.Text],
            Heading heading => [heading.Text],
            Bullets bullets => bullets.Items,
            M.Table table => table.Rows.SelectMany(row => row).Append(table.Caption),
            Figure figure => [figure.Caption],
            Form form => form.Lines.SelectMany(line => new[] { line.Label, line.Value }),
            CodeText code => code.Text.Split('\n'),
            _ => throw new InvalidOperationException(),
        });
        Assert.All(said, text => Assert.Contains(text, word, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_page_bears_the_caution_and_its_number()
    {
        Report report = SampleReport.Create();
        using WordprocessingDocument document = Open(Write(report));
        Footer footer = document.MainDocumentPart!.FooterParts.Single().Footer!;
        Assert.Equal(CaptureZone.Outputs.Text.Caution.Text + "page 1 of 1", footer.InnerText);
        Assert.Equal([" PAGE ", " NUMPAGES "], footer.Descendants<SimpleField>().Select(field => field.Instruction!.Value));
    }

    [Fact]
    public void Header_rows_repeat_and_numbers_stand_flush_right()
    {
        Report report = SampleReport.Create();
        using WordprocessingDocument document = Open(Write(report));
        var tables = MemoText.Of(report, "map.png").Blocks.OfType<M.Table>().ToArray();
        var grids = document.MainDocumentPart!.Document!.Body!.Elements<W.Table>()
            .Where(grid => grid.Descendants<TableHeader>().Any()).ToArray();
        Assert.Equal(tables.Length, grids.Length);
        foreach (var (table, grid) in tables.Zip(grids))
        {
            Assert.All(grid.Elements<TableRow>(), row => Assert.Equal(
                table.Columns.Select(column => column.IsNumeric),
                row.Elements<TableCell>().Select(IsFlushRight)));
        }
    }

    [Fact]
    public void The_map_has_an_alternative_text_and_keeps_its_shape()
    {
        using WordprocessingDocument document = Open(Write(SampleReport.Create()));
        var inline = document.MainDocumentPart!.Document!.Descendants<DocumentFormat.OpenXml.Drawing.Wordprocessing.Inline>().Single();
        Assert.StartsWith("Map of Larch Hollow", inline.DocProperties!.Description!.Value, StringComparison.Ordinal);
        Assert.Equal(1.5, (double)inline.Extent!.Cx!.Value / inline.Extent.Cy!.Value, 1e-3);
    }

    [Theory]
    [InlineData(ReportUnits.Metric, 11906u, 16838u)]
    [InlineData(ReportUnits.Us, 12240u, 15840u)]
    public void Metric_memos_are_on_A4_and_US_memos_on_Letter(ReportUnits units, uint width, uint height)
    {
        using WordprocessingDocument document = Open(Write(SampleReport.Create(units)));
        PageSize size = document.MainDocumentPart!.Document!.Descendants<PageSize>().Single();
        Assert.Equal((width, height), (size.Width!.Value, size.Height!.Value));
    }

    [Fact]
    public void Control_characters_in_a_title_do_no_harm()
    {
        Report report = SampleReport.Create();
        byte[] bytes = Write(report with { Site = report.Site with { Title = "Larch\u0000 \u000bHollow\nEast", Text = "a\tb\u0001" } });
        Assert.Contains("Larch\ufffd \ufffdHollow East", Text(bytes), StringComparison.Ordinal);
        using WordprocessingDocument document = Open(bytes);
        Assert.Empty(new OpenXmlValidator(FileFormatVersions.Microsoft365).Validate(document));
    }

    [Fact]
    public void Two_files_are_written()
    {
        string folder = Directory.CreateTempSubdirectory("memo-").FullName;
        try
        {
            Report report = SampleReport.Create();
            MemoFiles.Write(report, Picture, folder);
            Assert.Equal(["memo.docx", "memo.md"], Directory.GetFiles(folder).Select(Path.GetFileName).Order(StringComparer.Ordinal));
            Assert.Equal(Write(report), File.ReadAllBytes(Path.Combine(folder, "memo.docx")));
            Assert.Equal((byte)'#', File.ReadAllBytes(Path.Combine(folder, "memo.md"))[0]);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    private static bool IsFlushRight(TableCell cell) =>
        cell.Descendants<Justification>().Any(at => at.Val! == JustificationValues.Right);

    private static byte[] Write(Report report) => WordWriter.Write(MemoText.Of(report, "map.png"), Picture);

    private static WordprocessingDocument Open(byte[] bytes) => WordprocessingDocument.Open(new MemoryStream(bytes), isEditable: false);

    private static string Text(byte[] bytes)
    {
        using WordprocessingDocument document = Open(bytes);
        return string.Join('\n', document.MainDocumentPart!.Document!.Descendants<W.Paragraph>().Select(paragraph => paragraph.InnerText));
    }
}
