using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The fluid part of the trend stands more than 2.0 standard deviations below the own baseline, or the trend below the target
/// for certain (see <see cref="TrendOffTarget"/>). With any of <see cref="DryingSigns"/> beside it, it is called possible
/// over-diuresis and is for today. Source: a default of this program, for the clinic to sign off; the rises of creatinine from
/// KDIGO 2012, from memory.
/// </summary>
public sealed class FluidLoss : TrendRule
{
    private const string ThresholdKey = "trend.fluid-loss";

    public override string Id => "volume.fluid-loss";

    public override string Title => "Fluid loss";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default", "kdigo-2012"];

    /// <summary>One standard deviation further is news.</summary>
    public override decimal? MaterialStep => 1;

    /// <summary>Whether there is a loss with signs that a person has been dried out too far.</summary>
    public static bool IsPossibleOverDiuresis(PatientPicture picture, ClinicProtocol protocol) =>
        protocol[ThresholdKey].IsOn
        && Of(picture, protocol) is { } look
        && IsLoss(look, TrendOffTarget.Of(look, -1, protocol), protocol)
        && DryingSigns.Of(picture, protocol).Any();

    protected override bool IsOn(ClinicProtocol protocol) => protocol[ThresholdKey].IsOn;

    protected override Finding Look(TrendLook look, ClinicProtocol protocol)
    {
        var limit = protocol[ThresholdKey];
        var score = -(decimal)look.Day.FluidScore;
        var below = TrendOffTarget.Of(look, -1, protocol);
        var byFluid = limit.IsMetBy(score);
        var fires = IsLoss(look, below, protocol);
        var weight = LatestWeight(look.Latest, look.Picture, protocol, raisedIt: fires);
        var finding = Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Limit = byFluid || below is null ? look.FluidLimit(limit, protocol) : below.LimitWords(protocol),
            Magnitude = score,
            Evidence = byFluid || below is null
                ? [.. look.FluidEvidence(protocol, weight)]
                : [below.Evidence(protocol), weight, look.Slope(protocol)],
        };
        return fires
            ? Urge(finding, byFluid ? look.FluidWords(protocol) : below!.Words("below", protocol) + UpTo(look.Latest, look.Picture), look.Picture, protocol)
            : finding;
    }

    private static bool IsLoss(TrendLook look, TrendOffTarget? below, ClinicProtocol protocol) =>
        protocol[ThresholdKey].IsMetBy(-(decimal)look.Day.FluidScore) || below is { IsBeyond: true };

    private static Finding Urge(Finding finding, string words, PatientPicture picture, ClinicProtocol protocol)
    {
        var signs = DryingSigns.Of(picture, protocol).ToList();
        return finding with
        {
            Urgency = signs.Count == 0 ? Urgency.ThisWeek : Urgency.Today,
            Statement = signs.Count == 0 ? words : string.Join("; ", [$"Possible over-diuresis: {words}", .. signs.Select(sign => sign.Words)]),
            Evidence = [.. finding.Evidence, .. signs.Select(sign => sign.Evidence)],
        };
    }
}
