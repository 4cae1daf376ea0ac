using System.Runtime.InteropServices;

namespace CaptureZone.Cli;

/// <summary>
/// Someone's wish that the program ends early. The first signal stops the work in an orderly way; a second one ends the process
/// as the system does.
/// </summary>
public sealed class Interruption : IDisposable
{
    private readonly CancellationTokenSource _source = new();
    private readonly List<PosixSignalRegistration> _signals = [];

    /// <summary>Stops the work.</summary>
    public CancellationToken Token => _source.Token;

    /// <summary>The exit code that belongs to what stopped the work; 0 while nothing has.</summary>
    public int Code { get; private set; }

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
        context.Cancel = Code == 0;
        Stop(code);
    }));
}
