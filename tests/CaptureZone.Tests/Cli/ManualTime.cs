namespace CaptureZone.Tests.Cli;

/// <summary>A clock that moves when the test moves it.</summary>
public sealed class ManualTime : TimeProvider
{
    private ManualTimer? _timer;

    public override ITimer CreateTimer(TimerCallback callback, object? state, TimeSpan dueTime, TimeSpan period) =>
        _timer = new ManualTimer(callback, state, dueTime, period);

    public void Advance(TimeSpan by) => _timer!.Advance(by);

    private sealed class ManualTimer(TimerCallback callback, object? state, TimeSpan due, TimeSpan period) : ITimer
    {
        private TimeSpan _left = due;
        private bool _stopped;

        public void Advance(TimeSpan by)
        {
            _left -= by;
            while (!_stopped && _left <= TimeSpan.Zero)
            {
                callback(state);
                _left += period;
            }
        }

        public bool Change(TimeSpan dueTime, TimeSpan period) => throw new NotSupportedException();

        public void Dispose() => _stopped = true;

        public ValueTask DisposeAsync()
        {
            Dispose();
            return ValueTask.CompletedTask;
        }
    }
}
