using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Reads a class that is taken against its target dose.</summary>
internal sealed class DoseReader(
    TitrationClass titration,
    ImmutableArray<TakenMedicine> counted,
    Phenotype phenotype,
    PostDischargeTrack? track,
    TitrationFacts facts)
{
    private readonly PatientPicture _picture = facts.Picture;

    private readonly ClinicProtocol _protocol = facts.Protocol;

    private readonly string _name = TitrationClasses.Words(titration);

    private readonly DoseProfile _profile = facts.Protocol.DoseProfile();

    /// <summary>Beta blocker in atrial fibrillation: no benefit shown in that subgroup (ESC 2021 5.3.2), one level lower.</summary>
    public static bool IsLowered(TitrationClass titration, PatientPicture picture) =>
        titration == TitrationClass.BetaBlocker && picture.Rhythm?.What == Rhythm.AtrialFibrillation;

    public ClassTitration Read()
    {
        var (medicine, target) = Judged();
        if (target is null)
        {
            return Say(medicine, TitrationState.AtTarget, $"{medicine.Words}, a dose without steps") with { Notes = PublishedNotes(medicine) };
        }

        var percent = target.Figure.PercentOf(medicine.Daily);
        var what = $"{medicine.Words}, {Percent(percent)} of {target.Words(medicine.Recorded)} ({DoseProfiles.Words(target.From)}), unchanged for {Wording.Days(Days(medicine))}";
        var reading = Say(medicine, TitrationState.AtTarget, $"at target: {what}") with
        {
            Percent = percent,
            Target = target.Words(medicine.Recorded),
            SourceKeys = target.Figure.SourceKeys,
            Notes = [.. PublishedNotes(medicine), .. Differences(medicine, target)],
            OneLevelLower = IsLowered(titration, _picture),
        };
        return IsLookedFor(medicine) ? Judge(reading, medicine, target, percent, what) : NotLookedFor(reading, percent, what);
    }

    private ClassTitration Judge(ClassTitration reading, TakenMedicine medicine, TargetDose target, decimal percent, string what)
    {
        if (percent >= 100)
        {
            return !target.WeightMissing ? reading : reading with
            {
                State = TitrationState.CheckDue,
                Missing = [string.Create(CultureInfo.InvariantCulture, $"weight of the last {_protocol["carvedilol.weight-days"].Value:0} days")],
                Sentence = $"{_name}: check due: the target depends on the weight, and none is recent; {what}",
            };
        }

        if (medicine.Match.Medicine!.InformationFrom.FirstOrDefault(entry => (entry.Profile ?? _profile) == _profile && medicine.Daily >= entry.Daily) is { } from)
        {
            return reading with
            {
                State = TitrationState.Information,
                Sentence = $"{_name}: information: {what}; {from.Text}",
                Notes = [.. reading.Notes, TitrationNote.Information($"{what}; {from.Text}", from)],
            };
        }

        return GapState.Decide(WithTime(reading, medicine, percent), _picture, TitrationState.Due, $"below target: {what}", _name);
    }

    private ClassTitration WithTime(ClassTitration reading, TakenMedicine medicine, decimal percent)
    {
        var (recorded, medicineClass) = (medicine.Match.Medicine!.Name, medicine.Match.Class!.Value);
        var candidate = new Candidate(medicineClass, recorded, false);
        var startedLow = medicineClass == MedicineClass.Arni && medicine.IsStart && medicine.Milligrams == medicine.Match.Medicine.Ladder!.Rungs[0].Amount;
        var tempo = Tempo.Of(medicineClass, startedLow, _protocol);
        var cleared = Holds.LastCleared(titration, candidate, facts, medicine.Since);
        var holds = Holds.Now(titration, candidate, facts, track);
        var onTrack = track is not null && PostDischargeTrack.Covers(titration);
        var fast = PostDischargeTrack.Days(percent, _protocol);
        var (start, gap, overdue) = onTrack
            ? (track!.DischargedOn, fast.Gap, fast.Overdue)
            : (medicine.Since, tempo.Gap, tempo.Overdue);
        var earliest = medicine.Since.AddDays(onTrack ? (int)_protocol["titration.after-discharge.half-days"].Value : tempo.Earliest);
        return reading with
        {
            StepFrom = earliest,
            DueSince = Later(start.AddDays(gap), onTrack ? earliest : null),
            OverdueFrom = Later(start, cleared).AddDays(overdue),
            Holds = holds,
            IsSetAside = holds.Any(hold => hold.Effect >= LimitEffect.Review),
            Missing = Freshness.Missing(titration, facts),
            Limit = RecordedLimits.Standing(titration, _picture, _protocol),
        };
    }

    /// <summary>The medicine nearest its target speaks for the class; of hydralazine and nitrate given apart, the one farthest from it.</summary>
    private (TakenMedicine Medicine, TargetDose? Target) Judged()
    {
        var all = counted.Select(medicine => (Medicine: medicine, Target: TargetDose.Of(medicine.Match.Medicine!, facts))).ToList();
        var withTarget = all.Where(one => one.Target is not null).OrderBy(one => one.Target!.Figure.PercentOf(one.Medicine.Daily)).ToList();
        return withTarget.Count == 0 ? all[0]
            : titration == TitrationClass.HydralazineNitrate ? withTarget[0]
            : withTarget[^1];
    }

    /// <summary>On the HFrEF pathway where the medicine has a target there; else where its phenotypes name the present one.</summary>
    private bool IsLookedFor(TakenMedicine medicine) =>
        medicine.Match.Medicine!.Phenotypes.Contains(phenotype.Kind)
        || (phenotype.OnHfrefPathway && medicine.Match.Medicine.Phenotypes.Contains(EjectionFractionKind.Reduced))
        || (titration == TitrationClass.Finerenone && phenotype.Kind == EjectionFractionKind.Improved);

    private ClassTitration NotLookedFor(ClassTitration reading, decimal percent, string what) =>
        phenotype.Kind == EjectionFractionKind.MildlyReduced && ClassReading.IsDosedInHfrefOnly(titration)
            ? percent >= 100 ? reading : reading with
            {
                State = TitrationState.Information,
                Sentence = $"{_name}: information: {what}; may be considered in HFmrEF (class IIb or 2b)",
                Notes = [.. reading.Notes, new(TitrationNoteKind.Information, $"{what}; may be considered in HFmrEF (class IIb or 2b)", ["esc-2021-text", "aha-2022"])],
            }
            : reading with
            {
                State = TitrationState.NotIndicated,
                Sentence = $"{_name}: {what}; no target dose is looked for in {EjectionFractionClass.Words(phenotype.Kind)}",
            };

    private IEnumerable<TitrationNote> Differences(TakenMedicine medicine, TargetDose target)
    {
        if (target.From != _profile)
        {
            yield return new(
                TitrationNoteKind.Information,
                $"target of the {DoseProfiles.Words(target.From)} profile: the {DoseProfiles.Words(_profile)} table has no row for {medicine.Match.Medicine!.FullName}",
                target.Figure.SourceKeys);
        }

        if (target.HigherByWeight is { } higher && medicine.Daily < higher.Dose.LowDaily && medicine.Daily >= target.Figure.ReachedDaily)
        {
            var limit = _protocol[higher.ThresholdKey];
            yield return TitrationNote.Information(
                string.Create(CultureInfo.InvariantCulture, $"{DoseWords.Amount(higher.Dose.Low)} {DoseWords.Schedule(higher.Dose.TimesDaily)} may be given: weight {TargetDose.Weight(_picture, _protocol):0.0} kg, above {limit.Value:0.#} kg"),
                higher.Dose);
        }
    }

    /// <summary>What the formulary says of a medicine without a dose of its own in the clinic's profile.</summary>
    private ImmutableArray<TitrationNote> PublishedNotes(TakenMedicine medicine)
    {
        var known = medicine.Match.Medicine!;
        return known.Doses.Any(dose => dose.Profile == _profile)
            ? []
            : [.. known.NotesFor(_profile).Where(note => note.Profile is not null || known.SteeredBy == SteeredBy.None)
                .Select(note => TitrationNote.Information($"{medicine.Recorded}: {note.Text}", note))];
    }

    private ClassTitration Say(TakenMedicine medicine, TitrationState state, string sentence) => new()
    {
        Class = titration,
        State = state,
        Sentence = $"{_name}: {sentence}",
        Taken = medicine,
        DaysUnchanged = Days(medicine),
    };

    private int Days(TakenMedicine medicine) => _picture.AsOf.DayNumber - medicine.Since.DayNumber;

    private static string Percent(decimal percent) => string.Create(CultureInfo.InvariantCulture, $"{decimal.Floor(percent):0} %");

    private static DateOnly Later(DateOnly one, DateOnly? other) => other > one ? other.Value : one;
}
