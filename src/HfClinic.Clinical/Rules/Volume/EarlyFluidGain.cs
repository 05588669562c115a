using System.Collections.Immutable;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The fluid part of the trend stands more than 1.75 standard deviations above the own baseline, and not yet far enough for
/// <see cref="FluidGain"/>. Shown, no task: it is cleared by the data. Source: a default of this program, for the clinic to
/// sign off.
/// </summary>
public sealed class EarlyFluidGain : TrendRule
{
    private const string ThresholdKey = "trend.fluid-gain-early";

    public override string Id => "volume.fluid-gain-early";

    public override string Title => "Early fluid gain";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override bool Latches => false;

    public override decimal? MaterialStep => 1;

    protected override bool IsOn(ClinicProtocol protocol) => protocol[ThresholdKey].IsOn;

    protected override Finding Look(TrendLook look, ClinicProtocol protocol)
    {
        var limit = protocol[ThresholdKey];
        var score = (decimal)look.Day.FluidScore;
        var fires = limit.IsMetBy(score) && !protocol[FluidGain.ThresholdKey].IsMetBy(score)
            && !look.Picture.OpenFlagRules.Contains(FluidGain.RuleId);
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.ForInformation,
            Statement = fires ? $"Early: {look.FluidWords(protocol)}" : "",
            Limit = look.FluidLimit(limit, protocol),
            Magnitude = score,
            Evidence = [.. look.FluidEvidence(protocol, LatestWeight(look.Latest, look.Picture, protocol, raisedIt: fires))],
        };
    }
}
