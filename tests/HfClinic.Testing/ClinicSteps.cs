using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;
using Xunit;

namespace HfClinic.Testing;

/// <summary>What many tests do first: enrol an invented person and record their weights, through the clinic's own verbs.</summary>
public static class ClinicSteps
{
    /// <summary>An invented person, enrolled on 10 Jan 2026 and weighing at home.</summary>
    public static PatientDetails Someone { get; } = new()
    {
        ClinicNumber = "T-100",
        FamilyName = "Elsmere",
        GivenName = "Oda",
        BirthDate = new DateOnly(1948, 5, 2),
        Sex = Sex.Female,
        Phone = "555-0184",
        EnrolledOn = new DateOnly(2026, 1, 10),
        WeighsAtHome = true,
    };

    /// <summary>Enrols <see cref="Someone"/>, or whoever is given.</summary>
    public static Task<long> EnrolAsync(this TestClinic clinic, PatientDetails? details = null) =>
        clinic.Get<EnrolPatient>().RunAsync(TestClinic.As(ClinicRole.Nurse), details ?? Someone, TestContext.Current.CancellationToken);

    /// <summary>Records a weight at 07:00 of a day, called in to the nurse; returns its identifier.</summary>
    public static async Task<long> WeighAsync(this TestClinic clinic, long patientId, DateOnly day, decimal kilograms)
    {
        var recorded = await clinic.Get<RecordReadings>().RunAsync(TestClinic.As(ClinicRole.Nurse), patientId, new TakenReadings
        {
            LocalTime = day.ToDateTime(new TimeOnly(7, 0)),
            Weight = Weight.FromKilograms(kilograms),
        }, TestContext.Current.CancellationToken);
        return recorded.ReadingIds.Single();
    }

    /// <summary>Puts a held weight on record; returns its identifier.</summary>
    public static Task<long> HoldWeightAsync(this TestClinic clinic, long patientId, DateOnly day, decimal kilograms, HoldReason reason) =>
        clinic.Get<ClinicWork>().RunAsync(Actor.Program("test"), Capability.RecordReadings, async scope =>
        {
            await scope.TakePatientAsync(patientId, TestContext.Current.CancellationToken);
            var reading = new Reading
            {
                PatientId = patientId,
                Kind = ReadingKind.Weight,
                MeasuredAt = clinic.Get<ClinicClock>().ToUtc(day.ToDateTime(new TimeOnly(7, 0))),
                Day = day,
                Value = Weight.FromKilograms(kilograms).Grams,
                Source = ReadingSource.HomeFile,
                State = ReadingState.Held,
                FirstState = ReadingState.Held,
                HoldReason = reason,
                RecordedAt = scope.Now,
            };
            scope.Db.Readings.Add(reading);
            await scope.SaveAsync(TestContext.Current.CancellationToken);
            return reading.Id;
        }, TestContext.Current.CancellationToken);

    /// <summary>Enrols somebody who gained 2.6 kg in the 3 days up to 31 Mar 2026, which raises a flag for today.</summary>
    public static async Task<long> EnrolWithGainAsync(this TestClinic clinic, PatientDetails? details = null)
    {
        var patientId = await clinic.EnrolAsync(details);
        await clinic.WeighAsync(patientId, new DateOnly(2026, 3, 28), 72.0m);
        await clinic.WeighAsync(patientId, new DateOnly(2026, 3, 31), 74.6m);
        return patientId;
    }
}
