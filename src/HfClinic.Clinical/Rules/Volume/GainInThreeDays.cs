using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>More than 2 kg gained in 3 days. Source: ESC 2021 self-care advice, as quoted by Gudmundsson 2019.</summary>
public sealed class GainInThreeDays : WeightChangeRule
{
    public override string Id => "volume.gain-3-days";

    public override string Title => "Gain in 3 days";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-self-care", "gudmundsson-2019"];

    public override int Days => 3;

    public override string ThresholdKey => "weight.gain-3-days";

    protected override Finding Urge(Finding finding, PatientPicture picture, ClinicProtocol protocol) =>
        finding with { Urgency = Urgency.Today };
}
