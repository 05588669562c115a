using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Reads a pillar of which nothing that counts is taken.</summary>
internal sealed class AbsentReading(TitrationClass titration, PostDischargeTrack? track, TitrationFacts facts)
{
    private readonly PatientPicture _picture = facts.Picture;

    private readonly ClinicProtocol _protocol = facts.Protocol;

    private readonly string _name = TitrationClasses.Words(titration);

    public ClassTitration Read(Phenotype phenotype, ImmutableArray<TakenMedicine> uncounted)
    {
        var ways = Classes().Where(one => !IsExcluded(one)).Select(one => new Candidate(one, null, true)).ToList();
        var open = ways
            .Select(way => (Way: way, Holds: Holds.Now(titration, way, facts, track)))
            .Where(way => !way.Holds.Any(hold => hold.Effect == LimitEffect.Bars))
            .OrderBy(way => way.Holds.Length)
            .ToList();
        if (open.Count == 0)
        {
            return NotGiven(ways);
        }

        var (candidate, holds) = open[0];
        var tempo = Tempo.OfAbsence(_protocol);
        var since = Since(out var stopped);
        var clock = Later(since, Holds.LastCleared(titration, candidate, facts, since));
        var reading = new ClassTitration
        {
            Class = titration,
            State = TitrationState.NotCovered,
            Sentence = "",
            DaysUnchanged = _picture.AsOf.DayNumber - since.DayNumber,
            DueSince = since.AddDays(tempo.Gap),
            OverdueFrom = clock.AddDays(tempo.Overdue),
            Holds = holds,
            IsSetAside = holds.Any(hold => hold.Effect >= LimitEffect.Review),
            Missing = Freshness.Missing(titration, facts),
            Limit = RecordedLimits.Standing(titration, _picture, _protocol),
            Notes = stopped is { } day && StoppedAfterImprovement(day, phenotype) is { } note ? [note] : [],
            OneLevelLower = DoseReader.IsLowered(titration, _picture),
            SourceKeys = titration == TitrationClass.Sglt2Inhibitor ? ["esc-2023-update", "aha-2022"] : ["esc-2021-text", "aha-2022"],
        };
        var instead = uncounted.IsEmpty ? "" : $" ({Wording.List([.. uncounted.Select(medicine => medicine.Words)])} not counted)";
        return GapState.Decide(reading, _picture, TitrationState.NotCovered, $"none taken since {Wording.Day(since)}{instead}", _name);
    }

    private ImmutableArray<MedicineClass> Classes() => titration switch
    {
        TitrationClass.BetaBlocker => [MedicineClass.BetaBlocker],
        TitrationClass.RasInhibitor => [MedicineClass.AceInhibitor, MedicineClass.Arb, MedicineClass.Arni],
        TitrationClass.Mra => [MedicineClass.Mra],
        _ => [MedicineClass.Sglt2Inhibitor],
    };

    private bool IsExcluded(MedicineClass medicineClass) =>
        _picture.NotGiven.Any(entry => entry.On <= _picture.AsOf && entry.Classes.Contains(medicineClass));

    private ClassTitration NotGiven(List<Candidate> ways)
    {
        var reasons = _picture.NotGiven
            .Where(entry => entry.On <= _picture.AsOf && entry.Classes.Intersect(Classes()).Any())
            .Select(entry => $"{NotGivenWords(entry.Because)} on {Wording.Day(entry.On)} ({entry.Reason})");
        var bars = ways.SelectMany(way => Holds.Now(titration, way, facts, track)).Where(hold => hold.Effect == LimitEffect.Bars).ToImmutableArray();
        var words = reasons.Concat(bars.Select(bar => bar.Remark)).Distinct().ToList();
        return new()
        {
            Class = titration,
            State = TitrationState.NotGiven,
            Sentence = $"{_name}: not given: {string.Join("; ", words)}",
            Holds = bars,
        };
    }

    private static string NotGivenWords(NotGivenBecause because) => because switch
    {
        NotGivenBecause.Contraindication => "contraindication recorded",
        NotGivenBecause.Intolerance => "intolerance recorded",
        NotGivenBecause.Allergy => "allergy recorded",
        _ => "refused",
    };

    /// <summary>The first visit, or the day the last medicine of the pillar was stopped.</summary>
    private DateOnly Since(out DateOnly? stopped)
    {
        stopped = _picture.DoseCourses
            .Where(course => Formulary.BuiltIn.Read(course.Medicine) is { CoversPillar: true, Class: { } found } && TitrationClasses.Of(found) == titration)
            .Where(course => course.Until <= _picture.AsOf)
            .Max(course => course.Until);
        return Later(_picture.EnrolledOn, stopped);
    }

    private TitrationNote? StoppedAfterImprovement(DateOnly stopped, Phenotype phenotype)
    {
        if (!phenotype.OnHfrefPathway || phenotype.Latest is not { } latest || Phenotype.Whole(latest) <= 40)
        {
            return null;
        }

        var improved = _picture.EjectionFractions.Where(fraction => fraction.Day <= _picture.AsOf)
            .Reverse().TakeWhile(fraction => Phenotype.Whole(fraction) > 40).Last();
        return stopped < improved.Day
            ? null
            : new(TitrationNoteKind.StoppedAfterImprovement, $"{_name} stopped on {Wording.Day(stopped)}, after LVEF had risen above 40 % on {Wording.Day(improved.Day)}", ["esc-2021-text", "aha-2022"], stopped);
    }

    private static DateOnly Later(DateOnly one, DateOnly? other) => other > one ? other.Value : one;
}
