using System.Text.Json;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Results;
using CaptureZone.Sites;

namespace CaptureZone.Tests.Outputs.Results;

public sealed class ResultsJsonTests
{
    private static readonly JsonElement Schema = JsonDocument.Parse(RepositoryFiles.Read("docs/results.schema.json")).RootElement;
    private static readonly Report Sample = SampleReport.Create();

    [Fact]
    public void The_sample_keeps_the_schema() => Assert.Empty(Breaches(Tree(Sample)));

    [Fact]
    public void A_document_without_any_one_of_its_members_breaks_the_schema()
    {
        int tried = 0;
        foreach ((JsonObject holder, string name) in Members(Tree(Sample)).ToArray())
        {
            JsonNode? member = holder[name];
            holder.Remove(name);
            Assert.Contains(Breaches(holder.Root), breach => breach.EndsWith(": required", StringComparison.Ordinal));
            holder[name] = member;
            tried++;
        }

        Assert.True(tried > 100);
    }

    [Fact]
    public void A_document_with_a_member_of_another_type_or_an_unknown_one_breaks_the_schema()
    {
        foreach ((JsonObject holder, string name) in Members(Tree(Sample)).ToArray())
        {
            JsonNode? member = holder[name];
            holder[name] = new JsonObject { ["unknown"] = 1 };
            Assert.NotEmpty(Breaches(holder.Root));
            holder[name] = member;
            holder["unknown"] = 1;
            Assert.Contains(Breaches(holder.Root), breach => breach.EndsWith(": additionalProperties", StringComparison.Ordinal));
            holder.Remove("unknown");
        }
    }

    [Theory]
    [InlineData("$.site.sha256", "\"ABC\"", "pattern")]
    [InlineData("$.wells[0].purpose", "\"decoration\"", "enum")]
    [InlineData("$.plumes[0].captured_fraction", "1.5", "maximum")]
    [InlineData("$.extent", "[1, 2, 3]", "minItems")]
    [InlineData("$.stagnation_points[0].multiplicity", "1.5", "type")]
    [InlineData("$.plumes[1].escapes_to[0].fate", "\"elsewhere\"", "pattern")]
    public void A_value_out_of_its_range_breaks_the_schema(string at, string value, string keyword)
    {
        JsonNode tree = Tree(Sample);
        Replace(tree, at, JsonNode.Parse(value)!);
        Assert.Equal([$"{at}: {keyword}"], Breaches(tree));
    }

    [Fact]
    public void Places_are_in_the_sites_coordinates_and_rates_are_positive_for_extraction()
    {
        JsonNode tree = Tree(Sample);
        JsonNode well = tree["wells"]![1]!;
        Assert.Equal("RW-2", (string?)well["name"]);
        Assert.Equal(562_300 + Sample.Site.Model.Wells[1].At.Real, (double)well["x"]!, 1e-3);
        Assert.Equal(4_641_300 + Sample.Site.Model.Wells[1].At.Imaginary, (double)well["y"]!, 1e-3);
        Assert.Equal(160, (double)well["rate"]!);
        Assert.Equal(-180, (double)tree["wells"]![3]!["rate"]!);
        Assert.Equal([561_400.0, 4_640_600, 563_600, 4_642_000], tree["extent"]!.AsArray().Select(value => (double)value!));
    }

    [Fact]
    public void Places_on_a_site_in_feet_are_in_feet()
    {
        Report feet = SampleReport.Create(SampleLocalSystem.Create("ft"), ReportUnits.Us);
        JsonNode tree = Tree(feet);
        Assert.Empty(Breaches(tree));
        Assert.Equal("ft", (string?)tree["coordinates"]!["unit"]);
        Assert.Equal(5000 + feet.Site.Model.Wells[0].At.Real / 0.3048, (double)tree["wells"]![0]!["x"]!, 1e-6);
        Assert.Equal(150, (double)tree["wells"]![0]!["rate"]!);
    }

    [Fact]
    public void Fates_and_sources_are_told_by_name()
    {
        JsonNode tree = Tree(Sample);
        Assert.Equal("well:SW-1", (string?)tree["plumes"]![1]!["escapes_to"]![0]!["fate"]);
        Assert.Equal("RW-2", (string?)tree["plumes"]![0]!["captured_by"]![0]!["well"]);
        Assert.Equal("injection well IW-1", (string?)tree["wells"]![4]!["zone"]!["water_from"]![0]!["source"]);
        Assert.Null(tree["wells"]![3]!["zone"]);
        Assert.Null(tree["wells"]![0]!["zone"]!["area"]);
        Assert.Equal("plume-reaches-other-well", (string?)tree["warnings"]![0]!["code"]);
    }

    [Fact]
    public void A_number_that_is_none_is_written_as_null()
    {
        Report dry = Sample with
        {
            Answers = Sample.Answers with
            {
                StagnationPoints = [Sample.Answers.StagnationPoints[0] with { Head = double.NaN }],
                Checks = [new Check("side flow", double.NaN, 1e-3)],
            },
        };
        JsonNode tree = Tree(dry);
        Assert.Empty(Breaches(tree));
        Assert.Null(tree["stagnation_points"]![0]!["head"]);
        Assert.Null(tree["checks"]![0]!["value"]);
        Assert.False((bool)tree["checks"]![0]!["passed"]!);
    }

    [Fact]
    public void Unusual_input_is_a_warning_with_its_place()
    {
        Complaint unusual = new("larch-hollow.toml", 9, 16, Severity.Warning, "porosity 0.6 is unusual");
        JsonNode tree = Tree(Sample with { Site = Sample.Site with { Warnings = [unusual] } });
        Assert.Equal("larch-hollow.toml:9:16: warning: porosity 0.6 is unusual", (string?)tree["warnings"]!.AsArray()[^1]!["text"]);
    }

    [Theory]
    [InlineData(1.0 / 3, 0.3333333333)]
    [InlineData(4_641_300.123456, 4_641_300.123)]
    [InlineData(-1.23456789012e-7, -1.234567890e-7)]
    [InlineData(0.0, 0.0)]
    public void Numbers_have_ten_significant_digits(double value, double rounded) =>
        Assert.Equal(rounded, Rounding.TenFigures(value));

    [Fact]
    public void Every_field_is_explained_in_the_reference()
    {
        string reference = RepositoryFiles.Read("docs/results.md");
        string[] names = [.. Members(Tree(Sample)).Select(member => member.Name).Distinct()];
        Assert.All(names, name => Assert.Matches($"`([a-z_]+\\.)*{Regex.Escape(name)}`", reference));
    }

    private static JsonNode Tree(Report report) => JsonNode.Parse(Bytes(report))!;

    private static byte[] Bytes(Report report)
    {
        using MemoryStream stream = new();
        ResultsJson.Write(report, stream);
        return stream.ToArray();
    }

    private static IReadOnlyList<string> Breaches(JsonNode tree) =>
        new SchemaValidator(Schema).Breaches(JsonDocument.Parse(tree.ToJsonString()).RootElement);

    private static IEnumerable<(JsonObject Holder, string Name)> Members(JsonNode? node) => node switch
    {
        JsonObject members => members.SelectMany(member => Members(member.Value).Prepend((members, member.Key))),
        JsonArray items => items.SelectMany(Members),
        _ => [],
    };

    private static void Replace(JsonNode tree, string at, JsonNode value)
    {
        string[] steps = [.. Regex.Matches(at, @"[a-z_0-9]+").Select(step => step.Value)];
        JsonNode holder = tree;
        foreach (string step in steps[..^1])
        {
            holder = int.TryParse(step, out int index) ? holder[index]! : holder[step]!;
        }

        holder[steps[^1]] = value;
    }
}
