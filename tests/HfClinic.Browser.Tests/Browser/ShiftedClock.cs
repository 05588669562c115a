namespace HfClinic.Browser.Tests.Browser;

/// <summary>A clock that runs as fast as the real one from a given start: pages wait and debounce, yet the day is known.</summary>
internal sealed class ShiftedClock(DateTimeOffset start) : TimeProvider
{
    private readonly long started = System.GetTimestamp();

    public override DateTimeOffset GetUtcNow() => start + System.GetElapsedTime(started);
}
