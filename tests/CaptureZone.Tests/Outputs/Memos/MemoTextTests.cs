using System.Collections.Immutable;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Memos;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Topology;

namespace CaptureZone.Tests.Outputs.Memos;

public sealed class MemoTextTests
{
    private static readonly Report Sample = SampleReport.Create();

    [Fact]
    public void Every_section_is_there_in_order()
    {
        string[] sections = [.. Of(Sample).Blocks.OfType<Heading>().Where(heading => heading.Level == 1).Select(Title)];
        Assert.Equal(
            [
                "1. Decision asked for", "2. Summary", "3. Map", "4. Conceptual model", "5. Inputs", "6. Method", "7. Results per well",
                "8. Hand check", "9. Results per plume", "10. Checks of the calculation", "11. Limits of the method",
                "12. What to measure in the field", "13. Licensed professional", "Appendix: site file",
            ],
            sections);
    }

    [Fact]
    public void The_verdict_promises_no_more_than_a_calculation_can()
    {
        string[] verdicts = [.. Paragraphs(Sample, Tone.Verdict)];
        Assert.Equal(
            "For the inputs in Table 1 at steady state, the calculation predicts that 100 % of the plume's area flows to containment wells "
            + "RW-2, RW-1, smallest margin 143 m; not yet shown in the field.",
            verdicts[0]);
        Assert.Equal(
            "For the inputs in Table 1 at steady state, the calculation predicts that 88 % of the plume's area flows to containment wells "
            + "RW-1, smallest margin -41.7 m; not yet shown in the field.",
            verdicts[1]);
        Assert.Equal(2, verdicts.Length);
        Assert.Contains("The rest is predicted to flow to well SW-1 (12 %).", Paragraphs(Sample, Tone.Plain));
    }

    [Theory]
    [InlineData(ReportUnits.Metric)]
    [InlineData(ReportUnits.Us)]
    public void Nothing_is_said_to_be_captured(ReportUnits units) => Assert.DoesNotContain(
        "is captured", MarkdownWriter.Write(Of(SampleReport.Create(units))), StringComparison.OrdinalIgnoreCase);

    [Fact]
    public void A_plume_without_containment_wells_has_a_verdict_too()
    {
        var plume = Sample.Answers.Plumes[0];
        Report report = Sample with
        {
            Answers = Sample.Answers with
            {
                Plumes = [plume with { CapturedFraction = 0, Margin = null, CapturedBy = [], Arrival = null }],
            },
            Site = Sample.Site with { Model = Sample.Site.Model with { Elements = [] } },
        };
        report = report with { Answers = report.Answers with { Wells = [], Findings = [] } };
        Assert.Equal(
            "For the inputs in Table 1 at steady state, the calculation predicts that 0 % of the plume's area flows to containment wells "
            + "(none pumps), smallest margin not defined; not yet shown in the field.",
            Assert.Single(Paragraphs(report, Tone.Verdict)));
    }

    [Fact]
    public void Table_1_holds_every_input_with_its_source_or_says_that_none_is_given()
    {
        Table inputs = Tables(Sample)[0];
        Assert.Equal(1, inputs.Number);
        Assert.Equal(Sample.Site.Inputs.Length, inputs.Rows.Length);
        Assert.Equal(
            [
                "Hydraulic conductivity", "18", "m/d", "18 m/d", "0.1 to 1000 m/d (common practice, no source)",
                "pumping test PT-1, May 2026",
            ],
            inputs.Rows[0].AsEnumerable());
        Assert.Equal("source not given", inputs.Rows[3][^1]);
        Assert.Equal(["59.055", "ft/d", "18 m/d"], Tables(SampleReport.Create(ReportUnits.Us))[0].Rows[0].Skip(1).Take(3));
    }

    [Fact]
    public void An_input_of_a_well_or_plume_bears_its_name()
    {
        InputEntry rate = new("well.RW-1.extracts", "Extraction rate", "6.5 L/s", QuantityKind.Rate, 561.6, "", "");
        InputEntry outline = new("plume.TCE, 2.5 ug/L.outline", "Plume outline", "16 corners", QuantityKind.Area, 1000, "", "");
        InputEntry place = new("regional_flow.head_at", "Place of the known head", "[1.0, 2.0]", QuantityKind.Place, 0, "", "");
        Table inputs = Tables(Sample with { Site = Sample.Site with { Inputs = [rate, outline, place] } })[0];
        Assert.Equal(["RW-1: Extraction rate", "561.6", "m3/d", "6.5 L/s", "", "source not given"], inputs.Rows[0].AsEnumerable());
        Assert.Equal("TCE, 2.5 ug/L: Plume outline", inputs.Rows[1][0]);
        Assert.Equal(["Place of the known head", "", "", "[1.0, 2.0]"], inputs.Rows[2].Take(4));
    }

    [Fact]
    public void Every_row_has_as_many_cells_as_its_header()
    {
        Assert.All(Tables(Sample), table => Assert.All(table.Rows, row => Assert.Equal(table.Columns.Length, row.Length)));
        Assert.Throws<ArgumentException>(() => new Table("", [new Column("a", 1), new Column("b", 1)], [["only one"]]));
    }

    [Fact]
    public void A_failed_check_is_said_before_every_warning()
    {
        Check failed = new("side flow of RW-1, share of its rate", 0.02, 0.001);
        Report report = Sample with { Answers = Sample.Answers with { Checks = Sample.Answers.Checks.Add(failed) } };
        ImmutableArray<Block> blocks = Of(report).Blocks;
        int summary = blocks.IndexOf(blocks.OfType<Heading>().Single(heading => heading.Text == "Summary"));
        Assert.Equal(
            new Paragraph(
                "Failed check: side flow of RW-1, share of its rate is 0.02, the limit is 0.001. Do not rely on the results of this memo "
                + "before the cause is found.",
                Tone.Warning),
            blocks[summary + 1]);
        Assert.Equal(["side flow of RW-1, share of its rate", "0.02", "0.001", "NO"], Tables(report)[^1].Rows[^1].AsEnumerable());
    }

    [Fact]
    public void Warnings_of_the_answers_and_of_the_site_file_come_before_the_verdict()
    {
        Complaint unusual = new("site.toml", 12, 9, Severity.Warning, "porosity 0.6 is unusual");
        Report report = Sample with { Site = Sample.Site with { Warnings = [unusual] } };
        Tone[] tones = [.. Of(report).Blocks.OfType<Paragraph>().Select(paragraph => paragraph.Tone)];
        Assert.True(Array.LastIndexOf(tones, Tone.Warning) < Array.IndexOf(tones, Tone.Verdict));
        Assert.Contains("Unusual input (line 12 of the site file): porosity 0.6 is unusual", Paragraphs(report, Tone.Warning));
        Assert.Equal(Sample.Answers.Findings.Length + 1, Paragraphs(report, Tone.Warning).Count());
    }

    [Fact]
    public void The_hand_check_stands_beside_the_computed_values()
    {
        Table check = Tables(Sample).Single(table => table.Columns.Any(column => column.Header == "Formula"));

        // T i = 18 m/d x 12 m x 0.0031 = 0.6696 m2/d, Q = 150 m3/d: 150 / (2 pi 0.6696) = 35.65 m; 112.0 m; 224.0 m.
        Assert.Equal(["RW-1", "distance to stagnation point", "Q / (2 pi T i)", "35.7", "58.0"], check.Rows[0].AsEnumerable());
        Assert.Equal(["RW-1", "width at the well", "Q / (2 T i)", "112", "120"], check.Rows[1].AsEnumerable());
        Assert.Equal(["RW-1", "width far upgradient", "Q / (T i)", "224", "224"], check.Rows[2].AsEnumerable());

        // sqrt(150 x 365.25 / (pi x 0.24 x 12)) = 77.8 m.
        Assert.Equal("77.8", check.Rows[3][3]);

        // (150 + 160 + 140) / 0.6696 = 672 m.
        Assert.Equal(["containment, together", "width far upgradient", "Q / (T i)", "672", "672"], check.Rows[^1].AsEnumerable());
    }

    [Fact]
    public void Without_regional_flow_no_width_is_worked_by_hand()
    {
        Model model = Sample.Site.Model;
        Report still = Sample with { Site = Sample.Site with { Model = model with { Regional = model.Regional with { Gradient = 0 } } } };
        Table check = Tables(still).Single(table => table.Columns.Any(column => column.Header == "Formula"));
        Assert.All(check.Rows, row => Assert.Equal("sqrt(Q t / (pi n b))", row[2]));
    }

    [Fact]
    public void A_search_for_stagnation_points_that_may_be_incomplete_is_not_called_complete()
    {
        Report report = Sample with { Answers = Sample.Answers with { StagnationComplete = false } };
        Assert.DoesNotContain("Every stagnation point is found.", MarkdownWriter.Write(Of(report)), StringComparison.Ordinal);
        Assert.Contains("Every stagnation point is found.", MarkdownWriter.Write(Of(Sample)), StringComparison.Ordinal);
    }

    [Fact]
    public void A_site_without_wells_and_plumes_has_a_memo()
    {
        Report report = Sample with
        {
            Site = Sample.Site with { Model = Sample.Site.Model with { Elements = [] } },
            Answers = Sample.Answers with
            {
                Wells = [],
                Plumes = [],
                Findings = [],
                Checks = [],
                StagnationPoints = ImmutableArray<StagnationPoint>.Empty,
                KnownHeadDistance = null,
                KnownHeadSensitivity = null,
            },
        };
        string text = MarkdownWriter.Write(Of(report));
        Assert.Contains("No plume and no extraction well is given; no zone is computed.", text, StringComparison.Ordinal);
        Assert.Contains("The site file names no well.", text, StringComparison.Ordinal);
        Assert.Single(Tables(report));
    }

    [Fact]
    public void Signature_licence_and_seal_are_left_open()
    {
        Form form = Of(Sample).Blocks.OfType<Form>().Single(form => form.Lines.Any(line => line.Label == "Signature"));
        Assert.Equal(["Name", "Licence number and state", "Signature", "Date", "Seal"], form.Lines.Select(line => line.Label));
        Assert.All(form.Lines, line => Assert.Empty(line.Value));
    }

    [Fact]
    public void The_appendix_holds_the_site_file_its_hash_and_the_version()
    {
        Memo memo = Of(Sample);
        Assert.Equal(Sample.Site.Text, Assert.IsType<CodeText>(memo.Blocks[^1]).Text);
        Assert.Equal(
            ["larch-hollow.toml", Sample.Site.Sha256, "capturezone 0.1.0"],
            Assert.IsType<Form>(memo.Blocks[^2]).Lines.Select(line => line.Value));
    }

    [Fact]
    public void The_caution_and_the_paper_follow_the_report()
    {
        Assert.Equal(Caution.Text, Of(Sample).Caution);
        Assert.Contains(Caution.Text, Paragraphs(Sample, Tone.Caution));
        Assert.Equal(Paper.A4, Of(Sample).Paper);
        Assert.Equal(Paper.Letter, Of(SampleReport.Create(ReportUnits.Us)).Paper);
    }

    private static Memo Of(Report report) => MemoText.Of(report, "map.png");

    private static Table[] Tables(Report report) => [.. Of(report).Blocks.OfType<Table>()];

    private static IEnumerable<string> Paragraphs(Report report, Tone tone) =>
        Of(report).Blocks.OfType<Paragraph>().Where(paragraph => paragraph.Tone == tone).Select(paragraph => paragraph.Text);

    private static string Title(Heading heading) => heading.Number.Length == 0 ? heading.Text : $"{heading.Number} {heading.Text}";
}
