namespace HfClinic.Clinical.Weights;

/// <summary>Runs the trend over days in a row without allocating.</summary>
public static class TrendReplay
{
    /// <summary>
    /// Carries <paramref name="state"/> over the days. Starting from a copy taken the day before a corrected reading gives
    /// the same as starting from the first day.
    /// </summary>
    /// <param name="grams">One entry for each day in a row: the day's accepted weight in grams, or null.</param>
    /// <param name="target">The target weight in kg over these days, or null.</param>
    /// <param name="output">Receives one entry for each day.</param>
    /// <exception cref="ArgumentException"><paramref name="output"/> is shorter than <paramref name="grams"/>.</exception>
    public static void Run(TrendModel model, ref TrendState state, ReadOnlySpan<int?> grams, double? target, Span<TrendDay> output)
    {
        if (output.Length < grams.Length)
        {
            throw new ArgumentException($"The output holds {output.Length} days, the series {grams.Length}.", nameof(output));
        }

        for (int day = 0; day < grams.Length; day++)
        {
            output[day] = state.Advance(model, grams[day], target);
        }
    }
}
