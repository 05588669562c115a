using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>2 lb (907 g) or more gained in 1 day; off unless switched on. Source: NHS trust leaflets; AHA patient guidance, from memory.</summary>
public sealed class GainInOneDayTwoPounds : WeightChangeRule
{
    public override string Id => "volume.gain-1-day-2lb";

    public override string Title => "Gain of 2 lb in 1 day";

    public override ImmutableArray<string> SourceKeys { get; } = ["aha-patient-guidance", "nhs-trust-leaflets"];

    public override int Days => 1;

    public override string ThresholdKey => "weight.gain-1-day-2lb";

    protected override Finding Urge(Finding finding, PatientPicture picture, ClinicProtocol protocol) =>
        finding with { Urgency = Urgency.Today };
}
