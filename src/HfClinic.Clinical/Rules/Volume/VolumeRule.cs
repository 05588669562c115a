using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>What the rules about fluid have in common.</summary>
public abstract class VolumeRule : IRule
{
    public abstract string Id { get; }

    public virtual int Version => 1;

    public abstract string Title { get; }

    public abstract ImmutableArray<string> SourceKeys { get; }

    public virtual bool Latches => true;

    /// <summary>1 kg, in grams: a default of this program.</summary>
    public virtual decimal? MaterialStep => 1000;

    /// <summary>A week: a default of this program.</summary>
    public virtual int JoinDays => 7;

    public abstract IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol);

    /// <summary>Whether weights of this patient are expected or there are some.</summary>
    protected static bool HasWeights(PatientPicture picture) => picture.WeighsAtHome || !picture.Weights.IsEmpty;

    /// <summary>The latest weight as evidence.</summary>
    protected static Evidence LatestWeight(WeightReading latest, PatientPicture picture, ClinicProtocol protocol, bool raisedIt) => new(
        latest.Day == picture.AsOf ? "Today" : "Latest weight",
        Wording.Weight(latest.Weight, protocol.WeightUnit),
        latest.Day,
        latest.Id,
        raisedIt);

    /// <summary>" up to 25 Nov" when the latest weight is not of the clinic day itself.</summary>
    protected static string UpTo(WeightReading latest, PatientPicture picture) =>
        latest.Day == picture.AsOf ? "" : $" up to {Wording.ShortDay(latest.Day)}";

    protected Finding Answer(Outcome outcome) => new()
    {
        RuleId = Id,
        RuleVersion = Version,
        Outcome = outcome,
        SourceKeys = SourceKeys,
    };

    protected Finding CannotTell(string missing) => Answer(Outcome.CannotTell) with { Missing = missing };
}
