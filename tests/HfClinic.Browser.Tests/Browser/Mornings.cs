using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Time.Testing;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>A morning with something to do: invented people, entered through the program's own verbs.</summary>
internal static class Mornings
{
    /// <summary>The ready clinic with three people who gained fluid overnight and one who did not.</summary>
    public static DatabaseTemplate ThreeGains { get; } = new("three_gains", FillAsync);

    private static async Task FillAsync(DatabaseEngine engine, string connectionString)
    {
        await Templates.Ready.Fill(engine, connectionString);
        await using var services = new ServiceCollection()
            .AddClinic(connectionString, new FakeTimeProvider(TestClinic.UsualStart)).BuildServiceProvider();
        await services.GetRequiredService<Records.Storage.ClinicStorage>().PrepareAsync(CancellationToken.None);
        await EnrolAsync(services, "T-1", "Elsmere", [72.0m, 72.1m, 72.0m, 74.6m]);
        await EnrolAsync(services, "T-2", "O’Tamsey", [97.0m, 97.2m, 97.1m, 99.8m]);
        await EnrolAsync(services, "T-3", "Quinholm-Aldthorpe", [56.1m, 56.0m, 56.2m, 58.4m]);
        await EnrolAsync(services, "T-4", "Pelmere", [69.2m, 69.1m, 69.3m, 69.2m]);
    }

    private static async Task EnrolAsync(IServiceProvider services, string number, string familyName, decimal[] kilograms)
    {
        var nurse = TestClinic.As(ClinicRole.Nurse);
        var id = await services.GetRequiredService<EnrolPatient>().RunAsync(
            nurse, ClinicSteps.Someone with { ClinicNumber = number, FamilyName = familyName });
        for (var at = 0; at < kilograms.Length; at++)
        {
            await services.GetRequiredService<RecordReadings>().RunAsync(nurse, id, new TakenReadings
            {
                LocalTime = PatientsAtHome.Today.AddDays(at - kilograms.Length + 1).ToDateTime(new TimeOnly(7, 0)),
                Weight = Weight.FromKilograms(kilograms[at]),
                AskedForSymptoms = true,
            });
        }
    }
}
