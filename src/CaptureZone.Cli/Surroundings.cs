using System.Text;
using CaptureZone.Jobs.Runs;

namespace CaptureZone.Cli;

/// <summary>All that the program knows of the world around it, so that a test can give it another.</summary>
public sealed record Surroundings : IDisposable
{
    /// <summary>Standard input.</summary>
    public required Func<Stream> Input { get; init; }

    /// <summary>Standard output.</summary>
    public required TextWriter Output { get; init; }

    /// <summary>Standard error.</summary>
    public required TextWriter Error { get; init; }

    /// <summary>Whether standard error is a terminal that may show colours.</summary>
    public bool Colours { get; init; }

    /// <summary>Whether standard error is a terminal on which a line can be written over.</summary>
    public bool Terminal { get; init; }

    /// <summary>Tells when progress is worth showing; never enters a result.</summary>
    public TimeProvider Time { get; init; } = TimeProvider.System;

    /// <summary>How many processors there are.</summary>
    public int Processors { get; init; } = 1;

    /// <summary>What may stop the work.</summary>
    public Interruption Interruption { get; init; } = new();

    /// <summary>Makes the main job.</summary>
    public Func<RunJob> RunJob { get; init; } = static () => Jobs.Runs.RunJob.WithEngine();

    /// <summary>The surroundings of this process.</summary>
    public static Surroundings OfProcess()
    {
        bool terminal = !Console.IsErrorRedirected;
        return new Surroundings
        {
            Input = Console.OpenStandardInput,
            Output = Utf8(Console.OpenStandardOutput()),
            Error = Utf8(Console.OpenStandardError()),
            Terminal = terminal,
            Colours = terminal && string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR")),
            Processors = Environment.ProcessorCount,
            Interruption = Interruption.OfProcess(),
        };
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        Interruption.Dispose();
        Output.Dispose();
        Error.Dispose();
    }

    private static StreamWriter Utf8(Stream stream) => new(stream, new UTF8Encoding(false)) { AutoFlush = true, NewLine = "\n" };
}
