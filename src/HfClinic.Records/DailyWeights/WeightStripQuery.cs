using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Flags;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>Reads the weights of the rows on screen.</summary>
public sealed class WeightStripQuery(IDbContextFactory<ClinicDb> databases, ClinicClock clock)
{
    /// <summary>Strips of the given patients over the given days, both ends included. Every patient asked for has an entry.</summary>
    public async Task<IReadOnlyDictionary<long, StripContent>> ReadAsync(
        IReadOnlyCollection<long> patients, DateOnly from, DateOnly until, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var weights = await WeightsAsync(db, patients, from, until, cancellation);
        var targets = (await db.TargetWeights.AsNoTracking()
            .Where(target => patients.Contains(target.PatientId) && target.StruckOutAt == null && target.From <= until)
            .OrderBy(target => target.From).ThenBy(target => target.Id)
            .Select(target => new { target.PatientId, target.Id, target.From, target.Grams, target.ByName }).ToListAsync(cancellation))
            .ToLookup(row => row.PatientId, row => new TargetWeight(row.Id, row.From, new Weight(row.Grams), row.ByName));
        var diuretics = await DiureticSteps.ReadAsync(db, patients, from, until, cancellation);
        var lines = await db.PatientSummaries.AsNoTracking().Where(summary => patients.Contains(summary.PatientId))
            .Select(summary => new { summary.PatientId, summary.TrendLine })
            .ToDictionaryAsync(row => row.PatientId, row => row.TrendLine, cancellation);
        return patients.Distinct().ToDictionary(patient => patient, patient => new StripContent(
            DaySeries.ReadingsOf(weights[patient]),
            [.. weights[patient].Where(reading => reading.Held is not null)],
            TargetsWithin([.. targets[patient]], from),
            [.. TrendLine.Read(lines.GetValueOrDefault(patient, "")).Where(point => point.Day >= from && point.Day <= until)],
            [.. diuretics[patient]]));
    }

    private async Task<ILookup<long, WeightReading>> WeightsAsync(
        ClinicDb db, IReadOnlyCollection<long> patients, DateOnly from, DateOnly until, CancellationToken cancellation) =>
        (await db.Readings.AsNoTracking()
            .Where(reading => patients.Contains(reading.PatientId) && reading.Kind == ReadingKind.Weight
                && reading.Day >= from && reading.Day <= until
                && (reading.State == ReadingState.Accepted || reading.State == ReadingState.Held))
            .OrderBy(reading => reading.MeasuredAt).ThenBy(reading => reading.Id)
            .Select(reading => new { reading.Id, reading.PatientId, reading.MeasuredAt, reading.Value, reading.State, reading.HoldReason, reading.RecordedAt })
            .ToListAsync(cancellation)).ToLookup(
                row => row.PatientId,
                row => new WeightReading(row.Id, clock.ToLocal(row.MeasuredAt), new Weight(row.Value), row.State == ReadingState.Held
                    ? new HeldReading(row.HoldReason ?? HoldReason.Unexplained, clock.ToLocal(row.RecordedAt))
                    : null));

    private static List<TargetWeight> TargetsWithin(List<TargetWeight> targets, DateOnly from)
    {
        var first = targets.FindLastIndex(target => target.From <= from);
        return first < 0 ? targets : targets[first..];
    }
}
