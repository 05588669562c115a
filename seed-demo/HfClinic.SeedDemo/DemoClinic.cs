using System.Security.Cryptography;
using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using HfClinic.SeedDemo.Days;
using HfClinic.SeedDemo.Stories;
using HfClinic.SeedDemo.Telling;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.SeedDemo;

/// <summary>
/// The demo clinic: invented patients with half a year of weights, pressures, symptoms, medicines, blood tests and visits,
/// and among them stories worth finding. Its days end today; otherwise it is the same each time.
/// </summary>
public static class DemoClinic
{
    public const string Name = "Saltmarsh Heart Failure Clinic";

    /// <summary>IANA name of the clinic's time zone.</summary>
    public const string TimeZone = "Europe/Dublin";

    /// <summary>The usual number of patients.</summary>
    public const int UsualPatients = QuietPatients.UsualSize;

    /// <summary>The sign-in names, one for each role.</summary>
    public static IReadOnlyDictionary<ClinicRole, string> SignInNames { get; } = new Dictionary<ClinicRole, string>
    {
        [ClinicRole.Nurse] = "nurse",
        [ClinicRole.Prescriber] = "cardiologist",
        [ClinicRole.Coordinator] = "coordinator",
        [ClinicRole.Administrator] = "administrator",
    };

    /// <summary>Makes the demo clinic in an empty, migrated database.</summary>
    /// <param name="services">The program's services.</param>
    /// <param name="patients">How many patients; at least those of the stories.</param>
    /// <exception cref="RefusedException">The database is not empty, or the number of patients is out of range. Nothing was changed.</exception>
    public static async Task SeedAsync(IServiceProvider services, int patients = UsualPatients, CancellationToken cancellation = default)
    {
        if (patients < StoryBook.All.Length || patients > 100_000)
        {
            throw new RefusedException(new Problem("patients", $"A demo of {patients} patients cannot be made.",
                $"Give a number from {StoryBook.All.Length} to 100000."));
        }

        await RefuseUnlessEmptyAsync(services, cancellation);
        var now = Milliseconds(services.GetRequiredService<TimeProvider>().GetUtcNow());
        var clock = new SeedClock(now.AddDays(Story.Begins - 2));
        await using (var past = SeedServices.Build(services, clock))
        {
            var team = await SetUpAsync(past, cancellation);
            var days = new DemoDays(past.GetRequiredService<ClinicClock>(), now.UtcDateTime);
            await new DemoSeeding(past, clock, days, team, now).RunAsync(patients, cancellation);
        }

        await using var db = await services.GetRequiredService<IDbContextFactory<ClinicDb>>().CreateDbContextAsync(cancellation);
        await services.GetRequiredService<CurrentSettings>().RefreshAsync(db, cancellation);
    }

    private static async Task RefuseUnlessEmptyAsync(IServiceProvider services, CancellationToken cancellation)
    {
        await using var db = await services.GetRequiredService<IDbContextFactory<ClinicDb>>().CreateDbContextAsync(cancellation);
        if (await db.Settings.AnyAsync(cancellation) || await db.Patients.AnyAsync(cancellation) || await db.Users.AnyAsync(cancellation))
        {
            throw new RefusedException(new Problem("",
                "This database is not empty, so the demo clinic is not put into it.",
                "Name an empty database, or start the demo over with --fresh."));
        }
    }

    private static async Task<Team> SetUpAsync(IServiceProvider past, CancellationToken cancellation)
    {
        await using var scope = past.CreateAsyncScope();
        await scope.ServiceProvider.GetRequiredService<SetUpClinic>().RunAsync(
            new NewClinic(Name, TimeZone, WeightUnit.Kilograms, IsDemo: true),
            [.. SignInNames.Select(entry => new NewPerson(entry.Value, DisplayName(entry.Key), RandomNumberGenerator.GetHexString(40), [entry.Key]))],
            cancellation);
        var people = await scope.ServiceProvider.GetRequiredService<People>().ListAsync(cancellation);
        return new Team(ActorOf(ClinicRole.Nurse), ActorOf(ClinicRole.Prescriber));

        Actor ActorOf(ClinicRole role)
        {
            var person = people.Single(p => p.Roles.Contains(role));
            return new Actor(person.Id, person.DisplayName, [role]);
        }
    }

    private static string DisplayName(ClinicRole role) => role switch
    {
        ClinicRole.Nurse => "HF nurse",
        ClinicRole.Prescriber => "Cardiologist",
        ClinicRole.Coordinator => "Coordinator",
        _ => "Administrator",
    };

    private static DateTimeOffset Milliseconds(DateTimeOffset time) => time.AddTicks(-(time.Ticks % TimeSpan.TicksPerMillisecond));
}
