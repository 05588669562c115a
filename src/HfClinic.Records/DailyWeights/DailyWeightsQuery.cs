using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.Records.Flags;
using HfClinic.Records.Patients;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>Which part of the list is asked for.</summary>
public enum DailyWeightsView
{
    All = 0,
    Today = 1,
    ThisWeek = 2,
    Silent = 3,
    ToCheck = 4,
    Mine = 5,
    NotYet = 6,
    PutOff = 7,
}

/// <summary>What the list is ordered by. Urgency is the nurse's order: the most urgent first, the longest waiting first.</summary>
public enum DailyWeightsSort
{
    Urgency = 0,
    Name = 1,
    Change1Day = 2,
    Change3Days = 3,
    Change7Days = 4,
    ToTarget = 5,
    LastWeight = 6,
}

/// <summary>What of the daily list is wanted.</summary>
/// <param name="NurseId">Whose patients "mine" means.</param>
public sealed record DailyWeightsRequest(
    DailyWeightsView View = DailyWeightsView.All,
    string Search = "",
    DailyWeightsSort Sort = DailyWeightsSort.Urgency,
    Guid? NurseId = null,
    int Skip = 0,
    int Take = 60);

/// <summary>One row of the daily list: a patient and the stored summary.</summary>
public sealed record DailyWeightRow(
    long PatientId, string ClinicNumber, string FamilyName, string GivenName, DateOnly? BirthDate, Sex Sex, string? Phone,
    DateOnly EnrolledOn, PatientSummary Summary)
{
    public string FullName => $"{FamilyName}, {GivenName}";

    /// <summary>Grams above the target; negative below; null without a weight or a target.</summary>
    public int? ToTarget => Summary.LastGrams - Summary.TargetGrams;
}

/// <summary>The counts that stand above the list.</summary>
public sealed record DailyWeightsCounts(
    int OnList, int Today, int ThisWeek, int NextVisit, int Silent, int ToCheck, int NotYet, int Mine, int PutOff);

/// <summary>Reads the daily list from the stored summaries: its cost follows the rows asked for, not the history.</summary>
public sealed class DailyWeightsQuery(IDbContextFactory<ClinicDb> databases, ClinicClock clock)
{
    /// <summary>The rows asked for, in order.</summary>
    public async Task<IReadOnlyList<DailyWeightRow>> RowsAsync(DailyWeightsRequest request, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Ordered(Filtered(db, request), request.Sort)
            .Skip(request.Skip).Take(request.Take)
            .Select(row => new DailyWeightRow(
                row.Patient.Id, row.Patient.ClinicNumber, row.Patient.FamilyName, row.Patient.GivenName, row.Patient.BirthDate,
                row.Patient.Sex, row.Patient.Phone, row.Patient.EnrolledOn, row.Summary))
            .ToListAsync(cancellation);
    }

    /// <summary>How many rows the request has in all.</summary>
    public async Task<int> CountAsync(DailyWeightsRequest request, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Filtered(db, request).CountAsync(cancellation);
    }

    /// <summary>The counts above the list.</summary>
    /// <remarks>
    /// By hand-written SQL that both databases understand: all counts in one pass and one round trip, where the translated
    /// query grouped every row by a constant first.
    /// </remarks>
    public async Task<DailyWeightsCounts> CountsAsync(Guid? nurseId, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var (today, nurse) = (clock.Today, nurseId ?? Guid.Empty);
        var (urgent, week, visit) = ((int)Urgency.Today, (int)Urgency.ThisWeek, (int)Urgency.NextVisit);
        return (await db.Database.SqlQuery<DailyWeightsCounts>($"""
            SELECT CAST(COUNT(*) AS int) AS "OnList",
                CAST(COUNT(CASE WHEN "WorstUrgency" = {urgent} THEN 1 END) AS int) AS "Today",
                CAST(COUNT(CASE WHEN "WorstUrgency" = {week} THEN 1 END) AS int) AS "ThisWeek",
                CAST(COUNT(CASE WHEN "WorstUrgency" = {visit} THEN 1 END) AS int) AS "NextVisit",
                CAST(COUNT(CASE WHEN "IsSilent" THEN 1 END) AS int) AS "Silent",
                CAST(COUNT(CASE WHEN "HeldReadings" > 0 THEN 1 END) AS int) AS "ToCheck",
                CAST(COUNT(CASE WHEN "LastWeightDay" IS NULL OR "LastWeightDay" < {today} THEN 1 END) AS int) AS "NotYet",
                (SELECT CAST(COUNT(*) AS int) FROM "Patients" AS p
                    JOIN "PatientSummaries" AS own ON own."PatientId" = p."Id"
                    WHERE p."NurseId" = {nurse} AND own."OnDailyWeights") AS "Mine",
                CAST(COUNT(CASE WHEN "PutOffFlags" > 0 THEN 1 END) AS int) AS "PutOff"
            FROM "PatientSummaries" WHERE "OnDailyWeights"
            """).ToListAsync(cancellation))[0];
    }

    private IQueryable<PatientWithSummary> Filtered(ClinicDb db, DailyWeightsRequest request)
    {
        var rows = db.PatientSummaries.AsNoTracking().Where(summary => summary.OnDailyWeights)
            .Join(db.Patients.AsNoTracking(), summary => summary.PatientId, patient => patient.Id,
                (summary, patient) => new PatientWithSummary { Summary = summary, Patient = patient });
        var today = clock.Today;
        rows = request.View switch
        {
            DailyWeightsView.Today => rows.Where(row => row.Summary.WorstUrgency == Urgency.Today),
            DailyWeightsView.ThisWeek => rows.Where(row => row.Summary.WorstUrgency == Urgency.ThisWeek),
            DailyWeightsView.Silent => rows.Where(row => row.Summary.IsSilent),
            DailyWeightsView.ToCheck => rows.Where(row => row.Summary.HeldReadings > 0),
            DailyWeightsView.Mine => rows.Where(row => row.Patient.NurseId != null && row.Patient.NurseId == request.NurseId),
            DailyWeightsView.NotYet => rows.Where(row => row.Summary.LastWeightDay == null || row.Summary.LastWeightDay < today),
            DailyWeightsView.PutOff => rows.Where(row => row.Summary.PutOffFlags > 0),
            _ => rows,
        };
        foreach (var word in SearchFolding.Fold(request.Search).Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            rows = rows.Where(row => row.Patient.SearchText.Contains(word));
        }

        return rows;
    }

    private static IQueryable<PatientWithSummary> Ordered(IQueryable<PatientWithSummary> rows, DailyWeightsSort sort) => (sort switch
    {
        DailyWeightsSort.Name => rows.OrderBy(row => row.Patient.SearchText),
        DailyWeightsSort.Change1Day => Largest(rows, row => row.Summary.Gain1Day ?? int.MinValue),
        DailyWeightsSort.Change3Days => Largest(rows, row => row.Summary.Gain3Days ?? int.MinValue),
        DailyWeightsSort.Change7Days => Largest(rows, row => row.Summary.Gain7Days ?? int.MinValue),
        DailyWeightsSort.ToTarget => Largest(rows, row => row.Summary.LastGrams - row.Summary.TargetGrams ?? int.MinValue),
        DailyWeightsSort.LastWeight => rows.OrderBy(row => row.Summary.LastWeightDay ?? DateOnly.MinValue),
        _ => rows.OrderByDescending(row => (int?)row.Summary.WorstUrgency ?? -1).ThenBy(row => row.Summary.WorstSince ?? DateTime.MaxValue),
    }).ThenBy(row => row.Patient.Id);

    private static IOrderedQueryable<PatientWithSummary> Largest(
        IQueryable<PatientWithSummary> rows, System.Linq.Expressions.Expression<Func<PatientWithSummary, int>> by) => rows.OrderByDescending(by);

    private sealed class PatientWithSummary
    {
        public required PatientSummary Summary { get; init; }

        public required Patient Patient { get; init; }
    }
}
