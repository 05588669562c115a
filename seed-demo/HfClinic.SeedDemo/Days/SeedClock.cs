namespace HfClinic.SeedDemo.Days;

/// <summary>The clock while the demo is made: moved forward from one past moment to the next, never back.</summary>
internal sealed class SeedClock(DateTimeOffset start) : TimeProvider
{
    private DateTimeOffset now = start;

    public override DateTimeOffset GetUtcNow() => now;

    /// <exception cref="InvalidOperationException">The moment lies before the present one.</exception>
    public void MoveTo(DateTimeOffset moment) => now = moment >= now
        ? moment
        : throw new InvalidOperationException($"The demo's clock stands at {now:u} and does not go back to {moment:u}.");
}
