using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Weights;

/// <summary>Reduces a patient's weights to one for each clinic day, so that days can be compared with days.</summary>
/// <remarks>
/// The first accepted reading of the local date from 03:00 up to, but not including, 12:00; without one, the first
/// accepted reading of that date. Morning weighing after the toilet and before breakfast is common practice (no source);
/// the hours are a choice of this program.
/// </remarks>
public static class DaySeries
{
    /// <summary>The morning begins; included.</summary>
    public static readonly TimeOnly MorningFrom = new(3, 0);

    /// <summary>The morning is over; not included.</summary>
    public static readonly TimeOnly MorningUntil = new(12, 0);

    /// <summary>
    /// The day series in order of day, days without an accepted reading left out. The order of the input does not matter;
    /// of two readings at the same time the one stored first (lower id) counts.
    /// </summary>
    public static ImmutableArray<DayWeight> From(IEnumerable<WeightReading> readings) =>
        [.. ReadingsOf(readings).Select(reading => new DayWeight(reading.Day, reading.Weight.Grams))];

    /// <summary>The day series as the very readings that stand for each day, so that evidence can point to them.</summary>
    public static ImmutableArray<WeightReading> ReadingsOf(IEnumerable<WeightReading> readings)
    {
        ArgumentNullException.ThrowIfNull(readings);
        var chosen = new SortedDictionary<DateOnly, WeightReading>();
        foreach (var reading in readings)
        {
            if (reading.Held is null && (!chosen.TryGetValue(reading.Day, out var other) || GoesBefore(reading, other)))
            {
                chosen[reading.Day] = reading;
            }
        }

        return [.. chosen.Values];
    }

    private static bool GoesBefore(WeightReading candidate, WeightReading other) =>
        Rank(candidate).CompareTo(Rank(other)) < 0;

    private static (bool OutsideMorning, DateTime Time, long Id) Rank(WeightReading reading)
    {
        var time = TimeOnly.FromDateTime(reading.LocalTime);
        return (time < MorningFrom || time >= MorningUntil, reading.LocalTime, reading.Id);
    }
}
