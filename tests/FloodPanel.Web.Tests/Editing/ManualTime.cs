namespace FloodPanel.Web.Tests.Editing;

/// <summary>A clock that a test moves by hand; timers fire when it passes them.</summary>
public sealed class ManualTime : TimeProvider
{
    private readonly List<ManualTimer> timers = [];
    private DateTimeOffset now = new(2026, 3, 2, 14, 3, 0, TimeSpan.Zero);

    public override TimeZoneInfo LocalTimeZone => TimeZoneInfo.Utc;

    public override DateTimeOffset GetUtcNow() => now;

    public void Advance(TimeSpan by)
    {
        now += by;
        foreach (var timer in timers.Where(t => t.Due <= now).ToList())
        {
            timer.Fire();
        }
    }

    public override ITimer CreateTimer(TimerCallback callback, object? state, TimeSpan dueTime, TimeSpan period)
    {
        var timer = new ManualTimer(this, callback, state);
        timer.Change(dueTime, period);
        timers.Add(timer);
        return timer;
    }

    private sealed class ManualTimer(ManualTime time, TimerCallback callback, object? state) : ITimer
    {
        public DateTimeOffset Due { get; private set; } = DateTimeOffset.MaxValue;

        public bool Change(TimeSpan dueTime, TimeSpan period)
        {
            Due = dueTime == Timeout.InfiniteTimeSpan ? DateTimeOffset.MaxValue : time.now + dueTime;
            return true;
        }

        public void Fire()
        {
            Due = DateTimeOffset.MaxValue;
            callback(state);
        }

        public void Dispose() => time.timers.Remove(this);

        public ValueTask DisposeAsync()
        {
            Dispose();
            return ValueTask.CompletedTask;
        }
    }
}
