using System.Collections.Immutable;

namespace HfClinic.Clinical.Weights;

/// <summary>The trend of one patient, day by day.</summary>
/// <param name="FirstDay">The day of the first accepted weight.</param>
/// <param name="Days">One entry for each clinic day from <paramref name="FirstDay"/> on; empty without any weight.</param>
public sealed record TrendHistory(DateOnly FirstDay, ImmutableArray<TrendDay> Days)
{
    /// <summary>The trend at the end of the given day, or null outside the history.</summary>
    public TrendDay? On(DateOnly day)
    {
        int index = day.DayNumber - FirstDay.DayNumber;
        return index >= 0 && index < Days.Length ? Days[index] : null;
    }
}
