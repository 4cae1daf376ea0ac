namespace CaptureZone.Tests.Cli;

public sealed class HelpTests
{
    [Theory]
    [InlineData("new")]
    [InlineData("check")]
    [InlineData("run")]
    [InlineData("heads")]
    [InlineData("paths")]
    public void Help_of_a_command_reads_as_approved(string command)
    {
        CliRun run = CliRun.Of(command, "--help");
        Assert.Equal((0, ""), (run.Code, run.Error));
        Approval.Verify($"help-{command}", run.Output);
    }

    [Fact]
    public void Help_of_the_program_reads_as_approved()
    {
        CliRun run = CliRun.Of("--help");
        Assert.Equal((0, ""), (run.Code, run.Error));
        Approval.Verify("help", run.Output);
    }

    [Fact]
    public void Without_a_command_the_help_goes_to_standard_error_and_the_code_is_2()
    {
        CliRun run = CliRun.Of();
        Assert.Equal((2, ""), (run.Code, run.Output));
        Assert.Equal(CliRun.Of("--help").Output, run.Error);
    }

    [Fact]
    public void The_version_is_printed_without_a_commit()
    {
        CliRun run = CliRun.Of("--version");
        Assert.Equal(0, run.Code);
        Assert.Matches(@"^capturezone \d+\.\d+\.\d+\n$", run.Output);
    }
}
