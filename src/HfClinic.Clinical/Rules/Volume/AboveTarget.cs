using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The latest weight is above the target weight by more than 2 kg and by more than 2.5 % of the target, whichever is
/// more. Source: a default of this program, for the clinic to sign off.
/// </summary>
public sealed class AboveTarget : VolumeRule
{
    public override string Id => "volume.above-target";

    public override string Title => "Above target weight";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        var (mass, percent) = (protocol["weight.above-target-kg"], protocol["weight.above-target-percent"]);
        if (!HasWeights(picture) || !(mass.IsOn || percent.IsOn))
        {
            return [];
        }

        return picture.TargetWeight is not { } target ? [CannotTell("no target weight")]
            : WeightSummary.Of(picture).Latest is not { } latest ? [CannotTell("no accepted weight")]
            : [Compare(latest, target, TargetBound.Larger(mass, percent, target.Weight), picture, protocol)];
    }

    private Finding Compare(WeightReading latest, TargetWeight target, Threshold limit, PatientPicture picture, ClinicProtocol protocol)
    {
        var excess = latest.Weight - target.Weight;
        var bound = new Weight((int)limit.Value);
        var fires = limit.IsMetBy(excess.Grams);
        var on = latest.Day == picture.AsOf ? "" : $" on {Wording.ShortDay(latest.Day)}";
        var percent = protocol["weight.above-target-percent"];
        var share = limit.Key == percent.Key
            ? string.Create(CultureInfo.InvariantCulture, $" ({percent.Value:0.0#} % of target)")
            : "";
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.ThisWeek,
            Statement = fires ? $"Above target by {Wording.SizeBeside(excess, bound, protocol.WeightUnit)}{on}" : "",
            Limit = $"more than {Wording.Limit(bound, protocol.WeightUnit)}{share} above target",
            Magnitude = excess.Grams,
            Evidence =
            [
                new Evidence("Target weight", Wording.Weight(target.Weight, protocol.WeightUnit), target.From),
                LatestWeight(latest, picture, protocol, raisedIt: fires),
            ],
        };
    }
}
