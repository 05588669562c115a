using System.Collections.Immutable;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>What a medicine's dose is steered by.</summary>
public enum SteeredBy
{
    /// <summary>A published target dose.</summary>
    Dose,

    /// <summary>One dose that is start and target in one.</summary>
    FixedDose,

    /// <summary>The heart rate (ivabradine).</summary>
    HeartRate,

    /// <summary>A blood level (digoxin).</summary>
    Level,

    /// <summary>Symptoms and signs (diuretics).</summary>
    Symptoms,

    /// <summary>No published dose for heart failure.</summary>
    None,
}

/// <summary>One medicine of the formulary: name and salt with its published figures.</summary>
/// <param name="Name">Generic name in lower case.</param>
/// <param name="Salt">Salt or formulation where it decides; else null. Two salts may share ATC and RxNorm codes.</param>
/// <param name="OtherNames">Other spellings under which it is recorded.</param>
/// <param name="CoversPillar">Whether taking it counts as having the pillar.</param>
/// <param name="Unit">The unit of all amounts.</param>
/// <param name="Phenotypes">Where a dose below target is a gap.</param>
/// <param name="LowStartWhen">When the lower start dose is given.</param>
public sealed record Medicine(
    string Name,
    string? Salt,
    ImmutableArray<string> OtherNames,
    MedicineClass Class,
    bool CoversPillar,
    SteeredBy SteeredBy,
    string Unit,
    ImmutableArray<EjectionFractionKind> Phenotypes,
    MedicineCode? Atc,
    MedicineCode? RxNorm,
    ImmutableArray<PublishedDoses> Doses,
    DoseLadder? Ladder,
    StepInterval? Interval,
    ImmutableArray<DoseByWeight> ByWeight,
    ImmutableArray<DoseByKidney> ByKidney,
    ImmutableArray<InformationFrom> InformationFrom,
    ImmutableArray<MedicineNote> LowStartWhen,
    ImmutableArray<MedicineNote> Notes)
{
    /// <summary>Name and salt: "metoprolol succinate".</summary>
    public string FullName => Salt is null ? Name : $"{Name} {Salt}";

    /// <summary>The published doses of the profile; of the other profile when this one has none, or null when neither has.</summary>
    public PublishedDoses? DosesFor(DoseProfile profile) =>
        Doses.FirstOrDefault(dose => dose.Profile == profile) ?? Doses.FirstOrDefault();

    /// <summary>The highest published total daily dose of the profile, target ranges and ladder included; null when there is none.</summary>
    public decimal? HighestDaily(DoseProfile profile)
    {
        var doses = DosesFor(profile);
        IEnumerable<decimal?> all =
        [
            doses?.Target?.HighDaily, doses?.Maximum?.HighDaily, doses?.Usual?.HighDaily, doses?.Start?.HighDaily, Ladder?.Rungs[^1].Daily,
        ];
        return all.Max();
    }

    /// <summary>The notes that hold in the profile.</summary>
    public IEnumerable<MedicineNote> NotesFor(DoseProfile profile) => Notes.Where(note => note.Profile is null || note.Profile == profile);
}

/// <summary>A code in an outside index.</summary>
public sealed record MedicineCode(string Code, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished;

/// <summary>The published doses of one profile.</summary>
/// <param name="Start">Null when none is published.</param>
/// <param name="LowStart">The lower start, for the cases of <see cref="Medicine.LowStartWhen"/>.</param>
/// <param name="Target">Null when the medicine is not steered by dose.</param>
/// <param name="Maximum">A published maximum above or instead of the target.</param>
/// <param name="Usual">The usual range of a medicine steered by symptoms or level.</param>
public sealed record PublishedDoses(
    DoseProfile Profile, DoseFigure? Start, DoseFigure? LowStart, DoseFigure? Target, DoseFigure? Maximum, DoseFigure? Usual);

/// <summary>The shortest time between two steps, in days.</summary>
/// <param name="UpTo">The longer end where a range is published.</param>
public sealed record StepInterval(int Days, int UpTo, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished;

/// <summary>A dose that holds from a body weight on.</summary>
/// <param name="ThresholdKey">The weight limit in the protocol, in kg.</param>
/// <param name="IsTarget">Whether it is the target there, or may only be given.</param>
public sealed record DoseByWeight(DoseProfile Profile, string ThresholdKey, DoseFigure Dose, bool IsTarget);

/// <summary>Doses that hold for a range of eGFR at the start, in mL/min/1.73 m².</summary>
/// <param name="From">Included.</param>
/// <param name="Below">Not included; null when there is no upper end.</param>
public sealed record DoseByKidney(decimal From, decimal? Below, DoseFigure Start, DoseFigure Target);

/// <summary>A dose below target from which on the difference is told as information only.</summary>
/// <param name="Profile">Null for both.</param>
public sealed record InformationFrom(
    DoseProfile? Profile, decimal Low, decimal TimesDaily, string Text, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished
{
    /// <summary>Total daily dose.</summary>
    public decimal Daily => Low * TimesDaily;
}

/// <summary>A remark.</summary>
/// <param name="Profile">Null for both.</param>
public sealed record MedicineNote(DoseProfile? Profile, string Text, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished;
