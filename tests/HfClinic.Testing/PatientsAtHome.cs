using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;

namespace HfClinic.Testing;

/// <summary>Invented people on home weighing, entered as staff enter them.</summary>
public static class PatientsAtHome
{
    /// <summary>The clinic day on which <see cref="TestClinic.UsualStart"/> stands.</summary>
    public static readonly DateOnly Today = new(2026, 3, 31);

    /// <summary>Enrols somebody who weighs at home, with a target weight when given.</summary>
    public static async Task<long> EnrolAtHomeAsync(this TestClinic clinic, string number = "T-1", string familyName = "Elsmere", decimal? targetKilograms = 80m)
    {
        var id = await clinic.EnrolAsync(ClinicSteps.Someone with
        {
            ClinicNumber = number,
            FamilyName = familyName,
            EnrolledOn = Today.AddDays(-60),
        });
        if (targetKilograms is { } target)
        {
            await clinic.Get<SetTargetWeight>().RunAsync(
                TestClinic.As(ClinicRole.Prescriber), id, Weight.FromKilograms(target), Today.AddDays(-20), "euvolaemic in clinic");
        }

        return id;
    }

    /// <summary>Records weights on the days up to today, the last one today.</summary>
    public static async Task WeighDailyAsync(this TestClinic clinic, long patientId, params decimal[] kilograms)
    {
        for (var at = 0; at < kilograms.Length; at++)
        {
            await clinic.WeighAsync(patientId, Today.AddDays(at - kilograms.Length + 1), kilograms[at]);
        }
    }
}
