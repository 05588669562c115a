using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// For 28 days under one target the trend has stood more than 2 % of the target off it, on the same side, while its slope
/// over those days was on average below 0.03 kg a day either way, and there is no <see cref="FluidGain"/>: the target may be
/// out of step with the body. Source: a default of this program, for the clinic to sign off.
/// </summary>
public sealed class TargetWeightStale : TrendRule
{
    private const string OffKey = "target.stale-percent";
    private const string SlopeKey = "target.stale-slope";
    private const int Days = 28;

    public override string Id => "volume.target-stale";

    public override string Title => "Target weight out of step";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override bool Latches => false;

    public override int JoinDays => 30;

    protected override bool IsOn(ClinicProtocol protocol) => protocol[OffKey].IsOn && protocol[SlopeKey].IsOn;

    protected override Finding Look(TrendLook look, ClinicProtocol protocol)
    {
        if (look.Picture.TargetWeight is not { } target)
        {
            return CannotTell("no target weight");
        }

        var history = look.Picture.Trend;
        var first = look.Latest.Day.AddDays(1 - Days);
        if (first < history.FirstDay)
        {
            return CannotTell($"{Wording.Days(Days)} of trend are needed, there are {look.Latest.Day.DayNumber - history.FirstDay.DayNumber + 1}");
        }

        var days = Enumerable.Range(0, Days).Select(day => history.On(first.AddDays(day))!.Value).ToList();
        var excess = look.Day.Excess ?? 0;
        var slope = days.Average(day => day.Trend.Slope);
        var fires = target.From <= first
            && days.TrueForAll(day => protocol[OffKey].IsMetBy(Percent(day, Math.Sign(excess))))
            && protocol[SlopeKey].IsMetBy((decimal)Math.Abs(slope) * 1000)
            && !protocol[FluidGain.ThresholdKey].IsMetBy((decimal)look.Day.FluidScore)
            && !look.Picture.OpenFlagRules.Contains(FluidGain.RuleId);
        var side = excess > 0 ? "above" : "below";
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.NextVisit,
            Statement = fires
                ? $"Steady {TrendLook.Size(excess, protocol)} {side} target for {Wording.Days(Days)}{UpTo(look.Latest, look.Picture)}: the target weight may be out of step"
                : "",
            Limit = string.Create(
                CultureInfo.InvariantCulture,
                $"more than {protocol[OffKey].Value:0.##} % off target for {Wording.Days(Days)}, changing by less than {protocol[SlopeKey].Value / 1000:0.0##} kg a day"),
            Magnitude = (decimal)Math.Round(Math.Abs(excess) * 1000),
            Evidence =
            [
                new Evidence("Target weight", Wording.Weight(target.Weight, protocol.WeightUnit), target.From),
                LatestWeight(look.Latest, look.Picture, protocol, raisedIt: fires),
                look.Slope(protocol),
            ],
        };
    }

    private static decimal Percent(TrendDay day, int side) =>
        day is { Excess: { } excess, Target: { } target } ? (decimal)(side * excess / target * 100) : 0;
}
