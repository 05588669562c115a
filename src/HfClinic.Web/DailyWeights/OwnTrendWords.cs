using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;

namespace HfClinic.Web.DailyWeights;

/// <summary>One line on a person's own trend.</summary>
public sealed record OwnTrendLine(string What, string Words);

/// <summary>
/// A person's own weight trend in plain words: amounts with half their 95 % interval as "give or take", never a score, and
/// no word on whether it is well.
/// </summary>
/// <param name="summary">Where the trend is stored.</param>
/// <param name="strip">The weights of the last fortnight at least.</param>
/// <param name="today">The clinic day.</param>
public sealed class OwnTrendWords(PatientSummary summary, StripContent strip, DateOnly today, WeightUnit unit)
{
    private const double Wide = 1.96;

    /// <summary>"3 of 7 weights in 14 days"; null once the trend has learnt this person's scatter, or without any weight.</summary>
    public string? Learning
    {
        get
        {
            if (!summary.IsLearning)
            {
                return null;
            }

            var weighed = strip.Days.Count(day => day.Day > today.AddDays(-TrendState.LearningDays) && day.Day <= today);
            return $"{weighed} of {Wording.Count(TrendState.LearningReadings, "weight", "weights")} in {Wording.Days(TrendState.LearningDays)}";
        }
    }

    /// <summary>The trend line by line; a single one while there is nothing to show.</summary>
    public IReadOnlyList<OwnTrendLine> Lines =>
        Learning is { } learning ? [new("Own trend", $"still learning this person’s own scatter: {learning}. Until then only the plain limits are read.")]
        : summary.LastWeightDay is not { } last ? [new("Own trend", "no weight on record")]
        : summary.IsSilent || summary.TrendDay is null ? [new("Own trend", $"not carried on: no weight since {Wording.Day(last)}")]
        : [.. Known(summary.TrendDay.Value)];

    private IEnumerable<OwnTrendLine> Known(DateOnly day)
    {
        var until = day == today ? "" : $", up to {Wording.ShortDay(day)}";
        if (summary is { FluidGrams: { } fluid, FluidBandGrams: { } fluidBand })
        {
            yield return new("Own trend", $"{Size(fluid)} of fluid {(fluid < 0 ? "below" : "above")} own baseline, give or take {Size(fluidBand)}{until}");
        }

        if (summary is { ExcessGrams: { } excess, ExcessErrorGrams: { } error })
        {
            yield return new("Against target", $"{Size(excess)} {(excess < 0 ? "below" : "above")} with the scatter taken out, give or take {Size((int)Math.Round(Wide * error))}");
        }

        if (summary is { SlopeGramsPerWeek: { } slope, SlopeBandGramsPerWeek: { } slopeBand })
        {
            yield return new("Change per week", $"{Wording.Change(new Weight(slope), unit)} {Wording.Symbol(unit)}, give or take {Size(slopeBand)}");
        }

        if (summary.ScatterGrams is { } scatter)
        {
            yield return new("Day-to-day scatter", Size(scatter));
        }
    }

    private string Size(int grams) => Wording.Weight(new Weight(Math.Abs(grams)), unit);
}
