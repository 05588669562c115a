using HfClinic.Records.Settings;

namespace HfClinic.SeedDemo.Days;

/// <summary>
/// The days of the demo, counted back from its last morning: 0 is the last, −1 the day before. The last morning is today's,
/// or yesterday's while it is too early for people to have weighed themselves.
/// </summary>
internal sealed class DemoDays
{
    /// <summary>How far the weights from home go back, in days.</summary>
    public const int History = 180;

    /// <summary>The people of the stories have weighed themselves by now.</summary>
    public static readonly TimeOnly MorningDone = new(7, 30);

    private readonly ClinicClock clock;
    private readonly DateOnly last;
    private readonly DateTime now;

    public DemoDays(ClinicClock clock, DateTime nowUtc)
    {
        this.clock = clock;
        now = nowUtc;
        var local = clock.ToLocal(nowUtc);
        var today = DateOnly.FromDateTime(local);
        last = TimeOnly.FromDateTime(local) >= MorningDone ? today : today.AddDays(-1);
    }

    /// <summary>The date of a day of the demo.</summary>
    public DateOnly Date(int day) => last.AddDays(day);

    /// <summary>UTC of a minute of a day of the demo, on the clinic's wall clock.</summary>
    public DateTime Utc(int day, int minute) => clock.ToUtc(Date(day).ToDateTime(TimeOnly.MinValue).AddMinutes(minute));

    /// <summary>UTC of a time of a day of the demo, on the clinic's wall clock.</summary>
    public DateTime Utc(int day, TimeOnly at) => clock.ToUtc(Date(day).ToDateTime(at));

    /// <summary>Whether the moment is not in the future.</summary>
    public bool HasCome(DateTime utc) => utc <= now;
}
