using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>What the rules about titration have in common: they are read from <see cref="TitrationAssessment"/>, one answer a class.</summary>
public abstract class TitrationRule : IRule
{
    private const string Decision = "For the prescriber's decision.";

    public abstract string Id { get; }

    public virtual int Version => 1;

    public abstract string Title { get; }

    public abstract ImmutableArray<string> SourceKeys { get; }

    public bool Latches => false;

    public decimal? MaterialStep => null;

    /// <summary>Four weeks: a default of this program.</summary>
    public virtual int JoinDays => 28;

    public IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol) =>
        Read(TitrationAssessment.Of(picture, protocol), picture, protocol);

    /// <summary>As <see cref="Assess"/>, from an assessment made before of the same picture and protocol.</summary>
    public abstract IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol);

    /// <summary>Fires; or cannot tell while a check is due or a safety flag sets the class aside; or clear.</summary>
    protected Finding GapAnswer(ClassTitration reading, bool fires, Urgency urgency)
    {
        if (fires)
        {
            return Fires(reading, reading.OneLevelLower ? urgency - 1 : urgency, reading.Sentence, GapLimit(reading));
        }

        var missing = reading is { IsSetAside: true, State: TitrationState.Held } ? $"set aside while {Wording.List([.. reading.Holds.Select(hold => hold.Words)])}"
            : reading.State is TitrationState.CheckDue or TitrationState.CannotTell ? Wording.List(reading.Missing)
            : "";
        return missing.Length == 0 ? Clear(reading) : Answer(reading.Class, Outcome.CannotTell) with { Missing = missing };
    }

    protected Finding Fires(ClassTitration reading, Urgency urgency, string statement, string limit) => Answer(reading.Class, Outcome.Fires) with
    {
        Urgency = urgency,
        Statement = statement,
        Limit = limit,
        Caution = Decision,
        Evidence = Evidence(reading),
        SourceKeys = [.. SourceKeys.Concat(reading.SourceKeys).Concat(reading.Holds.SelectMany(hold => hold.SourceKeys)).Distinct()],
    };

    protected Finding Clear(ClassTitration reading) => Answer(reading.Class, Outcome.Clear);

    /// <summary>An answer about the whole regimen.</summary>
    protected Finding Answer(Outcome outcome) => new() { RuleId = Id, RuleVersion = Version, Outcome = outcome, SourceKeys = SourceKeys };

    private Finding Answer(TitrationClass titration, Outcome outcome) => Answer(outcome) with { Subject = TitrationClasses.Words(titration) };

    private static string GapLimit(ClassTitration reading) => reading.Target.Length == 0
        ? $"the pillar is absent from {Wording.Day(reading.DueSince!.Value)} on"
        : $"below {reading.Target}, shown from {Wording.Day(reading.DueSince!.Value)} on";

    private static ImmutableArray<Evidence> Evidence(ClassTitration reading)
    {
        var dose = reading.Taken is { } taken
            ? new Evidence("Present dose", taken.Words, taken.Since)
            : new Evidence("Present dose", "none of the class");
        var holds = reading.Holds.Select(hold => new Evidence("Holds a step", hold.Words, hold.Day, hold.ReadingId)).ToList();
        var notes = reading.Notes.Where(note => note.Day is not null).Select(note => new Evidence("Noted", note.Text, note.Day));
        return holds.Count > 0
            ? [dose, holds[0] with { RaisedIt = true }, .. holds.Skip(1), .. notes]
            : [dose with { RaisedIt = true }, .. notes];
    }
}
