using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using HfClinic.Records.Storage;
using HfClinic.Testing.Databases;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Time.Testing;

namespace HfClinic.Testing;

/// <summary>Starting contents made by the program itself.</summary>
public static class Templates
{
    /// <summary>The password of everybody in the ready clinic.</summary>
    public const string Password = "a long test password";

    /// <summary>Migrated, not yet set up: what the first-run page finds.</summary>
    public static DatabaseTemplate Migrated { get; } = new("migrated", (engine, connection) => PrepareAsync(connection, ready: false));

    /// <summary>Set up, in the time zone Europe/Dublin, with one person of each role: "nurse", "prescriber", "coordinator", "administrator".</summary>
    public static DatabaseTemplate Ready { get; } = new("ready", (engine, connection) => PrepareAsync(connection, ready: true));

    /// <summary>The clinic's services on a connection string.</summary>
    public static IServiceCollection AddClinic(this IServiceCollection services, string connectionString, TimeProvider clock)
    {
        services.AddLogging(logging => logging.SetMinimumLevel(LogLevel.Warning));
        services.AddSingleton(clock);
        return services.AddClinicRecords(_ => StorageChoice.From(connectionString));
    }

    private static async Task PrepareAsync(string connectionString, bool ready)
    {
        await using var services = new ServiceCollection()
            .AddClinic(connectionString, new FakeTimeProvider(TestClinic.UsualStart.AddDays(-1))).BuildServiceProvider();
        await services.GetRequiredService<ClinicStorage>().PrepareAsync(CancellationToken.None);
        if (ready)
        {
            await using var scope = services.CreateAsyncScope();
            await scope.ServiceProvider.GetRequiredService<SetUpClinic>().RunAsync(
                new NewClinic("Test Clinic", "Europe/Dublin", WeightUnit.Kilograms),
                [.. Enum.GetValues<ClinicRole>().Select(role => new NewPerson(
                    role.ToString().ToLowerInvariant(), $"Test {role}", Password, [role]))]);
        }
    }
}
