using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Holds and bars that are no measured values: symptoms, congestion, conditions.</summary>
internal static class ConditionHolds
{
    private const Symptoms OfLowPressure = Symptoms.Dizziness | Symptoms.Syncope;

    /// <summary>What speaks against a step of that class now.</summary>
    public static IEnumerable<HoldReason> Now(Candidate candidate, TitrationFacts facts, bool onTrack) =>
        from row in ClassCondition.All
        where row.IsFor(candidate.Class, candidate.Medicine, candidate.Starting)
        where !Replaced(row, candidate)
        where !(onTrack && row.Condition == Against.RecentDecompensation)
        let found = Find(row.Condition, facts)
        where found is not null
        select new HoldReason(row.Effect, found.What, "", row.Words, found.Day, null, row.SourceKeys);

    /// <summary>The last day on which a dated finding that held was found gone, or a decompensation lay far enough back.</summary>
    public static DateOnly? LastCleared(Candidate candidate, TitrationFacts facts)
    {
        var conditions = ClassCondition.All
            .Where(row => row.IsFor(candidate.Class, candidate.Medicine, candidate.Starting))
            .Select(row => row.Condition).ToHashSet();
        IEnumerable<DateOnly?> days =
        [
            conditions.Contains(Against.Congestion) ? Cleared(facts.Picture.Congestion, held => held, facts.Picture.AsOf) : null,
            conditions.Contains(Against.SymptomaticHypotension) ? Cleared(facts.Picture.SymptomaticHypotension, held => held, facts.Picture.AsOf) : null,
            conditions.Contains(Against.NyhaFour) ? Cleared(facts.Picture.NyhaClasses, nyha => nyha == 4, facts.Picture.AsOf) : null,
            conditions.Contains(Against.RecentDecompensation) ? DecompensationPast(facts) : null,
        ];
        return days.Max();
    }

    /// <summary>A row for one medicine by name goes before the row for its whole class.</summary>
    private static bool Replaced(ClassCondition row, Candidate candidate) => row.Medicines.IsEmpty && ClassCondition.All.Any(other =>
        other.Condition == row.Condition && !other.Medicines.IsEmpty && other.IsFor(candidate.Class, candidate.Medicine, candidate.Starting));

    private static Seen<string>? Find(Against condition, TitrationFacts facts) => condition switch
    {
        Against.SymptomaticHypotension => Hypotension(facts),
        Against.Congestion => Last(facts.Picture.Congestion, facts.Picture.AsOf) is { What: true } found
            ? new(found.Day, $"congestion found on {Wording.Day(found.Day)}") : null,
        Against.NyhaFour => Last(facts.Picture.NyhaClasses, facts.Picture.AsOf) is { What: 4 } found
            ? new(found.Day, $"NYHA class IV on {Wording.Day(found.Day)}") : null,
        Against.RecentDecompensation => Decompensation(facts.Picture) is { } day
            && facts.IsFresh(day, "decompensation.days")
                ? new(day, $"decompensation up to {Wording.Day(day)}") : null,
        Against.HighGradeAvBlock or Against.SickSinus when facts.Picture.Conditions.Contains(PatientCondition.Pacemaker) => null,
        _ => Lasting(condition) is { } fact && facts.Picture.Conditions.Contains(fact) ? new(facts.Picture.AsOf, "on record") : null,
    };

    /// <summary>Found by a clinician; or told as dizziness or fainting, with a pressure below the protocol's limit.</summary>
    private static Seen<string>? Hypotension(TitrationFacts facts)
    {
        if (Last(facts.Picture.SymptomaticHypotension, facts.Picture.AsOf) is { What: true } found)
        {
            return new(found.Day, $"low pressure with symptoms on {Wording.Day(found.Day)}");
        }

        var told = facts.Picture.Symptoms.LastOrDefault(report => report.Day <= facts.Picture.AsOf && facts.IsFresh(report.Day, "fresh.vitals-days"));
        return told is not null && (told.Symptoms & OfLowPressure) != 0
            && facts.Latest(LimitMeasure.SystolicPressure) is { } pressure
            && facts.Protocol["pressure.hold-with-symptoms"].IsMetBy(pressure.Value)
                ? new(told.Day, $"{SymptomWords.List(told.Symptoms & OfLowPressure)} on {Wording.Day(told.Day)}, {pressure.Words}")
                : null;
    }

    private static DateOnly? Decompensation(PatientPicture picture) => new[] { picture.DischargedFromHospitalOn, picture.DecompensatedOn }
        .Where(day => day <= picture.AsOf).Max();

    private static DateOnly? DecompensationPast(TitrationFacts facts)
    {
        var past = Decompensation(facts.Picture)?.AddDays((int)facts.Protocol["decompensation.days"].Value + 1);
        return past <= facts.Picture.AsOf ? past : null;
    }

    private static PatientCondition? Lasting(Against condition) =>
        Enum.TryParse<PatientCondition>(condition.ToString(), out var fact) ? fact : null;

    private static Seen<T>? Last<T>(ImmutableArray<Seen<T>> findings, DateOnly asOf) => findings.LastOrDefault(seen => seen.Day <= asOf);

    private static DateOnly? Cleared<T>(ImmutableArray<Seen<T>> findings, Func<T, bool> holds, DateOnly asOf)
    {
        var known = findings.Where(seen => seen.Day <= asOf).ToList();
        return known.Zip(known.Skip(1)).Where(pair => holds(pair.First.What) && !holds(pair.Second.What))
            .Select(pair => (DateOnly?)pair.Second.Day).LastOrDefault();
    }
}
