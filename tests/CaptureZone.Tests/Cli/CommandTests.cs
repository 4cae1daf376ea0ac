using System.Globalization;
using System.Text.Json;
using CaptureZone.Cli;
using CaptureZone.Jobs.Runs;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Text;
using CaptureZone.Tests.Jobs;
using CaptureZone.Tests.Outputs;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Cli;

public sealed class CommandTests : IDisposable
{
    /// <summary>One well in a confined aquifer: K 10 m/d, 10 m thick; Q0 = 0.4 m2/d toward the east.</summary>
    private const string Site = """
        format = 1
        title  = "One well"
        crs    = "local m"

        [aquifer]
        conductivity = "10 m/d"
        base         = "90 m"
        top          = "100 m"
        porosity     = 0.25

        [regional_flow]
        gradient     = 0.004
        flows_toward = 90
        head         = "110 m"
        head_at      = [-1000.0, 0.0]

        [[well]]
        name     = "RW, 1"
        at       = [0.0, 0.0]
        extracts = "100 m3/d"
        radius   = "0.1 m"
        purpose  = "containment"

        """;

    private const string UsualPorosity = "porosity     = 0.25";

    private readonly TempFolder _temp = new();

    public void Dispose() => _temp.Dispose();

    [Fact]
    public void A_new_site_file_passes_its_check_as_it_stands()
    {
        CliRun made = CliRun.Of("new", _temp["a.toml"]);
        Assert.Equal((0, ""), (made.Code, made.Error));
        Assert.Equal($"{_temp["a.toml"]} is written. It runs as it stands; next:\n  capturezone run {_temp["a.toml"]}\n", made.Output);
        Assert.Equal(0, CliRun.Of("check", "--strict", _temp["a.toml"]).Code);
    }

    [Theory]
    [InlineData()]
    [InlineData("--us")]
    public void A_new_site_file_to_standard_output_is_a_site_from_standard_input(params string[] options)
    {
        string text = CliRun.Of(["new", "-", .. options]).Output;
        CliRun check = CliRun.With(new CliSetting { Input = text }, "check", "-");
        Assert.Equal((0, ""), (check.Code, check.Error));
    }

    [Fact]
    public void A_new_site_file_never_overwrites()
    {
        _temp.Write("a.toml", "mine");
        CliRun run = CliRun.Of("new", _temp["a.toml"]);
        Assert.Equal((4, ""), (run.Code, run.Output));
        Assert.Equal("mine", _temp.Read("a.toml"));
    }

    [Fact]
    public void A_mistake_in_the_site_is_told_by_every_command_alike_with_code_2_and_nothing_is_written()
    {
        string site = _temp.Write("a.toml", Site.Replace("\"10 m/d\"", "10", StringComparison.Ordinal));
        string error = CliRun.Of("check", site).Error;
        Assert.StartsWith($"{site}:6:16: error: ", error, StringComparison.Ordinal);
        foreach (string[] args in (string[][])[["run", site], ["heads", site, "--at", "1,2"], ["paths", site, "--at", "1,2"]])
        {
            CliRun run = CliRun.Of(args);
            Assert.Equal((2, "", error), (run.Code, run.Output, run.Error));
        }

        Assert.Equal(["a.toml"], _temp.Entries);
    }

    [Fact]
    public void A_warning_fails_a_strict_check_only()
    {
        string site = _temp.Write("a.toml", Site.Replace(UsualPorosity, "porosity = 0.6", StringComparison.Ordinal));
        CliRun check = CliRun.Of("check", site), strict = CliRun.Of("check", site, "--strict");
        Assert.Equal((0, 2), (check.Code, strict.Code));
        Assert.Contains(": warning: ", check.Error, StringComparison.Ordinal);
        Assert.Equal(check.Error, strict.Error);
        Assert.Equal("", CliRun.Of("check", site, "--quiet").Error);
    }

    [Fact]
    public void A_check_as_JSON_lists_the_complaints()
    {
        string site = _temp.Write("a.toml", Site.Replace("\"10 m/d\"", "10", StringComparison.Ordinal));
        using JsonDocument json = JsonDocument.Parse(CliRun.Of("check", site, "--json").Output);
        Assert.False(json.RootElement.GetProperty("runs").GetBoolean());
        Assert.Equal(6, json.RootElement.GetProperty("complaints")[0].GetProperty("line").GetInt32());
    }

    [Fact]
    public void Heads_are_a_table_with_quoted_names_and_say_where_there_is_no_aquifer()
    {
        string site = _temp.Write("a.toml", Site);
        string points = _temp.Write("p.csv", "name,x,y\n\"MW-1, deep\",-1000,0\nin the bore,0.05,0\n");
        CliRun run = CliRun.Of("heads", site, "--points", points);
        Assert.Equal((0, ""), (run.Code, run.Error));
        string[] lines = run.Output.Split('\n');
        Assert.Equal("name,x,y,head_m,thickness_m,qx_m2d,qy_m2d,vx_md,vy_md,note", lines[0]);
        double qx = 0.4 + 100 / (2 * Math.PI * 1000); // uniform flow and a well, by the formula of the method
        Assert.Equal(
            string.Create(CultureInfo.InvariantCulture, $"\"MW-1, deep\",-1000,0,110,10,{qx:G10},0,{qx / 2.5:G10},0,"), lines[1]);
        Assert.Equal("in the bore,0.05,0,,,,,,,\"inside the screen of RW, 1\"", lines[2]);
    }

    [Fact]
    public void Points_and_site_may_come_from_standard_input_but_not_both()
    {
        string site = _temp.Write("a.toml", Site);
        string byFile = CliRun.Of("heads", site, "--at", "-50,20").Output;
        Assert.Equal(byFile, CliRun.With(new CliSetting { Input = Site }, "heads", "-", "--at", "-50,20").Output);
        Assert.Equal(
            byFile, CliRun.With(new CliSetting { Input = "name,x,y\nP1,-50,20\n" }, "heads", site, "--points", "-").Output);
        Assert.Equal(2, CliRun.With(new CliSetting { Input = Site }, "heads", "-", "--points", "-").Code);
    }

    [Fact]
    public void A_broken_table_of_points_is_told_with_its_places_and_nothing_is_written()
    {
        string site = _temp.Write("a.toml", Site), points = _temp.Write("p.csv", "name,x,y\nA,1,b\n");
        CliRun run = CliRun.Of("paths", site, "--points", points, "--out", _temp["o.csv"], "--lines", _temp["l.geojson"]);
        Assert.Equal((2, ""), (run.Code, run.Output));
        Assert.StartsWith($"{points}:2:5: error: y is \"b\"", run.Error, StringComparison.Ordinal);
        Assert.Equal(["a.toml", "p.csv"], _temp.Entries);
    }

    [Fact]
    public void Paths_tell_ends_and_fates_and_their_lines_carry_times()
    {
        string site = _temp.Write("a.toml", Site);
        CliRun run = CliRun.Of("paths", site, "--at", "-50,0", "--at", "500,0", "--lines", _temp["l.geojson"]);
        Assert.Equal((0, ""), (run.Code, run.Error));
        string[] lines = run.Output.Split('\n');
        Assert.Equal("name,x,y,end_x,end_y,time_d,length_m,lost_to_streams,fate", lines[0]);
        Assert.EndsWith(",\"well:RW, 1\"", lines[1], StringComparison.Ordinal);
        Assert.EndsWith(",far", lines[2], StringComparison.Ordinal);
        using JsonDocument json = JsonDocument.Parse(_temp.Read("l.geojson"));
        JsonElement line = json.RootElement.GetProperty("features")[0];
        Assert.Equal(
            line.GetProperty("geometry").GetProperty("coordinates").GetArrayLength(),
            line.GetProperty("properties").GetProperty("times_d").GetArrayLength());
        Assert.Equal("local", json.RootElement.GetProperty("coordinates").GetString());
    }

    [Fact]
    public void Paths_stop_at_the_time_asked_and_run_upstream_when_asked()
    {
        string site = _temp.Write("a.toml", Site);
        Assert.Contains(",365.25,", CliRun.Of("paths", site, "--at", "500,0", "--for", "1 yr").Output, StringComparison.Ordinal);
        Assert.EndsWith(",far\n", CliRun.Of("paths", site, "--at", "-50,0", "--upstream").Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_table_goes_to_a_file_and_replaces_one_only_when_that_is_asked_for()
    {
        string site = _temp.Write("a.toml", Site);
        string[] args = ["heads", site, "--at", "1,2", "--out", _temp["o.csv"]];
        Assert.Equal((0, ""), (CliRun.Of(args).Code, CliRun.Of(args).Output));
        Assert.Equal(4, CliRun.Of(args).Code);
        Assert.Equal(0, CliRun.Of([.. args, "--replace"]).Code);
        Assert.Equal(CliRun.Of("heads", site, "--at", "1,2").Output, _temp.Read("o.csv"));
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void No_culture_changes_a_table(string culture)
    {
        string site = _temp.Write("a.toml", Site);
        string[] args = ["paths", site, "--at", "-50.5,1.25", "--json", "--out", _temp["o.csv"], "--replace"];
        string expected = CliRun.Of(args).Output + _temp.Read("o.csv");
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(expected, CliRun.Of(args).Output + _temp.Read("o.csv"));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void A_run_without_out_writes_beside_the_site_file_and_says_so()
    {
        string site = _temp.Write("a.toml", SampleSite());
        CliRun run = CliRun.With(Sample(), "run", site);
        Assert.Equal((0, ""), (run.Code, run.Error));
        Assert.Contains($"Results in {_temp["a-results"]}\n", run.Output, StringComparison.Ordinal);
        Assert.True(File.Exists(_temp["a-results/results.json"]));
    }

    [Fact]
    public void A_failed_check_finishes_and_gives_code_1_before_any_other()
    {
        string site = _temp.Write("a.toml", SampleSite());
        CliSetting failed = Sample(answers => answers with { Checks = [new Check("side flow", 1, 0.001)] });
        CliRun run = CliRun.With(failed, "run", site, "--require-capture");
        Assert.Equal(1, run.Code);
        Assert.Equal(
            "capturezone: error: the calculation does not pass its own check \"side flow\"; do not rely on these results\n", run.Error);
        Assert.True(Directory.Exists(_temp["a-results"]));
    }

    [Fact]
    public void Required_capture_that_is_not_predicted_gives_code_3()
    {
        string site = _temp.Write("a.toml", SampleSite());
        Assert.Equal(3, CliRun.With(Sample(), "run", site, "--require-capture", "--quiet").Code);
        CliSetting captured = Sample(answers => answers with { Plumes = [answers.Plumes[0]] });
        CliRun run = CliRun.With(captured, "run", site, "--require-capture", "--quiet");
        Assert.Equal((0, "", ""), (run.Code, run.Output, run.Error));
    }

    [Fact]
    public void Required_capture_without_a_plume_is_a_mistake()
    {
        CliRun run = CliRun.With(Sample(), "run", _temp.Write("a.toml", Site), "--require-capture");
        Assert.Equal((2, ""), (run.Code, run.Output));
        Assert.Equal(["a.toml"], _temp.Entries);
    }

    [Fact]
    public void A_dewatered_well_is_told_at_its_rate_with_the_largest_it_could_yield()
    {
        string site = _temp.Write("a.toml", Site);
        CliSetting dewatered = With((_, _, _, _, _) => throw new DewateredException([(0, 86.4)]));
        CliRun run = CliRun.With(dewatered, "run", site);
        Assert.Equal((2, ""), (run.Code, run.Output));
        Assert.Equal(
            $"{site}:20:12: error: well \"RW, 1\" takes 100 m3/d (1.16 L/s), more than the aquifer yields: the level at its screen would "
            + "fall to the base; with the other wells held, the largest rate is 86.4 m3/d (1.00 L/s)\n",
            run.Error);
        Assert.Equal(["a.toml"], _temp.Entries);
    }

    [Theory]
    [InlineData(130)]
    [InlineData(143)]
    public void A_stopped_run_gives_the_code_of_what_stopped_it_and_leaves_nothing(int code)
    {
        Interruption interruption = new();
        Analysis stopping = (_, _, _, _, cancel) =>
        {
            interruption.Stop(code);
            cancel.ThrowIfCancellationRequested();
            return _sample.Answers;
        };
        CliSetting stopped = With(stopping) with { Interruption = interruption };
        CliRun run = CliRun.With(stopped, "run", _temp.Write("a.toml", Site));
        Assert.Equal((code, "", "capturezone: error: stopped; nothing was written\n"), (run.Code, run.Output, run.Error));
        Assert.Equal(["a.toml"], _temp.Entries);
    }

    [Fact]
    public void A_defect_says_how_to_report_it_and_shows_where_it_is_only_when_asked()
    {
        string site = _temp.Write("a.toml", Site);
        CliSetting broken = With((_, _, _, _, _) => throw new InvalidOperationException("zone without a face"));
        CliRun run = CliRun.With(broken, "run", site), traced = CliRun.With(broken, "run", site, "--trace");
        Assert.Equal((1, ""), (run.Code, run.Output));
        Assert.StartsWith(
            "capturezone: error: a defect inside the program (InvalidOperationException: zone without a face)",
            run.Error,
            StringComparison.Ordinal);
        Assert.Contains("Please report it", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
        Assert.Contains("   at ", traced.Error, StringComparison.Ordinal);
        Assert.Equal(["a.toml"], _temp.Entries);
    }

    /// <summary>A site with the wells, plumes and times of the sample report, in its order.</summary>
    private static string SampleSite()
    {
        IEnumerable<string> wells = _sample.Site.Model.Wells.Select(well => string.Create(CultureInfo.InvariantCulture, $"""
            [[well]]
            name     = "{well.Name}"
            at       = [{well.At.Real:R}, {well.At.Imaginary:R}]
            {(well.Rate < 0 ? "injects" : "extracts")} = "{Math.Abs(well.Rate)} m3/d"
            radius   = "{well.Radius} m"
            purpose  = "{WellText.Token(well.Purpose)}"

            """));
        IEnumerable<string> plumes = _sample.Site.Questions.Plumes.Select(plume => string.Create(CultureInfo.InvariantCulture, $"""
            [[plume]]
            name    = "{plume.Name}"
            outline = [{string.Join(", ", plume.Outline.Coordinates.SkipLast(1).Select(Corner))}]

            """));
        return Site[..Site.IndexOf("[[well]]", StringComparison.Ordinal)] + string.Concat(wells) + string.Concat(plumes) + """
            [zones]
            travel_times = ["1 yr", "5 yr", "10 yr"]

            """;
    }

    private static string Corner(Coordinate at) => string.Create(CultureInfo.InvariantCulture, $"[{at.X:F3}, {at.Y:F3}]");

    private static readonly Report _sample = SampleReport.Create();

    /// <summary>A run that gives the sample's answers, so that the command is tested and not the engine.</summary>
    private static CliSetting Sample(Func<SiteAnswers, SiteAnswers>? change = null) =>
        With((_, _, _, _, _) => change is null ? _sample.Answers : change(_sample.Answers));

    private static CliSetting With(Analysis analysis) => new() { RunJob = new RunJob(analysis) };
}
