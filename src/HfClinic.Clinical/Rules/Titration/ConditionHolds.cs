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
    public static IEnumerable<HoldReason> Now(Candidate candidate, PatientPicture picture, ClinicProtocol protocol, bool onTrack) =>
        from row in ClassCondition.All
        where row.IsFor(candidate.Class, candidate.Medicine, candidate.Starting)
        where !Replaced(row, candidate)
        where !(onTrack && row.Condition == Against.RecentDecompensation)
        let found = Find(row.Condition, picture, protocol)
        where found is not null
        select new HoldReason(row.Effect, found.What, "", row.Words, found.Day, null, row.SourceKeys);

    /// <summary>The last day on which a dated finding that held was found gone, or a decompensation lay far enough back.</summary>
    public static DateOnly? LastCleared(Candidate candidate, PatientPicture picture, ClinicProtocol protocol)
    {
        var conditions = ClassCondition.All
            .Where(row => row.IsFor(candidate.Class, candidate.Medicine, candidate.Starting))
            .Select(row => row.Condition).ToHashSet();
        IEnumerable<DateOnly?> days =
        [
            conditions.Contains(Against.Congestion) ? Cleared(picture.Congestion, held => held, picture.AsOf) : null,
            conditions.Contains(Against.SymptomaticHypotension) ? Cleared(picture.SymptomaticHypotension, held => held, picture.AsOf) : null,
            conditions.Contains(Against.NyhaFour) ? Cleared(picture.NyhaClasses, nyha => nyha == 4, picture.AsOf) : null,
            conditions.Contains(Against.RecentDecompensation) ? DecompensationPast(picture, protocol) : null,
        ];
        return days.Max();
    }

    /// <summary>A row for one medicine by name goes before the row for its whole class.</summary>
    private static bool Replaced(ClassCondition row, Candidate candidate) => row.Medicines.IsEmpty && ClassCondition.All.Any(other =>
        other.Condition == row.Condition && !other.Medicines.IsEmpty && other.IsFor(candidate.Class, candidate.Medicine, candidate.Starting));

    private static Seen<string>? Find(Against condition, PatientPicture picture, ClinicProtocol protocol) => condition switch
    {
        Against.SymptomaticHypotension => Hypotension(picture, protocol),
        Against.Congestion => Last(picture.Congestion, picture.AsOf) is { What: true } found
            ? new(found.Day, $"congestion found on {Wording.Day(found.Day)}") : null,
        Against.NyhaFour => Last(picture.NyhaClasses, picture.AsOf) is { What: 4 } found
            ? new(found.Day, $"NYHA class IV on {Wording.Day(found.Day)}") : null,
        Against.RecentDecompensation => Decompensation(picture) is { } day
            && protocol["decompensation.days"].IsMetBy(picture.AsOf.DayNumber - day.DayNumber)
                ? new(day, $"decompensation up to {Wording.Day(day)}") : null,
        Against.HighGradeAvBlock or Against.SickSinus when picture.Conditions.Contains(PatientCondition.Pacemaker) => null,
        _ => Lasting(condition) is { } fact && picture.Conditions.Contains(fact) ? new(picture.AsOf, "on record") : null,
    };

    /// <summary>Found by a clinician; or told as dizziness or fainting, with a pressure below the protocol's limit.</summary>
    private static Seen<string>? Hypotension(PatientPicture picture, ClinicProtocol protocol)
    {
        if (Last(picture.SymptomaticHypotension, picture.AsOf) is { What: true } found)
        {
            return new(found.Day, $"low pressure with symptoms on {Wording.Day(found.Day)}");
        }

        var told = picture.Symptoms.LastOrDefault(report => report.Day <= picture.AsOf
            && protocol["fresh.vitals-days"].IsMetBy(picture.AsOf.DayNumber - report.Day.DayNumber));
        return told is not null && (told.Symptoms & OfLowPressure) != 0
            && MeasuredHolds.Latest(LimitMeasure.SystolicPressure, picture, protocol) is { } pressure
            && protocol["pressure.hold-with-symptoms"].IsMetBy(pressure.Value)
                ? new(told.Day, $"{SymptomWords.List(told.Symptoms & OfLowPressure)} on {Wording.Day(told.Day)}, {pressure.Words}")
                : null;
    }

    private static DateOnly? Decompensation(PatientPicture picture) => new[] { picture.DischargedFromHospitalOn, picture.DecompensatedOn }
        .Where(day => day <= picture.AsOf).Max();

    private static DateOnly? DecompensationPast(PatientPicture picture, ClinicProtocol protocol)
    {
        var past = Decompensation(picture)?.AddDays((int)protocol["decompensation.days"].Value + 1);
        return past <= picture.AsOf ? past : null;
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
