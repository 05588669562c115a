using HfClinic.Clinical.Values;

namespace HfClinic.Web.Ui;

/// <summary>The strip as sentences, for those who hear the page and for the tooltip.</summary>
public static class WeightStripWords
{
    public static string Describe(WeightStripData data, WeightUnit unit)
    {
        var readings = data.Readings.Where(r => r.Day >= data.From && r.Day <= data.To).OrderBy(r => r.Day).ToList();
        var used = readings.Where(r => !r.Held).ToList();
        var held = readings.Where(r => r.Held).ToList();
        var days = data.To.DayNumber - data.From.DayNumber + 1;
        List<string> sentences =
        [
            $"Weights from {Wording.Day(data.From)} to {Wording.Day(data.To)}, {Wording.Count(days, "day", "days")}: {Span(used, unit)}",
        ];
        if (MissingDays(data).Count() is > 0 and var missing)
        {
            sentences.Add($"{Wording.Count(missing, "day", "days")} without a weight");
        }

        if (data.Targets.Where(t => t.From <= data.To).MaxBy(t => t.From) is { } target)
        {
            sentences.Add($"Target {Weight(target.Grams, unit)}");
        }

        if (used.Count(r => r.Raised) is > 0 and var raised)
        {
            sentences.Add($"{Wording.Count(raised, "weight", "weights")} raised a flag");
        }

        sentences.AddRange(held.Select(r => $"{Weight(r, unit)} is held to be checked"));
        sentences.AddRange(ChangesIn(data).Select(c => $"{Wording.Day(c.Day)}: {c.What}"));
        return string.Join(". ", sentences) + ".";
    }

    /// <summary>What the marks mean, of those that are drawn.</summary>
    public static string Legend(WeightStripData data, WeightUnit unit)
    {
        List<string> sentences = ["Dots: the weight of each day"];
        if (data.Readings.Any(r => r.Held && r.Day >= data.From && r.Day <= data.To))
        {
            sentences.Add("Hollow: held to be checked");
        }

        var line = WeightStripLine.Of(data);
        if (line.Count > 0)
        {
            var since = line[0].Points[0].Day > data.From ? $" since {Wording.ShortDay(line[0].Points[0].Day)}" : "";
            sentences.Add($"Line: weight with the scatter taken out{since}, in its 95 % band{(line.Any(stretch => !stretch.Weighed) ? "; dashed where no weight came" : "")}");
        }

        if (MissingDays(data).Any())
        {
            sentences.Add("Ticks below: no weight");
        }

        var targets = WeightStripScale.StepsIn(data).ToList();
        sentences.Add(targets.Count == 0
            ? "No target weight is set"
            : $"Shaded: target {Weight(targets[^1].Grams, unit)} ± {Weight(WeightStripScale.BandGrams, unit)}"
                + $", set {Wording.Day(data.Targets.Where(t => t.From <= data.To).Max(t => t.From))}");
        sentences.AddRange(ChangesIn(data).Select(change => $"▲ {Wording.ShortDay(change.Day)}: {change.What}"));
        return string.Join(". ", sentences) + ".";
    }

    /// <summary>Expected days with no weight of any kind, held ones included.</summary>
    public static IEnumerable<DateOnly> MissingDays(WeightStripData data)
    {
        var first = data.ExpectedFrom > data.From ? data.ExpectedFrom.Value : data.From;
        var last = data.ExpectedTo < data.To ? data.ExpectedTo.Value : data.To;
        var weighed = data.Readings.Select(r => r.Day).ToHashSet();
        for (var day = first; day <= last; day = day.AddDays(1))
        {
            if (!weighed.Contains(day))
            {
                yield return day;
            }
        }
    }

    public static IEnumerable<StripChange> ChangesIn(WeightStripData data) =>
        data.DiureticChanges.Where(c => c.Day >= data.From && c.Day <= data.To).OrderBy(c => c.Day);

    private static string Span(List<StripReading> used, WeightUnit unit) => used.Count switch
    {
        0 => "none",
        1 => $"one, {Weight(used[0], unit)}",
        _ => $"{Wording.Count(used.Count, "weight", "weights")}, first {Weight(used[0], unit)}, last {Weight(used[^1], unit)}, " +
             $"lowest {Weight(used.Min(r => r.Grams), unit)}, highest {Weight(used.Max(r => r.Grams), unit)}",
    };

    private static string Weight(StripReading reading, WeightUnit unit) => $"{Weight(reading.Grams, unit)} on {Wording.Day(reading.Day)}";

    private static string Weight(int grams, WeightUnit unit) => Wording.Weight(new Weight(grams), unit);
}
