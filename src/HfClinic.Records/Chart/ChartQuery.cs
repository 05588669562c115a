using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Protocol;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Chart;

/// <summary>Reads everything on record of one patient.</summary>
public sealed class ChartQuery(ClinicWork work, IDbContextFactory<ClinicDb> databases, ProtocolInForce protocol)
{
    public const string Opened = "Chart opened";

    /// <summary>Opens a chart: the record of access says so, once, before anything is shown.</summary>
    /// <exception cref="NotFoundException">No such patient.</exception>
    /// <exception cref="NotAllowedException">The actor may not read charts.</exception>
    public async Task<PatientChart> OpenAsync(Actor actor, long patientId, CancellationToken cancellation = default)
    {
        await work.RunAsync(actor, Capability.ReadCharts, async scope =>
        {
            if (!await scope.Db.Patients.AnyAsync(patient => patient.Id == patientId, cancellation))
            {
                throw NoSuch(patientId);
            }

            scope.Note(Opened, patientId);
        }, cancellation);
        return await ReadAgainAsync(patientId, cancellation);
    }

    /// <summary>Reads a chart that is open already, after a change; this is not a new opening.</summary>
    /// <exception cref="NotFoundException">No such patient.</exception>
    public async Task<PatientChart> ReadAgainAsync(long patientId, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        db.ChangeTracker.QueryTrackingBehavior = QueryTrackingBehavior.NoTracking;
        var patient = await db.Patients.SingleOrDefaultAsync(p => p.Id == patientId, cancellation) ?? throw NoSuch(patientId);
        return new PatientChart
        {
            Patient = patient,
            NurseName = await db.Users.Where(user => user.Id == patient.NurseId).Select(user => user.DisplayName).SingleOrDefaultAsync(cancellation),
            Summary = await db.PatientSummaries.SingleAsync(summary => summary.PatientId == patientId, cancellation),
            TargetWeights = await db.TargetWeights.Where(target => target.PatientId == patientId)
                .OrderByDescending(target => target.From).ThenByDescending(target => target.Id).ToListAsync(cancellation),
            DoseCourses = await db.DoseCourses.Where(course => course.PatientId == patientId)
                .OrderBy(course => course.Until == null && course.StruckOutAt == null ? 0 : 1)
                .ThenByDescending(course => course.From).ThenByDescending(course => course.Id).ToListAsync(cancellation),
            BloodTests = await db.BloodTests.Where(test => test.PatientId == patientId)
                .OrderByDescending(test => test.TakenAt).ThenBy(test => test.Analyte).ToListAsync(cancellation),
            EjectionFractions = await db.EjectionFractions.Where(fraction => fraction.PatientId == patientId)
                .OrderByDescending(fraction => fraction.Day).ThenByDescending(fraction => fraction.Id).ToListAsync(cancellation),
            Visits = await db.Visits.Where(visit => visit.PatientId == patientId)
                .OrderByDescending(visit => visit.Day).ThenByDescending(visit => visit.Id).ToListAsync(cancellation),
            SymptomReports = await db.SymptomReports.Where(report => report.PatientId == patientId)
                .OrderByDescending(report => report.Day).ThenByDescending(report => report.Id).ToListAsync(cancellation),
            Contacts = await db.Contacts.Where(contact => contact.PatientId == patientId)
                .OrderByDescending(contact => contact.At).ThenByDescending(contact => contact.Id).ToListAsync(cancellation),
            Questions = await db.Questions.Where(question => question.PatientId == patientId)
                .OrderByDescending(question => question.AskedAt).ThenByDescending(question => question.Id).ToListAsync(cancellation),
            Flags = await FlagsAsync(db, patientId, cancellation),
            OwnThresholds = await db.PatientThresholds.Where(threshold => threshold.PatientId == patientId)
                .OrderBy(threshold => threshold.EndedAt == null ? 0 : 1).ThenByDescending(threshold => threshold.Id).ToListAsync(cancellation),
            ClinicProtocol = protocol.Clinic,
        };
    }

    /// <summary>A page of readings, the latest first, those struck out or corrected among them.</summary>
    /// <param name="kind">Only this kind; null for all.</param>
    public async Task<IReadOnlyList<ChartReading>> ReadingsAsync(
        long patientId, ReadingKind? kind, int skip, int take, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var rows = await (from reading in db.Readings.AsNoTracking()
                          where reading.PatientId == patientId && (kind == null || reading.Kind == kind)
                          join user in db.Users on reading.RecordedById equals (Guid?)user.Id into users
                          from user in users.DefaultIfEmpty()
                          orderby reading.MeasuredAt descending, reading.Kind, reading.Id descending
                          select new { Reading = reading, Name = user == null ? null : user.DisplayName })
            .Skip(skip).Take(take).ToListAsync(cancellation);
        var ids = rows.Select(row => row.Reading.Id).ToList();
        var decisions = (await db.ReadingDecisions.AsNoTracking().Where(decision => ids.Contains(decision.ReadingId))
            .OrderBy(decision => decision.Id).ToListAsync(cancellation)).ToLookup(decision => decision.ReadingId);
        return [.. rows.Select(row => new ChartReading(row.Reading, row.Name, [.. decisions[row.Reading.Id]]))];
    }

    /// <summary>How many readings there are.</summary>
    public async Task<int> ReadingCountAsync(long patientId, ReadingKind? kind, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await db.Readings.CountAsync(reading => reading.PatientId == patientId && (kind == null || reading.Kind == kind), cancellation);
    }

    private static async Task<IReadOnlyList<ChartFlag>> FlagsAsync(ClinicDb db, long patientId, CancellationToken cancellation)
    {
        var flags = await db.Flags.Where(flag => flag.PatientId == patientId).ToListAsync(cancellation);
        var steps = (await db.FlagSteps.Where(step => step.PatientId == patientId).OrderBy(step => step.Id).ToListAsync(cancellation))
            .ToLookup(step => step.FlagId);
        return [.. flags.OrderBy(flag => flag.State == FlagState.Open ? 0 : 1)
            .ThenByDescending(flag => flag.State == FlagState.Open ? flag.Urgency : default)
            .ThenByDescending(flag => flag.RaisedAt).ThenByDescending(flag => flag.Id)
            .Select(flag => new ChartFlag(flag, [.. steps[flag.Id]]))];
    }

    private static NotFoundException NoSuch(long patientId) => new($"There is no patient with the number {patientId} in this clinic's record.");
}
