using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>5 lb (2,268 g) or more gained in 7 days. Source: US and NHS patient leaflets; AHA patient guidance, from memory.</summary>
public sealed class GainInSevenDays : WeightChangeRule
{
    public override string Id => "volume.gain-7-days";

    public override string Title => "Gain in 7 days";

    public override ImmutableArray<string> SourceKeys { get; } = ["aha-patient-guidance", "nhs-trust-leaflets", "us-hospital-leaflets"];

    public override int Days => 7;

    public override string ThresholdKey => "weight.gain-7-days";

    protected override Finding Urge(Finding finding, PatientPicture picture, ClinicProtocol protocol) =>
        finding with { Urgency = Urgency.ThisWeek };
}
