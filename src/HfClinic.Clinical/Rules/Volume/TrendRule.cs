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

        return WhyNot(picture, protocol) is { } missing ? [CannotTell(missing)] : [Look(LookAt(picture), protocol)];
    }

    /// <summary>Whether the trend can be used, and what it shows; null when it cannot.</summary>
    public static TrendLook? Of(PatientPicture picture, ClinicProtocol protocol) =>
        WhyNot(picture, protocol) is null ? LookAt(picture) : null;

    /// <summary>Whether the clinic uses the rule's thresholds.</summary>
    protected abstract bool IsOn(ClinicProtocol protocol);

    protected abstract Finding Look(TrendLook look, ClinicProtocol protocol);

    private static TrendLook LookAt(PatientPicture picture)
    {
        var latest = WeightSummary.Of(picture).Latest!;
        return new TrendLook(picture, latest, picture.Trend.On(latest.Day)!.Value);
    }

    private static string? WhyNot(PatientPicture picture, ClinicProtocol protocol)
    {
        var summary = WeightSummary.Of(picture);
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
