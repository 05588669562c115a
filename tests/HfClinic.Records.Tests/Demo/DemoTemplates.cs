using HfClinic.Records.Storage;
using HfClinic.SeedDemo;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Time.Testing;

namespace HfClinic.Records.Tests.Demo;

/// <summary>Demo clinics made at fixed times, once for each engine and test run.</summary>
internal static class DemoTemplates
{
    /// <summary>Enough for the stories and some others between.</summary>
    public const int Few = 60;

    /// <summary>Tuesday 10 Nov 2026, 11:30 in the clinic's time zone (winter time, so UTC).</summary>
    public static DateTimeOffset LateMorning { get; } = new(2026, 11, 10, 11, 30, 0, TimeSpan.Zero);

    /// <summary>Half past one at night on the same day.</summary>
    public static DateTimeOffset Night { get; } = new(2026, 11, 10, 1, 30, 0, TimeSpan.Zero);

    /// <summary>A summer evening, 1 Apr 2026, 20:05 in the clinic: the history crosses the spring change of the clocks.</summary>
    public static DateTimeOffset SummerEvening { get; } = new(2026, 4, 1, 19, 5, 0, TimeSpan.Zero);

    public static DatabaseTemplate MadeInLateMorning { get; } = Made("demo_late_morning", LateMorning);

    public static DatabaseTemplate MadeInLateMorningAgain { get; } = Made("demo_late_morning_again", LateMorning);

    public static DatabaseTemplate MadeAtNight { get; } = Made("demo_night", Night, Few);

    public static DatabaseTemplate MadeOnSummerEvening { get; } = Made("demo_summer_evening", SummerEvening, Few);

    private static DatabaseTemplate Made(string name, DateTimeOffset now, int patients = DemoClinic.UsualPatients) => new(name, async (_, connection) =>
    {
        await using var services = new ServiceCollection().AddClinic(connection, new FakeTimeProvider(now)).BuildServiceProvider();
        await services.GetRequiredService<ClinicStorage>().PrepareAsync(CancellationToken.None);
        await DemoClinic.SeedAsync(services, patients);
    });
}
