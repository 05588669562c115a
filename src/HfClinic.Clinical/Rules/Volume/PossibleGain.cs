using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>What the plain gain rules would say of a held reading, were it right.</summary>
/// <param name="Held">The held reading.</param>
/// <param name="Rule">The rule whose limit would be met furthest.</param>
/// <param name="Change">The change it would be.</param>
internal sealed record PossibleGain(WeightReading Held, WeightChangeRule Rule, WeightChange Change)
{
    private static readonly ImmutableArray<WeightChangeRule> GainRules =
        [new GainInThreeDays(), new GainInSevenDays(), new GainInOneDayThreePounds(), new GainInOneDayTwoPounds()];

    public int Grams => Change.Difference.Grams;

    /// <summary>The largest gain that meets a limit in use, if the held reading weighs so much; null when none does.</summary>
    public static PossibleGain? Of(WeightReading held, Weight weight, WeightSummary summary, ClinicProtocol protocol) => GainRules
        .Select(rule => summary.GainUpTo(held with { Weight = weight }, rule.Days) is { } change
            && protocol[rule.ThresholdKey].IsMetBy(change.Difference.Grams) ? new PossibleGain(held, rule, change) : null)
        .MaxBy(gain => gain?.Grams);
}
