using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>Reads the weights of the rows on screen.</summary>
public sealed class WeightStripQuery(IDbContextFactory<ClinicDb> databases, ClinicClock clock)
{
    /// <summary>Days of weights read before the strip begins, so that the filtered line has settled where it is first seen.</summary>
    private const int RunInDays = 28;

    /// <summary>Strips of the given patients over the given days, both ends included. Every patient asked for has an entry.</summary>
    public async Task<IReadOnlyDictionary<long, StripContent>> ReadAsync(
        IReadOnlyCollection<long> patients, DateOnly from, DateOnly until, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var weights = await WeightsAsync(db, patients, from.AddDays(-RunInDays), until, cancellation);
        var targets = (await db.TargetWeights.AsNoTracking()
            .Where(target => patients.Contains(target.PatientId) && target.StruckOutAt == null && target.From <= until)
            .OrderBy(target => target.From).ThenBy(target => target.Id)
            .Select(target => new { target.PatientId, target.Id, target.From, target.Grams, target.ByName }).ToListAsync(cancellation))
            .ToLookup(row => row.PatientId, row => new TargetWeight(row.Id, row.From, new Weight(row.Grams), row.ByName));
        var diuretics = await DiureticSteps.ReadAsync(db, patients, from, until, cancellation);
        return patients.Distinct().ToDictionary(patient => patient, patient =>
        {
            var days = DaySeries.ReadingsOf(weights[patient]);
            return new StripContent(
                [.. days.Where(reading => reading.Day >= from)],
                [.. weights[patient].Where(reading => reading.Held is not null && reading.Day >= from)],
                TargetsWithin([.. targets[patient]], from),
                TrendOf([.. days.Select(reading => new DayWeight(reading.Day, reading.Weight.Grams))], [.. targets[patient]], from, until),
                [.. diuretics[patient]]);
        });
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

    /// <summary>The line is not drawn past the last weight: a person who is silent has no trend.</summary>
    private static List<TrendStep> TrendOf(
        ImmutableArray<DayWeight> series, ImmutableArray<TargetWeight> targets, DateOnly from, DateOnly until)
    {
        if (series.IsEmpty)
        {
            return [];
        }

        var history = WeightTrend.Of(series, targets, [], series[^1].Day < until ? series[^1].Day : until);
        return [.. history.Days.Select((day, index) => new TrendStep(history.FirstDay.AddDays(index), day.State.Expected * 1000)).Where(step => step.Day >= from)];
    }

    private static List<TargetWeight> TargetsWithin(List<TargetWeight> targets, DateOnly from)
    {
        var first = targets.FindLastIndex(target => target.From <= from);
        return first < 0 ? targets : targets[first..];
    }
}
