using CaptureZone.Outputs;
using CaptureZone.Outputs.Memos;

namespace CaptureZone.Tests.Outputs.Memos;

public sealed class MarkdownWriterTests
{
    private static readonly Report Sample = SampleReport.Create();

    /// <summary>The whole memo of the sample, read and approved; a change of the memo's text is a change of this file.</summary>
    [Fact]
    public void The_samples_memo_is_the_approved_text() => Assert.Equal(
        File.ReadAllText(Approved()).ReplaceLineEndings("\n"), MarkdownWriter.Write(MemoText.Of(Sample, "map.png")));

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void The_text_is_the_same_in_every_culture(string culture) => Assert.Equal(
        MarkdownWriter.Write(MemoText.Of(Sample, "map.png")),
        Cultures.Under(culture, () => MarkdownWriter.Write(MemoText.Of(SampleReport.Create(), "map.png"))));

    [Theory]
    [InlineData("*stars* and _lines_", "\\*stars\\* and \\_lines\\_")]
    [InlineData("a|b <i> [x](y) `c`", "a\\|b \\<i\\> \\[x\\](y) \\`c\\`")]
    [InlineData("# not a heading", "\\# not a heading")]
    [InlineData("- not a list", "\\- not a list")]
    [InlineData("12. not a list", "12\\. not a list")]
    [InlineData("---", "\\---")]
    [InlineData("12.5 m is a length", "12.5 m is a length")]
    [InlineData("-41.7 m", "-41.7 m")]
    [InlineData("C:\\data &amp; $x$ ~y~", "C:\\\\data \\&amp; \\$x\\$ \\~y\\~")]
    public void Characters_of_Markdown_stand_for_themselves(string text, string escaped) =>
        Assert.Equal(escaped, Body(new Paragraph(text)));

    [Fact]
    public void A_cell_cannot_break_its_row()
    {
        Table table = new("c", [new Column("a|b", 1), new Column("n", 1, IsNumeric: true)], [["x\ny", "-"]]);
        Assert.Equal("**Table 0.** c\n\n| a\\|b | n |\n| --- | ---: |\n| x y | - |", Body(table));
    }

    [Theory]
    [InlineData("a\u0000b\u0007c", "a\ufffdb\ufffdc")]
    [InlineData("one\r\ntwo\tthree", "one two three")]
    public void Control_characters_are_replaced(string text, string shown) => Assert.Equal(shown, Body(new Paragraph(text)));

    [Fact]
    public void Half_a_character_is_replaced() => Assert.Equal("half \ufffd left", Body(new Paragraph("half \ud800 left")));

    [Fact]
    public void Back_ticks_in_the_site_file_do_not_end_the_appendix() => Assert.Equal(
        "`````toml\nx = '''\n````\n'''\n`````", Body(new CodeText("x = '''\r\n````\n'''\n")));

    private static string Body(Block block)
    {
        string[] parts = MarkdownWriter.Write(new("t", "", "", "c", Paper.A4, [block])).Split("# t\n\n", 2);
        return parts[1][..^"\n\n---\n\n*c*\n".Length];
    }

    private static string Approved([System.Runtime.CompilerServices.CallerFilePath] string here = "") =>
        Path.Combine(Path.GetDirectoryName(here)!, "sample-memo.approved.md");
}
