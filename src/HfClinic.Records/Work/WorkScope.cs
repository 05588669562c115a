using HfClinic.Records.Access;
using HfClinic.Records.Audit;
using HfClinic.Records.Patients;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Work;

/// <summary>One piece of work under way: its database, its actor, its time, and the patients it touches.</summary>
public sealed class WorkScope(ClinicDb db, Actor actor, ClinicClock clock)
{
    private readonly SortedSet<long> touched = [];
    private readonly List<AuditNote> notes = [];
    private readonly List<AuditedChange> changes = [];

    public ClinicDb Db => db;

    public Actor Actor => actor;

    /// <summary>One moment for the whole piece of work, UTC.</summary>
    public DateTime Now { get; } = clock.Now;

    public ClinicClock Clock => clock;

    /// <summary>The clinic day of <see cref="Now"/>.</summary>
    public DateOnly Today => clock.DayOf(Now);

    /// <summary>The patients to reassess before the commit.</summary>
    public IReadOnlySet<long> Touched => touched;

    /// <summary>
    /// Takes the patient for this piece of work: nobody else's work on the same patient goes between, and the patient is reassessed at the end.
    /// </summary>
    /// <exception cref="NotFoundException">No such patient.</exception>
    public async Task<Patient> TakePatientAsync(long patientId, CancellationToken cancellation)
    {
        await LockAsync(patientId, cancellation);
        return await db.Patients.SingleOrDefaultAsync(patient => patient.Id == patientId, cancellation)
            ?? throw new NotFoundException($"There is no patient with the number {patientId} in this clinic's record.");
    }

    /// <summary>Takes several patients at once, in one order for everybody so that no two pieces of work wait for each other.</summary>
    public async Task TakePatientsAsync(IEnumerable<long> patientIds, CancellationToken cancellation)
    {
        foreach (var patientId in patientIds.Order())
        {
            await LockAsync(patientId, cancellation);
        }
    }

    /// <summary>
    /// Holds many patients for a bulk entry, without reassessing them: the caller has each reassessed in a later piece of work.
    /// </summary>
    /// <returns>Each patient's version, which every piece of work that takes the patient raises.</returns>
    public async Task<IReadOnlyDictionary<long, int>> HoldPatientsAsync(IReadOnlyCollection<long> patientIds, CancellationToken cancellation)
    {
        long[] ids = [.. patientIds.Order()];
        if (db.Database.IsNpgsql())
        {
            await db.Database.ExecuteSqlAsync(
                $"""SELECT 1 FROM "PatientSummaries" WHERE "PatientId" = ANY({ids}) ORDER BY "PatientId" FOR UPDATE""", cancellation);
        }

        var held = db.PatientSummaries.Where(summary => ids.Contains(summary.PatientId));
        await held.ExecuteUpdateAsync(set => set.SetProperty(summary => summary.Version, summary => summary.Version + 1), cancellation);
        return await held.Select(summary => new { summary.PatientId, summary.Version })
            .ToDictionaryAsync(summary => summary.PatientId, summary => summary.Version, cancellation);
    }

    /// <summary>Has a patient added in this piece of work reassessed at the end.</summary>
    public void Reassess(long patientId) => touched.Add(patientId);

    /// <summary>Saves so far, so that new rows get their numbers. Nothing holds before the whole piece of work commits.</summary>
    public async Task SaveAsync(CancellationToken cancellation)
    {
        changes.AddRange(AuditTrail.Collect(db));
        await db.SaveChangesAsync(cancellation);
    }

    /// <summary>Adds a line to the record of access for something that changes no row, for example a chart opened.</summary>
    public void Note(string what, long? patientId = null, string? detail = null) => notes.Add(new(what, patientId, detail));

    internal IReadOnlyList<AuditNote> Notes => notes;

    internal IReadOnlyList<AuditedChange> Changes => changes;

    private async Task LockAsync(long patientId, CancellationToken cancellation)
    {
        await db.PatientSummaries.Where(summary => summary.PatientId == patientId)
            .ExecuteUpdateAsync(set => set.SetProperty(summary => summary.Version, summary => summary.Version + 1), cancellation);
        touched.Add(patientId);
    }
}

/// <summary>A line for the record of access that stands for no changed row.</summary>
internal sealed record AuditNote(string What, long? PatientId, string? Detail);
