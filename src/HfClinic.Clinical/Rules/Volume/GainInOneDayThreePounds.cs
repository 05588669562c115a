using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>3 lb (1,361 g) or more gained in 1 day; off unless switched on. Source: US hospital leaflets; tested by Zhang 2009.</summary>
public sealed class GainInOneDayThreePounds : WeightChangeRule
{
    public override string Id => "volume.gain-1-day-3lb";

    public override string Title => "Gain of 3 lb in 1 day";

    public override ImmutableArray<string> SourceKeys { get; } = ["us-hospital-leaflets", "zhang-2009"];

    public override int Days => 1;

    public override string ThresholdKey => "weight.gain-1-day-3lb";

    protected override Finding Urge(Finding finding, PatientPicture picture, ClinicProtocol protocol) =>
        finding with { Urgency = Urgency.Today };
}
