using System.Text;
using CaptureZone.Cli;
using CaptureZone.Jobs.Runs;

namespace CaptureZone.Tests.Cli;

/// <summary>What a command said and gave.</summary>
public sealed record CliRun(int Code, string Output, string Error)
{
    public static CliRun Of(params string[] args) => With(new CliSetting(), args);

    public static CliRun With(CliSetting setting, params string[] args)
    {
        StringWriter output = new() { NewLine = "\n" }, error = new() { NewLine = "\n" };
        using Surroundings surroundings = new()
        {
            Input = () => new MemoryStream(Encoding.UTF8.GetBytes(setting.Input)),
            Output = output,
            Error = error,
            Colours = setting.Colours,
            Time = new ManualTime(),
            Processors = setting.Processors,
            Interruption = setting.Interruption,
            RunJob = () => setting.RunJob,
        };
        int code = CommandLine.Run(args, surroundings);
        return new CliRun(code, output.ToString(), error.ToString());
    }
}

/// <summary>The world around a command under test.</summary>
public sealed record CliSetting
{
    public string Input { get; init; } = "";

    public bool Colours { get; init; }

    public int Processors { get; init; } = 1;

    public Interruption Interruption { get; init; } = new();

    public RunJob RunJob { get; init; } = RunJob.WithEngine();
}
