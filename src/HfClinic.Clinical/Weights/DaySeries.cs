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

    /// <summary>Whether, of two readings of one day, the one at <paramref name="time"/> is the day's weight.</summary>
    internal static bool GoesBefore(TimeOnly time, TimeOnly other) => Rank(time).CompareTo(Rank(other)) < 0;

    private static bool GoesBefore(WeightReading candidate, WeightReading other)
    {
        int order = Rank(TimeOnly.FromDateTime(candidate.LocalTime)).CompareTo(Rank(TimeOnly.FromDateTime(other.LocalTime)));
        return order < 0 || (order == 0 && candidate.Id < other.Id);
    }

    private static (bool OutsideMorning, TimeOnly Time) Rank(TimeOnly time) => (time < MorningFrom || time >= MorningUntil, time);
}
