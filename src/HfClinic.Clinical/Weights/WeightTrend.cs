using System.Collections.Immutable;
using System.Runtime.InteropServices;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// The individual weight trend of one patient: tells body mass, fluid and scatter apart, with standard errors.
/// A corrected, late or deleted reading is taken in by computing again; the result does not depend on the order of arrival.
/// </summary>
public static class WeightTrend
{
    /// <summary>Computes the trend from the first accepted weight to the end of a day.</summary>
    /// <param name="series">The day series in order of day.</param>
    /// <param name="targets">Target weights in order of day.</param>
    /// <param name="resets">New baselines in any order; the last given for a day counts.</param>
    /// <param name="through">The last day; later weights are not looked at.</param>
    public static TrendHistory Of(
        ImmutableArray<DayWeight> series,
        ImmutableArray<TargetWeight> targets,
        ImmutableArray<BaselineReset> resets,
        DateOnly through)
    {
        if (series.IsEmpty || series[0].Day > through)
        {
            return new TrendHistory(through, []);
        }

        var first = series[0].Day;
        var model = TrendModel.For(Reference(series.AsSpan(), TargetOn(targets, first)));
        var state = TrendState.Start(model);
        var days = new TrendDay[through.DayNumber - first.DayNumber + 1];
        int next = 0;
        for (var day = first; day <= through; day = day.AddDays(1))
        {
            foreach (var reset in resets)
            {
                if (reset.Day == day)
                {
                    state.Rebase(model, reset.Weight);
                }
            }

            int? grams = next < series.Length && series[next].Day == day ? series[next++].Grams : null;
            days[day.DayNumber - first.DayNumber] = state.Advance(model, grams, TargetOn(targets, day)?.Grams / 1000.0);
        }

        return new TrendHistory(first, ImmutableCollectionsMarshal.AsImmutableArray(days)) { Model = model };
    }

    /// <summary>The weight a trend starts at: the target weight, or else the median of the first three weights.</summary>
    /// <param name="series">At least one weight.</param>
    internal static Weight Reference(ReadOnlySpan<DayWeight> series, Weight? target)
    {
        if (target is Weight set)
        {
            return set;
        }

        Span<int> firstThree = stackalloc int[Math.Min(3, series.Length)];
        for (int i = 0; i < firstThree.Length; i++)
        {
            firstThree[i] = series[i].Grams;
        }

        firstThree.Sort();
        return new Weight((firstThree[(firstThree.Length - 1) / 2] + firstThree[firstThree.Length / 2]) / 2);
    }

    private static Weight? TargetOn(ImmutableArray<TargetWeight> targets, DateOnly day)
    {
        Weight? holding = null;
        foreach (var target in targets)
        {
            if (target.From > day)
            {
                break;
            }

            holding = target.Weight;
        }

        return holding;
    }
}
