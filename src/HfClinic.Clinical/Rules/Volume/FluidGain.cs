using System.Collections.Immutable;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The fluid part of the trend stands more than 2.0 standard deviations of this person's usual coming and going above the
/// own baseline. Source: a default of this program, set by simulation, for the clinic to sign off.
/// </summary>
public sealed class FluidGain : TrendRule
{
    /// <summary>Known to the rules about an early gain and a target out of step.</summary>
    public const string RuleId = "volume.fluid-gain";

    internal const string ThresholdKey = "trend.fluid-gain";

    public override string Id => RuleId;

    public override string Title => "Fluid gain";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    /// <summary>One standard deviation further is news.</summary>
    public override decimal? MaterialStep => 1;

    protected override bool IsOn(ClinicProtocol protocol) => protocol[ThresholdKey].IsOn;

    protected override Finding Look(TrendLook look, ClinicProtocol protocol)
    {
        var limit = protocol[ThresholdKey];
        var score = (decimal)look.Day.FluidScore;
        var fires = limit.IsMetBy(score);
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.ThisWeek,
            Statement = fires ? look.FluidWords(protocol) : "",
            Limit = look.FluidLimit(limit, protocol),
            Magnitude = score,
            Evidence = [.. look.FluidEvidence(protocol, LatestWeight(look.Latest, look.Picture, protocol, raisedIt: fires))],
        };
    }
}
