using System.Runtime.CompilerServices;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// c: how wide this person's readings scatter compared with the model, from the scores of the last two months.
/// The latest week is left out, so that a gain under way does not hide itself.
/// </summary>
/// <remarks>
/// Median of |z| over 0.6745, which is 1 for normal scores; over days t−60 to t−8, at least 14 readings, kept within 0.6 to 2,
/// renewed every seventh day; 1 before that. Choices of this program, to be signed off by the clinic.
/// </remarks>
public struct PersonalScale
{
    private const int Oldest = 60;
    private const int Newest = 8;
    private const int FewestReadings = 14;
    private Scores recent;
    private int days;
    private int slot;
    private double learnt;

    /// <summary>The scale to divide scores by, 0.6 to 2.</summary>
    public readonly double Value => learnt == 0 ? 1 : learnt;

    /// <summary>Ends a day.</summary>
    /// <param name="score">The day's standardised innovation, or NaN without an ordinary reading.</param>
    public void EndDay(double score)
    {
        recent[slot] = Math.Abs(score);
        if (days % 7 == 0 && days >= Newest + FewestReadings - 1)
        {
            Renew();
        }

        days++;
        slot = slot == Oldest ? 0 : slot + 1;
    }

    private void Renew()
    {
        ReadOnlySpan<double> scores = recent;
        Span<double> window = stackalloc double[Oldest - Newest + 1];
        int count = 0;
        for (int back = Newest; back <= Math.Min(Oldest, days); back++)
        {
            int at = slot - back;
            double score = scores[at < 0 ? at + Oldest + 1 : at];
            window[count] = score;
            count += double.IsNaN(score) ? 0 : 1;
        }

        if (count >= FewestReadings)
        {
            learnt = Math.Clamp(SampleMedian.Of(window[..count]) / 0.6745, 0.6, 2.0);
        }
    }

    [InlineArray(Oldest + 1)]
    private struct Scores
    {
        private double first;
    }
}
