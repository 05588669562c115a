using HfClinic.Records.DailyWeights;
using HfClinic.Web.Ui;

namespace HfClinic.Web.DailyWeights;

/// <summary>Turns what is on record into what a strip draws.</summary>
public static class StripDrawing
{
    /// <param name="raised">The readings that raised an open flag.</param>
    /// <param name="enrolledOn">No weight was expected before.</param>
    /// <param name="from">The first day drawn.</param>
    /// <param name="today">The last day drawn; still running, so that no weight is missing yet.</param>
    public static WeightStripData Of(StripContent strip, IReadOnlySet<long> raised, DateOnly enrolledOn, DateOnly from, DateOnly today) => new()
    {
        From = from,
        To = today,
        ExpectedFrom = enrolledOn,
        ExpectedTo = today.AddDays(-1),
        Readings =
        [
            .. strip.Days.Select(day => new StripReading(day.Day, day.Weight.Grams, raised.Contains(day.Id))),
            .. strip.Held.Select(held => new StripReading(held.Day, held.Weight.Grams, Held: true)),
        ],
        Targets = [.. strip.Targets.Select(target => new StripTarget(target.From, target.Weight.Grams))],
        Trend = [.. strip.Trend.Select(step => new StripTrendPoint(step.Day, step.Grams, step.LowGrams, step.HighGrams))],
        DiureticChanges = [.. strip.Diuretics.Select(step => new StripChange(step.Day, step.Words))],
    };
}
