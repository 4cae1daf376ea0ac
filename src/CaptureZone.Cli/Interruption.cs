using System.Runtime.InteropServices;

namespace CaptureZone.Cli;

/// <summary>
/// Someone's wish that the program ends early. While long work is done, the first signal stops it in an orderly way; a second one, or
/// one at any other time (waiting for input, say), ends the process as the system does.
/// </summary>
public sealed class Interruption : IDisposable
{
    private readonly CancellationTokenSource _source = new();
    private readonly List<PosixSignalRegistration> _signals = [];

    /// <summary>Stops the work.</summary>
    public CancellationToken Token => _source.Token;

    /// <summary>The exit code that belongs to what stopped the work; 0 while nothing has.</summary>
    public int Code { get; private set; }

    /// <summary>Whether work is being done that must be stopped in an orderly way.</summary>
    public bool Working { get; set; }

    /// <summary>Listens to the process's signals.</summary>
    public static Interruption OfProcess()
    {
        Interruption interruption = new();
        interruption.Listen(PosixSignal.SIGINT, ExitCode.Interrupted);
        interruption.Listen(PosixSignal.SIGTERM, ExitCode.Terminated);
        return interruption;
    }

    /// <summary>Stops the work.</summary>
    /// <param name="code">The exit code that belongs to what stops it.</param>
    public void Stop(int code)
    {
        Code = code;
        _source.Cancel();
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        foreach (PosixSignalRegistration signal in _signals)
        {
            signal.Dispose();
        }

        _source.Dispose();
    }

    private void Listen(PosixSignal signal, int code) => _signals.Add(PosixSignalRegistration.Create(signal, context =>
    {
        if (Working && Code == 0)
        {
            context.Cancel = true;
            Stop(code);
        }
    }));
}
