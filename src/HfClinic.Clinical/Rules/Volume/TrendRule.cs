using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// A limit on the individual trend, read for the latest day that has an accepted weight. Stands beside the plain limits on
/// weights and never mutes them. While the trend still learns a person's scatter, only the plain limits speak.
/// </summary>
public abstract class TrendRule : VolumeRule
{
    public sealed override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        if (!HasWeights(picture) || !IsOn(protocol))
        {
            return [];
        }

        var summary = WeightSummary.Of(picture);
        return WhyNot(summary, picture, protocol) is { } missing ? [CannotTell(missing)] : [Look(LookAt(summary, picture), protocol)];
    }

    /// <summary>What the trend shows; null when it cannot be used.</summary>
    protected static TrendLook? Of(PatientPicture picture, ClinicProtocol protocol) =>
        WeightSummary.Of(picture) is var summary && WhyNot(summary, picture, protocol) is null ? LookAt(summary, picture) : null;

    /// <summary>Whether the clinic uses the rule's thresholds.</summary>
    protected abstract bool IsOn(ClinicProtocol protocol);

    protected abstract Finding Look(TrendLook look, ClinicProtocol protocol);

    private static TrendLook LookAt(WeightSummary summary, PatientPicture picture) =>
        new(picture, summary.Latest!, picture.Trend.On(summary.Latest!.Day)!.Value);

    private static string? WhyNot(WeightSummary summary, PatientPicture picture, ClinicProtocol protocol)
    {
        if (summary.Latest is not { } latest)
        {
            return "no accepted weight";
        }

        if (picture.Trend.On(latest.Day)!.Value.Learning)
        {
            return $"still learning this person's own scatter: {picture.Trend.ReadingsUpTo(picture.AsOf, TrendState.LearningDays)} of "
                + $"{Wording.Count(TrendState.LearningReadings, "weight", "weights")} in {Wording.Days(TrendState.LearningDays)}";
        }

        var limit = protocol["trend.last-weight-days"];
        return limit.IsOn && !limit.IsMetBy(summary.SilentDays!.Value) ? $"no weight for {Wording.Days(summary.SilentDays.Value)}" : null;
    }
}
