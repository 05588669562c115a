using HfClinic.Records;
using HfClinic.Records.Flags;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Testing;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Benchmarks.Harness;

/// <summary>Fills a clinic with invented people straight into its tables; reassessment is left to the caller.</summary>
internal sealed class InventedClinic(TestClinic clinic, int days)
{
    /// <summary>As many different people there are; from there on they repeat, and so may their summaries.</summary>
    public const int Patterns = 1_000;

    private readonly ClinicClock clock = clinic.Get<ClinicClock>();
    private int people;

    /// <summary>Adds people up to the given number; those beyond the patterns take the summary of the person they repeat.</summary>
    public async Task GrowAsync(int upTo)
    {
        while (people < upTo)
        {
            var count = Math.Min(Patterns - (people % Patterns), upTo - people);
            await AddAsync(count, people < Patterns ? [] : await FirstSummariesAsync());
        }
    }

    private async Task AddAsync(int count, List<PatientSummary> summaries)
    {
        await using var db = clinic.OpenDb();
        await using var transaction = await db.Database.BeginTransactionAsync();
        var added = Enumerable.Range(people, count)
            .Select(number => (Data: new InventedPatient(number % Patterns, clock), Number: number))
            .Select(person => (person.Data, person.Number, Patient: person.Data.Person(person.Number))).ToList();
        db.Patients.AddRange(added.Select(person => person.Patient));
        await db.SaveChangesAsync();
        foreach (var (data, number, patient) in added)
        {
            db.PatientSummaries.Add(summaries is [] ? new() { PatientId = patient.Id } : Copy(db, summaries[number % Patterns], patient.Id));
            db.TargetWeights.Add(data.Target(patient.Id));
            db.DoseCourses.AddRange(data.Diuretics(patient.Id));
        }

        await db.SaveChangesAsync();
        await ReadingBulk.InsertAsync(db, added.SelectMany(person => person.Data.Readings(person.Patient.Id, days)), CancellationToken.None);
        await transaction.CommitAsync();
        people += count;
    }

    private async Task<List<PatientSummary>> FirstSummariesAsync()
    {
        await using var db = clinic.OpenDb();
        return await db.PatientSummaries.AsNoTracking().OrderBy(summary => summary.PatientId).Take(Patterns).ToListAsync();
    }

    private static PatientSummary Copy(ClinicDb db, PatientSummary original, long patientId)
    {
        var copy = (PatientSummary)db.Entry(original).CurrentValues.ToObject();
        copy.PatientId = patientId;
        return copy;
    }
}
