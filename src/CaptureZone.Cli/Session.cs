using System.CommandLine;
using System.Reflection;
using CaptureZone.Flow;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Files;
using CaptureZone.Jobs.Runs;
using CaptureZone.Sites;

namespace CaptureZone.Cli;

/// <summary>One command while it runs: what it may print, and how its failures become words and exit codes.</summary>
internal sealed class Session
{
    private readonly Surroundings _surroundings;
    private readonly bool _colours;
    private readonly bool _trace;

    private Session(Surroundings surroundings, ParseResult line)
    {
        _surroundings = surroundings;
        _colours = surroundings.Colours && !line.GetValue(CommonOptions.NoColor);
        _trace = line.GetValue(CommonOptions.Trace);
        Line = line;
        Quiet = line.GetValue(CommonOptions.Quiet);
        Json = line.GetValue(CommonOptions.Json);
    }

    /// <summary>The command line.</summary>
    public ParseResult Line { get; }

    /// <summary>Whether nothing but errors and data is printed.</summary>
    public bool Quiet { get; }

    /// <summary>Whether the summary is JSON.</summary>
    public bool Json { get; }

    /// <summary>Standard output.</summary>
    public TextWriter Output => _surroundings.Output;

    /// <summary>Makes the main job.</summary>
    public RunJob RunJob => _surroundings.RunJob();

    /// <summary>Makes a command's action of a function.</summary>
    /// <param name="surroundings">The world around.</param>
    /// <param name="command">The command, which gives its exit code.</param>
    public static Func<ParseResult, int> Action(Surroundings surroundings, Func<Session, int> command) => line =>
    {
        Session session = new(surroundings, line);
        try
        {
            return command(session);
        }
        catch (Exception failure)
        {
            return session.Fail(Inner(failure));
        }
    };

    /// <summary>Prints complaints in the GNU form; warnings only when not quiet.</summary>
    /// <param name="complaints">The complaints.</param>
    public void Complain(IEnumerable<Complaint> complaints)
    {
        foreach (Complaint complaint in complaints.Where(complaint => !Quiet || complaint.Severity == Severity.Error))
        {
            _surroundings.Error.WriteLine(Paint.Severity(complaint.ToString(), complaint.Severity, _colours));
        }
    }

    /// <summary>Prints an error that has no place in a file.</summary>
    /// <param name="text">The error.</param>
    public void Error(string text) =>
        _surroundings.Error.WriteLine(Paint.Severity($"{CommandLine.Name}: error: {text}", Severity.Error, _colours));

    /// <summary>Does long work with progress shown.</summary>
    /// <typeparam name="T">What it gives.</typeparam>
    /// <param name="threads">How many threads; null: as many as there are processors.</param>
    /// <param name="body">The work.</param>
    public T WithProgress<T>(int? threads, Func<Work, T> body)
    {
        int count = threads ?? _surroundings.Processors;
        IWorkers workers = count > 1 ? new ThreadWorkers(count) : new OneWorker();
        using ProgressLine? progress = Quiet ? null : new ProgressLine(_surroundings.Error, _surroundings.Terminal, _surroundings.Time);
        _surroundings.Interruption.Working = true;
        try
        {
            return body(new Work(workers, progress, _surroundings.Interruption.Token));
        }
        finally
        {
            _surroundings.Interruption.Working = false;
        }
    }

    /// <summary>Reads a file, or standard input for "-".</summary>
    /// <param name="path">The file.</param>
    /// <exception cref="AccessException">It cannot be read.</exception>
    public byte[] ReadFile(string path) => Access.Try(path, () =>
    {
        if (path != StandardStream)
        {
            return File.ReadAllBytes(path);
        }

        using Stream input = _surroundings.Input();
        using MemoryStream bytes = new();
        input.CopyTo(bytes);
        return bytes.ToArray();
    });

    /// <summary>What stands for standard input or output in place of a file.</summary>
    public const string StandardStream = "-";

    private int Fail(Exception failure)
    {
        switch (failure)
        {
            case InputRefusedException refused:
                Complain(refused.Complaints);
                return ExitCode.Wrong;
            case RequestException request:
                Error(request.Message);
                return ExitCode.Wrong;
            case AccessException access:
                Error(access.Message);
                return ExitCode.NoAccess;
            case OperationCanceledException when _surroundings.Interruption.Code != 0:
                Error("stopped; nothing was written");
                return _surroundings.Interruption.Code;
            default:
                return Access.IsRefusal(failure) ? NoAccess(failure) : Defect(failure);
        }
    }

    private int NoAccess(Exception failure)
    {
        Error(Access.Reason(failure));
        return ExitCode.NoAccess;
    }

    private int Defect(Exception failure)
    {
        Error($"a defect inside the program ({failure.GetType().Name}: {failure.Message}); nothing was written");
        _surroundings.Error.WriteLine(_trace
            ? failure.ToString()
            : $"Please report it with the site file, the version ({ProgramVersion.Text}) and what the same command prints with --trace.");
        return ExitCode.Defect;
    }

    private static Exception Inner(Exception failure) => failure switch
    {
        AggregateException { InnerExceptions: [var first, ..] } => Inner(first),
        TargetInvocationException { InnerException: { } inner } => Inner(inner),
        TypeInitializationException { InnerException: { } inner } => Inner(inner),
        _ => failure,
    };
}
