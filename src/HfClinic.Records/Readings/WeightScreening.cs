using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Patients;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Readings;

/// <summary>Asks the reading screen about a weight, with what is on record of the patient and the household.</summary>
public static class WeightScreening
{
    private const int HistoryDays = 200;

    /// <summary>Why the weight is set aside, or null when it is accepted.</summary>
    public static async Task<HoldReason?> CheckAsync(
        WorkScope scope, Patient patient, Weight weight, DateOnly day, CancellationToken cancellation)
    {
        var db = scope.Db;
        var from = day.AddDays(-HistoryDays);
        var known = await db.Readings.AsNoTracking()
            .Where(reading => reading.PatientId == patient.Id && reading.Kind == ReadingKind.Weight && reading.Day >= from && reading.Day <= day
                && (reading.State == ReadingState.Accepted || reading.State == ReadingState.Held))
            .OrderBy(reading => reading.MeasuredAt).ThenBy(reading => reading.Id)
            .Select(reading => new { reading.Id, reading.Day, reading.MeasuredAt, reading.Value, IsHeld = reading.State == ReadingState.Held })
            .ToListAsync(cancellation);
        var target = await db.TargetWeights.AsNoTracking()
            .Where(set => set.PatientId == patient.Id && set.StruckOutAt == null && set.From <= day)
            .OrderByDescending(set => set.From).ThenByDescending(set => set.Id)
            .Select(set => (int?)set.Grams).FirstOrDefaultAsync(cancellation);
        var household = await HouseholdWeights.OfAsync(db, [patient.Id], cancellation);
        var accepted = DaySeries.From(known.Where(reading => !reading.IsHeld).Select(reading => new WeightReading(
            reading.Id, scope.Clock.ToLocal(reading.MeasuredAt), new Weight(reading.Value))));
        var screened = ReadingScreen.Check(
            weight, day, accepted.AsSpan(), target is { } grams ? new Weight(grams) : null, [.. household[patient.Id]],
            known is [.., { IsHeld: true } last] ? new DayWeight(last.Day, last.Value) : null);
        return screened.Verdict == ScreenVerdict.Held ? screened.Reason ?? HoldReason.Unexplained : null;
    }
}
