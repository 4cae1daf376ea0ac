using CaptureZone.Cli;

namespace CaptureZone.Tests.Cli;

public sealed class ProgressLineTests
{
    private readonly ManualTime _time = new();
    private readonly StringWriter _error = new() { NewLine = "\n" };

    [Fact]
    public void Work_of_less_than_a_second_shows_nothing()
    {
        using (ProgressLine line = new(_error, terminal: true, _time))
        {
            line.Report(new Step("tracing", 0.5));
            _time.Advance(TimeSpan.FromMilliseconds(990));
        }

        Assert.Equal("", _error.ToString());
    }

    [Fact]
    public void On_a_terminal_one_line_is_written_over_and_cleared_at_the_end()
    {
        using (ProgressLine line = new(_error, terminal: true, _time))
        {
            line.Report(new Step("tracing", 0.256));
            _time.Advance(TimeSpan.FromSeconds(1));
            line.Report(new Step("map", 0.5));
            _time.Advance(TimeSpan.FromSeconds(1));
        }

        Assert.Equal("\r 25 %  tracing\r 50 %  map    \r          \r", _error.ToString());
    }

    [Fact]
    public void Elsewhere_each_step_has_one_plain_line()
    {
        using (ProgressLine line = new(_error, terminal: false, _time))
        {
            line.Report(new Step("tracing", 0.25));
            _time.Advance(TimeSpan.FromSeconds(1));
            line.Report(new Step("tracing", 0.3));
            _time.Advance(TimeSpan.FromSeconds(1));
            line.Report(new Step("map", 0.5));
            _time.Advance(TimeSpan.FromSeconds(1));
        }

        Assert.Equal("capturezone: tracing ...\ncapturezone: map ...\n", _error.ToString());
    }
}
