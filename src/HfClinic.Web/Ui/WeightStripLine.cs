namespace HfClinic.Web.Ui;

/// <summary>A stretch of the filtered line.</summary>
/// <param name="Weighed">Whether each of its days has a weight; else the line is only carried on across a gap.</param>
public sealed record WeightStripLine(bool Weighed, IReadOnlyList<StripTrendPoint> Points)
{
    /// <summary>The line of the strip's days in stretches that join end to end; empty with fewer than two points.</summary>
    public static IReadOnlyList<WeightStripLine> Of(WeightStripData data)
    {
        var weighed = data.Readings.Where(reading => !reading.Held).Select(reading => reading.Day).ToHashSet();
        var points = data.Trend.Where(point => point.Day >= data.From && point.Day <= data.To).OrderBy(point => point.Day).ToList();
        List<WeightStripLine> stretches = [];
        for (var at = 1; at < points.Count; at++)
        {
            var whole = points[at].Day == points[at - 1].Day.AddDays(1) && weighed.Contains(points[at - 1].Day) && weighed.Contains(points[at].Day);
            if (stretches.Count > 0 && stretches[^1].Weighed == whole)
            {
                stretches[^1] = stretches[^1] with { Points = [.. stretches[^1].Points, points[at]] };
            }
            else
            {
                stretches.Add(new(whole, [points[at - 1], points[at]]));
            }
        }

        return stretches;
    }
}
