using System.Text.Json;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Weights;

namespace HfClinic.Records.Flags;

/// <summary>The weight of a day with the scatter taken out, and the band it lies in with 95 % certainty, in grams.</summary>
public sealed record TrendPoint(DateOnly Day, int Grams, int LowGrams, int HighGrams);

/// <summary>
/// The last days of the weight trend as stored with the summary, so that a list draws the line it was assessed by and runs
/// no filter. It ends with the last accepted weight: a person who is silent has no trend.
/// </summary>
public static class TrendLine
{
    /// <summary>How many days are kept.</summary>
    public const int Days = 28;

    /// <summary>The line of the days up to the picture's; empty without any weight among them.</summary>
    public static string Write(PatientPicture picture)
    {
        if (WeightSummary.Of(picture).Latest is not { } latest)
        {
            return "";
        }

        var history = picture.Trend;
        var from = Later(history.FirstDay, picture.AsOf.AddDays(1 - Days));
        var days = Enumerable.Range(0, Math.Max(0, latest.Day.DayNumber - from.DayNumber + 1)).Select(day => history.On(from.AddDays(day))!.Value).ToList();
        return days.Count == 0 ? "" : JsonSerializer.Serialize(new Stored(
            from,
            [.. days.Select(day => Grams(day.State.Expected))],
            [.. days.Select(day => Grams(day.Band))]));
    }

    /// <summary>The points in order of day.</summary>
    public static IReadOnlyList<TrendPoint> Read(string line)
    {
        if (line.Length == 0 || JsonSerializer.Deserialize<Stored>(line) is not { } stored)
        {
            return [];
        }

        return [.. stored.Grams.Zip(stored.Band, (grams, band) => (Grams: grams, Band: band)).Select((point, day) =>
            new TrendPoint(stored.From.AddDays(day), point.Grams, point.Grams - point.Band, point.Grams + point.Band))];
    }

    private static DateOnly Later(DateOnly one, DateOnly other) => one > other ? one : other;

    private static int Grams(double kilograms) => (int)Math.Round(kilograms * 1000);

    /// <param name="From">The day of the first entry; one entry for each day from it on.</param>
    /// <param name="Grams">The line.</param>
    /// <param name="Band">Half the width of the band.</param>
    private sealed record Stored(DateOnly From, int[] Grams, int[] Band);
}
