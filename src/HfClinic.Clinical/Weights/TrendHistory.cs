using System.Collections.Immutable;

namespace HfClinic.Clinical.Weights;

/// <summary>The trend of one patient, day by day.</summary>
/// <param name="FirstDay">The day of the first accepted weight.</param>
/// <param name="Days">One entry for each clinic day from <paramref name="FirstDay"/> on; empty without any weight.</param>
public sealed record TrendHistory(DateOnly FirstDay, ImmutableArray<TrendDay> Days)
{
    /// <summary>The model it was computed by; null without any weight.</summary>
    public TrendModel? Model { get; init; }

    /// <summary>How far single weighings of this person scatter about the trend on the given day, one standard deviation in kg.</summary>
    public double? ScatterOn(DateOnly day) => Model is null ? null : On(day)?.Scale * Math.Sqrt(Model.ReadingVariance);

    /// <summary>The usual coming and going of this person's fluid on the given day, one standard deviation in kg.</summary>
    public double? UsualFluidOn(DateOnly day) =>
        Model is not null && On(day) is { } trend ? trend.Scale * Model.UsualFluid(trend.State.FluidVariance) : null;

    /// <summary>The trend at the end of the given day, or null outside the history.</summary>
    public TrendDay? On(DateOnly day)
    {
        int index = day.DayNumber - FirstDay.DayNumber;
        return index >= 0 && index < Days.Length ? Days[index] : null;
    }

    /// <summary>How many of the days up to and with the given one had an accepted weight.</summary>
    public int ReadingsUpTo(DateOnly day, int days) =>
        Enumerable.Range(0, days).Count(back => On(day.AddDays(-back)) is { Use: not DayUse.None });
}
