using HfClinic.Clinical.Values;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Testing;

namespace HfClinic.Benchmarks.Harness;

/// <summary>One invented person: the same number always gives the same data. Gains, silence and missing mornings are as frequent as a clinic might see.</summary>
internal sealed class InventedPatient(int pattern, ClinicClock clock)
{
    private static readonly DateOnly Today = PatientsAtHome.Today;
    private readonly int usualGrams = 55_000 + (pattern * 37 % 50_000);

    public static Guid Nurse { get; } = new("6f9f0c8e-52a6-4d6b-9f0a-3d9d4a8a1c11");

    public Patient Person(int number) => new()
    {
        ClinicNumber = $"M-{number:000000}",
        FamilyName = $"Family{number * 7919 % 100_000:00000}",
        GivenName = $"Given{number:00000}",
        SearchText = SearchFolding.ForPatient($"Family{number * 7919 % 100_000:00000}", $"Given{number:00000}", $"M-{number:000000}"),
        BirthDate = new DateOnly(1930 + (pattern % 40), 1 + (pattern % 12), 1 + (pattern % 28)),
        Sex = pattern % 2 == 0 ? Sex.Female : Sex.Male,
        Phone = $"555 {number:000000}",
        EnrolledOn = Today.AddDays(-400),
        WeighsAtHome = true,
        NurseId = pattern % 4 == 0 ? Nurse : null,
    };

    public TargetWeight Target(long patientId) => new()
    {
        PatientId = patientId,
        From = Today.AddDays(-20 - (pattern % 60)),
        Grams = usualGrams,
        ByName = "Test Prescriber",
        RecordedAt = clock.Now,
    };

    /// <summary>A loop diuretic; one in three had its dose changed within the strip.</summary>
    public IEnumerable<DoseCourse> Diuretics(long patientId)
    {
        var changed = pattern % 3 == 0 ? Today.AddDays(-3 - (pattern % 20)) : (DateOnly?)null;
        yield return Course(patientId, 1, Today.AddDays(-300), changed);
        if (changed is { } day)
        {
            yield return Course(patientId, 2, day, null);
        }
    }

    public IEnumerable<Reading> Readings(long patientId, int days)
    {
        var random = new Random(pattern);
        var last = Today.AddDays(pattern % 12 == 5 ? -6 : pattern % 6 == 1 ? -1 : 0);
        for (var day = Today.AddDays(1 - days); day <= last; day = day.AddDays(1))
        {
            if (random.Next(20) == 0 && day < last)
            {
                continue;
            }

            var gain = pattern % 9 == 4 ? Math.Max(0, 5 - (Today.DayNumber - day.DayNumber)) * 550 : 0;
            var grams = usualGrams + gain + ((random.Next(-3, 4) + random.Next(-3, 4)) * 100);
            yield return Taken(patientId, day, ReadingKind.Weight, grams);
            if (day.DayNumber % 7 == pattern % 7)
            {
                yield return Taken(patientId, day, ReadingKind.SystolicPressure, 100 + random.Next(40));
                yield return Taken(patientId, day, ReadingKind.DiastolicPressure, 60 + random.Next(20));
                yield return Taken(patientId, day, ReadingKind.HeartRate, 55 + random.Next(40));
            }
        }
    }

    private DoseCourse Course(long patientId, int timesDaily, DateOnly from, DateOnly? until) => new()
    {
        PatientId = patientId,
        Medicine = "furosemide",
        DoseMilligrams = 40,
        TimesDaily = timesDaily,
        From = from,
        Until = until,
        RecordedAt = clock.Now,
        ByName = "Test Prescriber",
    };

    private Reading Taken(long patientId, DateOnly day, ReadingKind kind, int value) => new()
    {
        PatientId = patientId,
        Kind = kind,
        MeasuredAt = clock.ToUtc(day.ToDateTime(new TimeOnly(7, 0))),
        Day = day,
        Value = value,
        Source = ReadingSource.HomeFile,
        RecordedAt = clock.Now,
    };
}
