using System.Collections.Immutable;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Reads where one class stands: whether it is looked for at all, and if so whether it is absent or taken.</summary>
internal sealed class ClassReading(
    TitrationClass titration,
    ImmutableArray<TakenMedicine> taken,
    Phenotype? phenotype,
    PostDischargeTrack? track,
    TitrationFacts facts)
{
    private static readonly ImmutableArray<TitrationClass> DosedInHfrefOnly =
        [TitrationClass.BetaBlocker, TitrationClass.RasInhibitor, TitrationClass.Mra];

    private readonly string _name = TitrationClasses.Words(titration);

    private readonly ImmutableArray<TakenMedicine> _counted = [.. taken.Where(medicine => medicine.Match.CoversPillar)];

    public ClassTitration Read()
    {
        if (phenotype is null)
        {
            return Say(TitrationState.CannotTell, "cannot tell: no ejection fraction on record") with { Missing = ["ejection fraction"] };
        }

        if (_counted.IsEmpty)
        {
            return ReadAbsent(phenotype);
        }

        var unknownSalt = _counted.FirstOrDefault(medicine => medicine.Match.SaltUnknown);
        return unknownSalt is not null ? SaltUnknown(unknownSalt)
            : titration == TitrationClass.Ivabradine ? new IvabradineReading(_counted[0], facts).Read(phenotype)
            : new DoseReader(titration, _counted, phenotype, track, facts).Read();
    }

    private ClassTitration ReadAbsent(Phenotype phenotype)
    {
        if (!phenotype.OnHfrefPathway && titration != TitrationClass.Sglt2Inhibitor)
        {
            return Say(TitrationState.NotIndicated, $"not looked for in {EjectionFractionClass.Words(phenotype.Kind)}");
        }

        var notes = taken.Select(NoteOnUncounted).ToImmutableArray();
        if (taken.FirstOrDefault(medicine => medicine.Match.SaltUnknown) is { } unknown)
        {
            return SaltUnknown(unknown) with { Notes = notes };
        }

        var reading = new AbsentReading(titration, track, facts).Read(phenotype, taken);
        return reading with { Notes = [.. notes, .. reading.Notes] };
    }

    private TitrationNote NoteOnUncounted(TakenMedicine medicine) => medicine.Match.SaltUnknown
        ? NoteOnSalt(medicine)
        : new(
            TitrationNoteKind.NotEvidenceBased,
            $"{medicine.Words} is not counted: {medicine.Match.Medicine!.Notes.Select(note => note.Text).FirstOrDefault("no evidence in HFrEF")}",
            ["esc-2021-text", "aha-2022"],
            medicine.Since);

    private static TitrationNote NoteOnSalt(TakenMedicine medicine) => new(
        TitrationNoteKind.SaltUnknown,
        $"salt of {medicine.Recorded} not recorded: {Wording.List([.. medicine.Match.Candidates.Select(candidate => candidate.Salt!)])} differ",
        [.. medicine.Match.Candidates.SelectMany(candidate => candidate.Notes).SelectMany(note => note.SourceKeys).Append("esc-2021-text").Distinct()],
        medicine.Since);

    private ClassTitration SaltUnknown(TakenMedicine medicine) =>
        Say(TitrationState.CannotTell, $"cannot tell: {NoteOnSalt(medicine).Text}") with
        {
            Taken = medicine,
            Missing = [$"salt of {medicine.Recorded}"],
            Notes = [NoteOnSalt(medicine)],
        };

    private ClassTitration Say(TitrationState state, string sentence) => new()
    {
        Class = titration,
        State = state,
        Sentence = $"{_name}: {sentence}",
    };

    /// <summary>Beta blocker, RAS inhibitor and MRA have a target dose in HFrEF and HFimpEF only (class IIb or 2b in HFmrEF).</summary>
    internal static bool IsDosedInHfrefOnly(TitrationClass titration) => DosedInHfrefOnly.Contains(titration);
}
