namespace HfClinic.Records.Settings;

/// <summary>The time in the clinic: UTC for storing, the clinic's wall clock for days.</summary>
public sealed class ClinicClock(TimeProvider time, CurrentSettings settings)
{
    /// <summary>Now, UTC, to the millisecond (what both databases keep).</summary>
    public DateTime Now
    {
        get
        {
            var now = time.GetUtcNow().UtcDateTime;
            return new DateTime(now.Ticks - (now.Ticks % TimeSpan.TicksPerMillisecond), DateTimeKind.Utc);
        }
    }

    /// <summary>The clinic's time zone; UTC until the clinic is set up.</summary>
    public TimeZoneInfo Zone => settings.OrNull is { } known ? TimeZoneInfo.FindSystemTimeZoneById(known.TimeZone) : TimeZoneInfo.Utc;

    /// <summary>Today in the clinic.</summary>
    public DateOnly Today => DayOf(Now);

    /// <summary>The clinic day of a UTC time.</summary>
    public DateOnly DayOf(DateTime utc) => DateOnly.FromDateTime(ToLocal(utc));

    /// <summary>The clinic's wall clock at a UTC time; its kind is unspecified.</summary>
    public DateTime ToLocal(DateTime utc) =>
        DateTime.SpecifyKind(TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(utc, DateTimeKind.Utc), Zone), DateTimeKind.Unspecified);

    /// <summary>
    /// UTC of a wall-clock time. A time skipped when the clocks go forward is read an hour later;
    /// one that happens twice is read as the later (standard) time.
    /// </summary>
    public DateTime ToUtc(DateTime local)
    {
        var wall = DateTime.SpecifyKind(local, DateTimeKind.Unspecified);
        var zone = Zone;
        return TimeZoneInfo.ConvertTimeToUtc(zone.IsInvalidTime(wall) ? wall.AddHours(1) : wall, zone);
    }
}
