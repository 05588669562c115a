namespace HfClinic.Clinical.Weights;

/// <summary>The median of a few numbers by selection (Hoare, Comm ACM 1961;4:321), which takes less time than sorting them.</summary>
internal static class SampleMedian
{
    /// <summary>The median; of an even count the mean of the two in the middle. Reorders the values.</summary>
    /// <param name="values">At least one value, none NaN.</param>
    public static double Of(Span<double> values)
    {
        int middle = values.Length / 2;
        double upper = Select(values, middle);
        if (values.Length % 2 == 1)
        {
            return upper;
        }

        double lower = double.NegativeInfinity;
        foreach (double value in values[..middle])
        {
            lower = Math.Max(lower, value);
        }

        return (lower + upper) / 2;
    }

    /// <summary>The value that would stand at <paramref name="rank"/> if sorted; smaller ones end up before it.</summary>
    private static double Select(Span<double> values, int rank)
    {
        int first = 0;
        int last = values.Length - 1;
        while (true)
        {
            double pivot = values[rank];
            values[rank] = values[last];
            int place = first;
            for (int at = first; at < last; at++)
            {
                double value = values[at];
                values[at] = values[place];
                values[place] = value;
                place += value < pivot ? 1 : 0;
            }

            values[last] = values[place];
            values[place] = pivot;
            if (place == rank)
            {
                return pivot;
            }

            (first, last) = place < rank ? (place + 1, last) : (first, place - 1);
        }
    }
}
