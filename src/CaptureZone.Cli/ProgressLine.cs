using System.Globalization;

namespace CaptureZone.Cli;

/// <summary>
/// Shows the step of work that takes longer than a second: on a terminal one line that is written over, elsewhere one line per
/// step. What is quick shows nothing.
/// </summary>
public sealed class ProgressLine : IProgress<Step>, IDisposable
{
    /// <summary>Work shorter than this shows no progress.</summary>
    private static readonly TimeSpan _patience = TimeSpan.FromSeconds(1);

    /// <summary>How often the line is brought up to date: steady to the eye, no load.</summary>
    private static readonly TimeSpan _pace = TimeSpan.FromMilliseconds(200);

    private readonly Lock _gate = new();
    private readonly TextWriter _error;
    private readonly bool _terminal;
    private readonly ITimer _timer;
    private Step? _step;
    private string _shown = "";

    /// <summary>Begins to watch.</summary>
    /// <param name="error">Where the line goes.</param>
    /// <param name="terminal">Whether a line can be written over there.</param>
    /// <param name="time">The clock.</param>
    public ProgressLine(TextWriter error, bool terminal, TimeProvider time)
    {
        _error = error;
        _terminal = terminal;
        _timer = time.CreateTimer(_ => Show(), null, _patience, _pace);
    }

    /// <inheritdoc/>
    public void Report(Step value)
    {
        lock (_gate)
        {
            _step = value;
        }
    }

    /// <summary>Clears the line.</summary>
    public void Dispose()
    {
        _timer.Dispose();
        lock (_gate)
        {
            _step = null;
            if (_terminal && _shown.Length > 0)
            {
                _error.Write("\r" + new string(' ', _shown.Length) + "\r");
            }
        }
    }

    private void Show()
    {
        lock (_gate)
        {
            if (_step is not { } step)
            {
                return;
            }

            string text = _terminal
                ? string.Create(CultureInfo.InvariantCulture, $"{(int)(100 * step.Fraction),3} %  {step.Name}")
                : step.Name;
            if (text == _shown)
            {
                return;
            }

            if (_terminal)
            {
                _error.Write("\r" + text.PadRight(_shown.Length));
            }
            else
            {
                _error.WriteLine($"{CommandLine.Name}: {text} ...");
            }

            _shown = text;
        }
    }
}
