namespace HfClinic.Clinical.Calculations.RiskScores;

/// <summary>Points by bands of a value.</summary>
internal static class Band
{
    /// <summary>The points of the band in which the value lies.</summary>
    /// <param name="value">The value.</param>
    /// <param name="lowerEdges">Where each band after the first begins; the edge itself belongs to the upper band.</param>
    /// <param name="points">One more than there are edges.</param>
    public static int Points(double value, ReadOnlySpan<double> lowerEdges, ReadOnlySpan<int> points)
    {
        int band = 0;
        while (band < lowerEdges.Length && value >= lowerEdges[band])
        {
            band++;
        }

        return points[band];
    }
}
