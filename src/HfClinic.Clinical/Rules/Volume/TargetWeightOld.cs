using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The target weight was set more than 90 days ago; more than 30 days ago while the last discharge from hospital lies no
/// further back than the longer limit. Source: a default of this program, for the clinic to sign off.
/// </summary>
public sealed class TargetWeightOld : VolumeRule
{
    public override string Id => "volume.target-old";

    public override string Title => "Target weight set long ago";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override bool Latches => false;

    public override decimal? MaterialStep => null;

    public override int JoinDays => 30;

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        var usual = protocol["target.age-days"];
        if (!HasWeights(picture) || !usual.IsOn)
        {
            return [];
        }

        return picture.TargetWeight is { } target
            ? [Compare(target, usual, picture, protocol)]
            : [CannotTell("no target weight")];
    }

    private Finding Compare(TargetWeight target, Threshold usual, PatientPicture picture, ClinicProtocol protocol)
    {
        var soon = protocol["target.age-after-discharge-days"];
        var discharged = picture.DischargedFromHospitalOn is { } day && day <= picture.AsOf && !usual.IsMetBy(DaysSince(day, picture))
            ? day
            : (DateOnly?)null;
        var limit = discharged is not null && soon.IsOn ? soon : usual;
        var age = DaysSince(target.From, picture);
        var fires = limit.IsMetBy(age);
        var weight = new Evidence("Target weight", Wording.Weight(target.Weight, protocol.WeightUnit), target.From, RaisedIt: fires);
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.NextVisit,
            Statement = fires ? $"Target weight set {Wording.Days(age)} ago" : "",
            Limit = $"more than {Wording.Days((int)limit.Value)} ago" + (limit == soon ? ", after a discharge" : ""),
            Evidence = limit == soon
                ? [weight, new Evidence("Discharged from hospital", Wording.Day(discharged!.Value), discharged)]
                : [weight],
        };
    }

    private static int DaysSince(DateOnly day, PatientPicture picture) => picture.AsOf.DayNumber - day.DayNumber;
}
