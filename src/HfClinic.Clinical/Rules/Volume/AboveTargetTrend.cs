using System.Collections.Immutable;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The weight with the scatter taken out stands above the target weight, for certain: see <see cref="TrendOffTarget"/>.
/// Beside <see cref="AboveTarget"/>, which reads the latest weight alone. Source: a default of this program, for the clinic
/// to sign off.
/// </summary>
public sealed class AboveTargetTrend : TrendRule
{
    public override string Id => "volume.above-target-trend";

    public override string Title => "Trend above target weight";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    protected override bool IsOn(ClinicProtocol protocol) => TrendOffTarget.IsOn(protocol);

    protected override Finding Look(TrendLook look, ClinicProtocol protocol) =>
        TrendOffTarget.Of(look, +1, protocol) is not { } above ? CannotTell("no target weight")
        : Answer(above.IsBeyond ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.ThisWeek,
            Statement = above.IsBeyond ? above.Words("above", protocol) + UpTo(look.Latest, look.Picture) : "",
            Limit = above.LimitWords(protocol),
            Magnitude = (decimal)Math.Round(above.Kilograms * 1000),
            Evidence =
            [
                above.Evidence(protocol),
                LatestWeight(look.Latest, look.Picture, protocol, raisedIt: above.IsBeyond),
                look.Slope(protocol),
            ],
        };
}
