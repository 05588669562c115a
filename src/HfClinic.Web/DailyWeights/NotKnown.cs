using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using HfClinic.Records.Flags;

namespace HfClinic.Web.DailyWeights;

/// <summary>Something the rules could not tell of a person.</summary>
/// <param name="What">What it is about, as the summary names it: "Gain in 3 days".</param>
/// <param name="Why">What is missing: "no weight for 13 days".</param>
/// <param name="OnRow">Whether the list says it too: not what nearly every row would say.</param>
public sealed record NotKnown(string What, string Why, bool OnRow)
{
    private const string Trend = "Own trend";
    private static readonly string Symptoms = new SymptomsReported().Title;
    private static readonly string Fluid = new FluidGain().Title;

    /// <summary>What most people's record lacks on most days, or what is a matter of the next visit.</summary>
    private static readonly HashSet<string> PanelOnly = [Symptoms, new TargetWeightStale().Title, new WeightLossOverMonths().Title];
    private static readonly HashSet<string> TrendTitles = [.. RuleBook.All.OfType<TrendRule>().Select(rule => rule.Title)];

    /// <summary>As a line of what is not known.</summary>
    public string Words => What == Symptoms
        ? Why.Replace("no symptom report", "Not asked about symptoms", StringComparison.Ordinal)
        : $"{What}: {Why}";

    /// <summary>In short: the matter, or what several lack together.</summary>
    public string InShort => What.Contains(", ", StringComparison.Ordinal) || What.Contains(" and ", StringComparison.Ordinal)
        ? Why
        : $"{char.ToLowerInvariant(What[0])}{What[1..]} not known";

    /// <summary>What the summary says could not be told. A trend that still learns or is not carried on is not among it: it has its own words.</summary>
    public static IReadOnlyList<NotKnown> Of(PatientSummary summary) =>
        [.. summary.NotChecked.Split("; ", StringSplitOptions.RemoveEmptyEntries)
            .Select(entry => entry.Split(": ", 2))
            .Select(entry => (What: IsTrend(entry[0]) ? Trend : entry[0], Why: entry.ElementAtOrDefault(1) ?? ""))
            .Where(entry => !((summary.IsLearning || summary.IsSilent) && entry.What == Trend))
            .Select(entry => new NotKnown(entry.What, entry.Why, !PanelOnly.Contains(entry.What)))];

    /// <summary>Several rules of the trend that lack the same are one thing to the reader.</summary>
    private static bool IsTrend(string titles)
    {
        var named = titles.Split([", ", " and "], StringSplitOptions.None);
        return named.Contains(Fluid) && named.All(TrendTitles.Contains);
    }
}
