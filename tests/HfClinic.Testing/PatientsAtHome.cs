using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;

namespace HfClinic.Testing;

/// <summary>Invented people on home weighing, entered as staff enter them.</summary>
public static class PatientsAtHome
{
    /// <summary>The clinic day on which <see cref="TestClinic.UsualStart"/> stands.</summary>
    public static readonly DateOnly Today = new(2026, 3, 31);

    /// <summary>Enrols somebody who weighs at home, with a target weight when given.</summary>
    public static async Task<long> EnrolAsync(this TestClinic clinic, string number = "T-1", string familyName = "Elsmere", decimal? targetKilograms = 80m)
    {
        var id = await clinic.Get<EnrolPatient>().RunAsync(TestClinic.As(ClinicRole.Nurse), new PatientDetails
        {
            ClinicNumber = number,
            FamilyName = familyName,
            GivenName = "Oda",
            BirthDate = new DateOnly(1948, 5, 2),
            Sex = Sex.Female,
            EnrolledOn = Today.AddDays(-60),
            WeighsAtHome = true,
        });
        if (targetKilograms is { } target)
        {
            await clinic.Get<SetTargetWeight>().RunAsync(
                TestClinic.As(ClinicRole.Prescriber), id, Weight.FromKilograms(target), Today.AddDays(-20), "euvolaemic in clinic");
        }

        return id;
    }

    /// <summary>Records a weight called in on a day at 07:00.</summary>
    public static Task<RecordedReadings> WeighAsync(this TestClinic clinic, long patientId, DateOnly day, decimal kilograms) =>
        clinic.Get<RecordReadings>().RunAsync(TestClinic.As(ClinicRole.Nurse), patientId, new TakenReadings
        {
            LocalTime = day.ToDateTime(new TimeOnly(7, 0)),
            Weight = Weight.FromKilograms(kilograms),
        });

    /// <summary>Records weights on the days up to today, the last one today.</summary>
    public static async Task WeighDailyAsync(this TestClinic clinic, long patientId, params decimal[] kilograms)
    {
        for (var at = 0; at < kilograms.Length; at++)
        {
            await clinic.WeighAsync(patientId, Today.AddDays(at - kilograms.Length + 1), kilograms[at]);
        }
    }
}
