using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// 5 lb (2,268 g) or more lost in 7 days: a person may have been dried out too far. Sooner when dizzy, fainted or with a
/// low systolic pressure. Source: US clinic leaflets for the figure; the urgency is a default of this program.
/// </summary>
public sealed class LossInSevenDays : WeightChangeRule
{
    public override string Id => "volume.loss-7-days";

    public override string Title => "Loss in 7 days";

    public override ImmutableArray<string> SourceKeys { get; } = ["us-hospital-leaflets", "clinic-default"];

    public override int Days => 7;

    public override string ThresholdKey => "weight.loss-7-days";

    protected override string Verb => "Lost";

    protected override string ReferenceName => "Highest";

    protected override WeightChange? ChangeOf(WeightSummary summary) => summary.Loss(Days);

    protected override Weight SizeOf(WeightChange change) => change.Reference.Weight - change.Latest.Weight;

    protected override Finding Urge(Finding finding, PatientPicture picture, ClinicProtocol protocol)
    {
        ImmutableArray<(string Words, Evidence Evidence)> signs =
        [
            .. RecentSigns.Reported(picture, protocol, Symptoms.Dizziness | Symptoms.Syncope),
            .. RecentSigns.LowSystolic(picture, protocol),
        ];
        return finding with
        {
            Urgency = signs.IsEmpty ? Urgency.ThisWeek : Urgency.Today,
            Statement = string.Join("; ", [finding.Statement, .. signs.Select(sign => sign.Words)]),
            Evidence = [.. finding.Evidence, .. signs.Select(sign => sign.Evidence)],
        };
    }
}
