using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>A target weight from a day on, for drawing.</summary>
public sealed record TargetStep(DateOnly From, int Grams);

/// <summary>A change of loop diuretic: what it became, in words.</summary>
public sealed record DiureticStep(DateOnly Day, string Words);

/// <summary>What a weight strip draws of one patient.</summary>
/// <param name="Days">The weight that stands for each day that has one.</param>
/// <param name="Held">Readings set aside.</param>
/// <param name="Trend">The filtered line as stored by the last assessment; it reaches back <see cref="TrendLine.Days"/> days.</param>
public sealed record WeightStripData(
    IReadOnlyList<WeightReading> Days,
    IReadOnlyList<WeightReading> Held,
    IReadOnlyList<TargetStep> Targets,
    IReadOnlyList<DiureticStep> Diuretics,
    IReadOnlyList<TrendPoint> Trend)
{
    public static readonly WeightStripData Nothing = new([], [], [], [], []);
}

/// <summary>Reads the weights of the rows on screen.</summary>
public sealed class WeightStripQuery(IDbContextFactory<ClinicDb> databases, ClinicClock clock)
{
    /// <summary>Strips of the given patients over the given days, both ends included. Every patient asked for has an entry.</summary>
    public async Task<IReadOnlyDictionary<long, WeightStripData>> ReadAsync(
        IReadOnlyCollection<long> patients, DateOnly from, DateOnly until, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var weights = (await db.Readings.AsNoTracking()
            .Where(reading => patients.Contains(reading.PatientId) && reading.Kind == ReadingKind.Weight
                && reading.Day >= from && reading.Day <= until
                && (reading.State == ReadingState.Accepted || reading.State == ReadingState.Held))
            .Select(reading => new { reading.Id, reading.PatientId, reading.MeasuredAt, reading.Value, reading.State, reading.HoldReason, reading.RecordedAt })
            .ToListAsync(cancellation)).ToLookup(
                row => row.PatientId,
                row => new WeightReading(row.Id, clock.ToLocal(row.MeasuredAt), new Weight(row.Value), row.State == ReadingState.Held
                    ? new HeldReading(row.HoldReason ?? HoldReason.Unexplained, clock.ToLocal(row.RecordedAt))
                    : null));
        var targets = (await db.TargetWeights.AsNoTracking()
            .Where(target => patients.Contains(target.PatientId) && target.StruckOutAt == null && target.From <= until)
            .OrderBy(target => target.From).ThenBy(target => target.Id)
            .Select(target => new { target.PatientId, target.From, target.Grams }).ToListAsync(cancellation))
            .ToLookup(row => row.PatientId, row => new TargetStep(row.From, row.Grams));
        var diuretics = (await db.DoseCourses.AsNoTracking()
            .Where(course => patients.Contains(course.PatientId) && course.StruckOutAt == null && LoopDiuretics.Names.Contains(course.Medicine)
                && course.From >= from && course.From <= until)
            .OrderBy(course => course.From)
            .Select(course => new { course.PatientId, course.From, course.Medicine, course.DoseMilligrams, course.TimesDaily }).ToListAsync(cancellation))
            .ToLookup(row => row.PatientId, row => new DiureticStep(row.From, DoseWords.Of(row.Medicine, row.DoseMilligrams, row.TimesDaily)));
        var lines = await db.PatientSummaries.AsNoTracking().Where(summary => patients.Contains(summary.PatientId))
            .Select(summary => new { summary.PatientId, summary.TrendLine })
            .ToDictionaryAsync(row => row.PatientId, row => row.TrendLine, cancellation);
        return patients.ToDictionary(patient => patient, patient => new WeightStripData(
            DaySeries.ReadingsOf(weights[patient]),
            [.. weights[patient].Where(reading => reading.Held is not null)],
            TargetsWithin([.. targets[patient]], from),
            [.. diuretics[patient]],
            [.. TrendLine.Read(lines.GetValueOrDefault(patient, "")).Where(point => point.Day >= from && point.Day <= until)]));
    }

    /// <summary>The target that held when the strip begins, and the later ones.</summary>
    private static List<TargetStep> TargetsWithin(List<TargetStep> targets, DateOnly from)
    {
        var first = targets.FindLastIndex(target => target.From <= from);
        return first < 0 ? targets : targets[first..];
    }
}
