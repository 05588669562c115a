using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// No weight from a person who weighs at home for 5 days; for 3 days with another flag open, within 30 days of a discharge,
/// or within 14 days of a change of diuretic. A held reading counts as weighing. Source: a default of this program.
/// </summary>
public sealed class NoWeight : VolumeRule
{
    /// <summary>Known to the lists, which count the silent.</summary>
    public const string RuleId = "volume.no-weight";

    public override string Id => RuleId;

    public override string Title => "No weight from home";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override bool Latches => false;

    /// <summary>Another week of silence, in days: a default of this program.</summary>
    public override decimal? MaterialStep => 7;

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        var usual = protocol["silence.days"];
        if (!picture.WeighsAtHome || !usual.IsOn)
        {
            return [];
        }

        var reasons = CloseWatch(picture, protocol);
        var close = protocol["silence.days-close-watch"];
        var watched = !reasons.IsEmpty && close.IsOn;
        return [Compare(picture, protocol, watched ? close : usual, watched ? reasons : [])];
    }

    private Finding Compare(PatientPicture picture, ClinicProtocol protocol, Threshold limit, ImmutableArray<string> reasons)
    {
        var last = picture.Weights.LastOrDefault();
        var since = last?.Day ?? picture.EnrolledOn;
        var days = picture.AsOf.DayNumber - since.DayNumber;
        var fires = limit.IsMetBy(days);
        var evidence = last is null
            ? new Evidence("Enrolled, no weight since", Wording.Day(since), since, RaisedIt: fires)
            : new Evidence("Last weight", Wording.Weight(last.Weight, protocol.WeightUnit), last.Day, last.Id, fires);
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.ThisWeek,
            Statement = fires ? string.Join("; ", [$"No weight for {Wording.Days(days)}", .. reasons]) : "",
            Limit = $"{Wording.Days((int)limit.Value)} or more without a weight" + (reasons.IsEmpty ? "" : ", under close watch"),
            Magnitude = days,
            Evidence = [evidence],
        };
    }

    private ImmutableArray<string> CloseWatch(PatientPicture picture, ClinicProtocol protocol)
    {
        var reasons = ImmutableArray.CreateBuilder<string>();
        if (!picture.OpenFlagRules.Remove(Id).IsEmpty)
        {
            reasons.Add("open flag");
        }

        if (Recent(picture.DischargedFromHospitalOn, "silence.after-discharge-days") is { } discharged)
        {
            reasons.Add($"discharged {Wording.ShortDay(discharged)}");
        }

        if (Recent(DiureticChange.Last(picture), "silence.after-diuretic-change-days") is { } changed)
        {
            reasons.Add($"diuretic changed {Wording.ShortDay(changed)}");
        }

        return reasons.ToImmutable();

        DateOnly? Recent(DateOnly? day, string key) =>
            day <= picture.AsOf && protocol[key].IsMetBy(picture.AsOf.DayNumber - day.Value.DayNumber) ? day : null;
    }
}
