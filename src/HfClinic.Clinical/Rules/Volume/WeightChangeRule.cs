using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>A plain limit on the change of weight, read for the latest day that has an accepted weight.</summary>
public abstract class WeightChangeRule : VolumeRule
{
    /// <summary>How many days before the latest are looked at.</summary>
    public abstract int Days { get; }

    /// <summary>The threshold in grams.</summary>
    public abstract string ThresholdKey { get; }

    /// <summary>"Gained" or "Lost".</summary>
    protected virtual string Verb => "Gained";

    /// <summary>"Lowest" or "Highest".</summary>
    protected virtual string ReferenceName => "Lowest";

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        if (!protocol[ThresholdKey].IsOn || !HasWeights(picture))
        {
            return [];
        }

        var summary = WeightSummary.Of(picture);
        return summary.Latest is not { } latest ? [CannotTell("no accepted weight")]
            : ChangeOf(summary) is not { } change ? [CannotTell($"no weight on the {Wording.Days(Days)} before {Wording.Day(latest.Day)}")]
            : [Compare(change, picture, protocol)];
    }

    /// <summary>The limit in words: "more than 2.0 kg in 3 days".</summary>
    public string LimitWords(ClinicProtocol protocol)
    {
        var threshold = protocol[ThresholdKey];
        var limit = Wording.Limit(new Weight((int)threshold.Value), protocol.WeightUnit);
        return threshold.Comparison == Comparison.Above
            ? $"more than {limit} in {Wording.Days(Days)}"
            : $"{limit} or more in {Wording.Days(Days)}";
    }

    /// <summary>The day against which the latest weight was compared, as evidence.</summary>
    public Evidence ReferenceOf(WeightChange change, ClinicProtocol protocol) => new(
        Days == 1 ? "The day before" : $"{ReferenceName} of the {Wording.Days(Days)} before",
        Wording.Weight(change.Reference.Weight, protocol.WeightUnit),
        change.Reference.Day,
        change.Reference.Id);

    protected virtual WeightChange? ChangeOf(WeightSummary summary) => summary.Gain(Days);

    /// <summary>The size that is compared: positive in the direction of the rule.</summary>
    protected virtual Weight SizeOf(WeightChange change) => change.Difference;

    protected abstract Finding Urge(Finding finding, PatientPicture picture, ClinicProtocol protocol);

    private Finding Compare(WeightChange change, PatientPicture picture, ClinicProtocol protocol)
    {
        var threshold = protocol[ThresholdKey];
        var size = SizeOf(change);
        var fires = threshold.IsMetBy(size.Grams);
        var finding = Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Limit = LimitWords(protocol),
            Magnitude = size.Grams,
            Evidence = [ReferenceOf(change, protocol), LatestWeight(change.Latest, picture, protocol, raisedIt: fires)],
        };
        if (!fires)
        {
            return finding;
        }

        var amount = Wording.SizeBeside(size, new Weight((int)threshold.Value), protocol.WeightUnit);
        var statement = $"{Verb} {amount} in {Wording.Days(Days)}{UpTo(change.Latest, picture)}";
        return Urge(finding with { Statement = statement }, picture, protocol);
    }
}
