namespace CaptureZone.Tests.Cli;

public sealed class CommandLineTests
{
    [Theory]
    [InlineData("run", "capturezone: error: Required argument 'SITE' missing for command: 'run'.")]
    [InlineData("run a.toml --threads 1,5", "capturezone: error: --threads is \"1,5\"; expected a whole number from 1")]
    [InlineData("run a.toml --threads 0", "capturezone: error: --threads is \"0\"; expected a whole number from 1")]
    [InlineData("heads a.toml", "capturezone: error: give the points: --points P.csv or --at X,Y")]
    [InlineData("heads a.toml --at 1,2 --points p.csv", "capturezone: error: give either --points or --at, not both")]
    [InlineData("heads a.toml --at 1;2", "capturezone: error: --at is \"1;2\"; expected two numbers such as 562310.5,4641240")]
    [InlineData("heads a.toml --at 1,2,3", "capturezone: error: --at is \"1,2,3\"; expected two numbers such as 562310.5,4641240")]
    [InlineData("heads a.toml --at NaN,2", "capturezone: error: --at is \"NaN,2\"; expected two numbers such as 562310.5,4641240")]
    [InlineData("heads a.toml --at @points", "capturezone: error: --at is \"@points\"; expected two numbers such as 562310.5,4641240")]
    [InlineData("paths a.toml --at 1,2 --for 10", "capturezone: error: --for: ")]
    [InlineData("paths a.toml --at 1,2 --for 3m", "capturezone: error: --for: ")]
    public void A_wrong_command_line_is_told_on_standard_error_with_code_2(string line, string error)
    {
        CliRun run = CliRun.Of(line.Split(' '));
        Assert.Equal((2, ""), (run.Code, run.Output));
        Assert.StartsWith(error, run.Error, StringComparison.Ordinal);
        Assert.Contains("\nTry: capturezone ", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_misspelt_command_is_suggested_on_standard_error()
    {
        CliRun run = CliRun.Of("chekc", "a.toml");
        Assert.Equal((2, ""), (run.Code, run.Output));
        Assert.Contains("Did you mean one of the following?\ncheck\n", run.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("run", "no-such.toml")]
    [InlineData("check", "no-such.toml")]
    [InlineData("heads", "no-such.toml", "--at", "1,2")]
    [InlineData("paths", "no-such.toml", "--at", "1,2")]
    public void A_site_file_that_is_not_there_is_named_with_code_4(params string[] args)
    {
        CliRun run = CliRun.Of(args);
        Assert.Equal((4, "", "capturezone: error: no-such.toml: there is no such file\n"), (run.Code, run.Output, run.Error));
    }

    [Theory]
    [InlineData("capturezone ru", "run")]
    [InlineData("capturezone run site.toml --sh", "--shapefiles")]
    [InlineData("capturezone paths site.toml --up", "--upstream")]
    public void A_shell_that_asks_how_a_line_goes_on_is_answered(string line, string suggestion)
    {
        CliRun run = CliRun.Of($"[suggest:{line.Length}]", line);
        Assert.Equal((0, suggestion + "\n", ""), (run.Code, run.Output, run.Error));
    }

    [Fact]
    public void A_colour_marks_an_error_only_where_colours_are_wanted()
    {
        CliSetting colours = new() { Colours = true };
        Assert.Contains("\e[1;31merror:\e[0m", CliRun.With(colours, "check", "no-such.toml").Error, StringComparison.Ordinal);
        Assert.DoesNotContain('\e', CliRun.With(colours, "check", "no-such.toml", "--no-color").Error);
        Assert.DoesNotContain('\e', CliRun.Of("check", "no-such.toml").Error);
    }
}
