namespace HfClinic.Web.Ui;

/// <summary>Where a day and a weight fall on the strip, in SVG units.</summary>
/// <remarks>
/// The height always spans at least four kilograms, so that a calm series looks calm. A held reading does not stretch it:
/// it may be another person's weight, and is drawn at the edge.
/// </remarks>
public sealed class WeightStripScale
{
    /// <summary>Half the height of the shaded band around the target. Common practice, no source.</summary>
    public const int BandGrams = 1_000;

    private const double LeastSpanGrams = 4_000;
    private readonly double top;
    private readonly double lowGrams;
    private readonly double gramsSpan;
    private readonly double left;
    private readonly double width;
    private readonly DateOnly from;
    private readonly int lastDay;

    public WeightStripScale(WeightStripData data, double left, double top, double width, double height)
    {
        (from, lastDay) = (data.From, Math.Max(1, data.To.DayNumber - data.From.DayNumber));
        (this.left, this.top, this.width, Height) = (left, top, width, height);
        var seen = data.Readings.Where(r => !r.Held && r.Day >= data.From && r.Day <= data.To).Select(r => (double)r.Grams)
            .Concat(data.Trend.Where(p => p.Day >= data.From && p.Day <= data.To).Select(p => p.Grams))
            .Concat(StepsIn(data).SelectMany(s => new[] { s.Grams - (double)BandGrams, s.Grams + BandGrams }))
            .DefaultIfEmpty(70_000).ToList();
        var (low, high) = (seen.Min(), seen.Max());
        gramsSpan = Math.Max(LeastSpanGrams, high - low);
        lowGrams = (low + high - gramsSpan) / 2;
    }

    public double Height { get; }

    public double LowGrams => lowGrams;

    public double HighGrams => lowGrams + gramsSpan;

    public double X(DateOnly day) => left + ((double)(day.DayNumber - from.DayNumber) / lastDay * width);

    /// <summary>Held inside the strip at both ends.</summary>
    public double Y(double grams) => top + (Math.Clamp(1 - ((grams - lowGrams) / gramsSpan), 0, 1) * Height);

    /// <summary>The targets as steps inside the strip, each with its first and last day.</summary>
    public static IEnumerable<(DateOnly First, DateOnly Last, int Grams)> StepsIn(WeightStripData data)
    {
        var steps = data.Targets.OrderBy(t => t.From).ToList();
        for (var i = 0; i < steps.Count; i++)
        {
            var first = steps[i].From < data.From ? data.From : steps[i].From;
            var last = i + 1 < steps.Count && steps[i + 1].From < data.To ? steps[i + 1].From : data.To;
            if (first <= last && last >= data.From && steps[i].From <= data.To)
            {
                yield return (first, last, steps[i].Grams);
            }
        }
    }
}
