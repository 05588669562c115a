using System.Collections.Immutable;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>An open flag with its evidence as it was stored.</summary>
public sealed record WhyFlag(Flag Flag, ImmutableArray<Evidence> Evidence)
{
    /// <summary>Whether it is kept off the list at the moment.</summary>
    public bool IsPutOff(DateOnly today) => Flag.PutOffUntil > today;
}

/// <summary>A held reading with where it came from.</summary>
public sealed record WhyHeld(long ReadingId, DateTime LocalTime, Weight Weight, HoldReason Reason, string? AsTyped);

/// <summary>One line of what happened before.</summary>
public sealed record WhyBefore(DateOnly Day, string Words);

/// <summary>The latest vital signs and symptoms beside the weight.</summary>
public sealed record WhyBeside(DateOnly Day, string Words);

/// <summary>Everything the panel beside the daily list says about one patient.</summary>
public sealed record WhyPanelData(
    Patient Patient,
    PatientSummary Summary,
    decimal? EjectionFraction,
    DateOnly? EjectionFractionDay,
    int? NyhaClass,
    IReadOnlyList<WhyFlag> Flags,
    IReadOnlyList<WhyHeld> Held,
    IReadOnlyList<WhyBeside> Beside,
    IReadOnlyList<WhyBefore> Before,
    IReadOnlyList<Question> Questions,
    StripContent Strip);

/// <summary>Reads why a patient stands on the list.</summary>
public sealed class WhyQuery(IDbContextFactory<ClinicDb> databases, WeightStripQuery strips, ClinicClock clock)
{
    public const int StripDays = 28;
    private const int MostBefore = 8;

    /// <summary>The panel's content.</summary>
    /// <exception cref="NotFoundException">No such patient.</exception>
    public async Task<WhyPanelData> ReadAsync(long patientId, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var patient = await db.Patients.AsNoTracking().SingleOrDefaultAsync(p => p.Id == patientId, cancellation)
            ?? throw new NotFoundException("There is no such patient in this clinic's record.");
        var today = clock.Today;
        var fraction = await db.EjectionFractions.AsNoTracking()
            .Where(f => f.PatientId == patientId && f.StruckOutAt == null).OrderByDescending(f => f.Day).ThenByDescending(f => f.Id).FirstOrDefaultAsync(cancellation);
        var strip = await strips.ReadAsync([patientId], today.AddDays(1 - StripDays), today, cancellation);
        return new WhyPanelData(
            patient,
            await db.PatientSummaries.AsNoTracking().SingleAsync(s => s.PatientId == patientId, cancellation),
            fraction?.Percent,
            fraction?.Day,
            await db.Visits.AsNoTracking().Where(v => v.PatientId == patientId && v.NyhaClass != null)
                .OrderByDescending(v => v.Day).ThenByDescending(v => v.Id).Select(v => v.NyhaClass).FirstOrDefaultAsync(cancellation),
            await FlagsAsync(db, patientId, cancellation),
            await HeldAsync(db, patientId, cancellation),
            await BesideQuery.ReadAsync(db, patientId, today, cancellation),
            await BeforeAsync(db, patientId, cancellation),
            await db.Questions.AsNoTracking().Where(q => q.PatientId == patientId && (q.AnsweredAt == null || q.AnswerSeenAt == null))
                .OrderBy(q => q.AskedAt).ToListAsync(cancellation),
            strip[patientId]);
    }

    private static async Task<List<WhyFlag>> FlagsAsync(ClinicDb db, long patientId, CancellationToken cancellation) =>
        [.. (await db.Flags.AsNoTracking().Where(flag => flag.PatientId == patientId && flag.State == FlagState.Open).ToListAsync(cancellation))
            .OrderByDescending(flag => flag.Urgency).ThenBy(flag => flag.RaisedAt).ThenBy(flag => flag.Id)
            .Select(flag => new WhyFlag(flag, EvidenceText.Read(flag.EvidenceJson)))];

    private async Task<List<WhyHeld>> HeldAsync(ClinicDb db, long patientId, CancellationToken cancellation) =>
        [.. (await db.Readings.AsNoTracking()
            .Where(r => r.PatientId == patientId && r.State == ReadingState.Held && r.Kind == ReadingKind.Weight)
            .OrderByDescending(r => r.MeasuredAt).ToListAsync(cancellation))
            .Select(r => new WhyHeld(r.Id, clock.ToLocal(r.MeasuredAt), new Weight(r.Value), r.HoldReason ?? HoldReason.Unexplained, r.AsTyped))];

    private static async Task<List<WhyBefore>> BeforeAsync(ClinicDb db, long patientId, CancellationToken cancellation)
    {
        var contacts = await db.Contacts.AsNoTracking().Where(c => c.PatientId == patientId)
            .OrderByDescending(c => c.At).Take(MostBefore).ToListAsync(cancellation);
        var courses = await db.DoseCourses.AsNoTracking()
            .Where(c => c.PatientId == patientId && c.StruckOutAt == null && LoopDiuretics.Names.Contains(c.Medicine))
            .OrderByDescending(c => c.From).Take(MostBefore).ToListAsync(cancellation);
        var answers = await db.Flags.AsNoTracking().Where(f => f.PatientId == patientId && f.AnsweredOn != null)
            .OrderByDescending(f => f.AnsweredAt).Take(MostBefore).ToListAsync(cancellation);
        var lines = contacts.Select(c => new WhyBefore(c.Day, $"{Wording.Sentence(ContactWords.Of(c.Outcome))} ({c.ByName}){Said(c.Note)}"))
            .Concat(courses.Select(c => new WhyBefore(c.From, $"{c.ByName} set {DoseWords.Of(c.Medicine, c.DoseMilligrams, c.TimesDaily)}{Said(c.Reason)}")))
            .Concat(answers.Where(f => !contacts.Exists(c => c.At == f.AnsweredAt))
                .Select(f => new WhyBefore(f.AnsweredOn!.Value, $"{f.AnsweredByName} settled “{f.Statement}”{Said(f.Answer)}")));
        return [.. lines.OrderByDescending(line => line.Day).Take(MostBefore)];
    }

    private static string Said(string? words) => string.IsNullOrWhiteSpace(words) ? "" : $": {words}";
}
