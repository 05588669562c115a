using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Picture;

/// <summary>
/// Everything a rule may see of one patient, as of the end of one clinic day. Immutable; later data are not in it.
/// </summary>
public sealed record PatientPicture
{
    private readonly PictureTrend _trend = new();

    /// <summary>The clinic day the picture stands for, in the clinic's time zone.</summary>
    public required DateOnly AsOf { get; init; }

    public required DateOnly EnrolledOn { get; init; }

    public DateOnly? BirthDate { get; init; }

    public Sex Sex { get; init; }

    public int? HeightCentimetres { get; init; }

    /// <summary>Whether daily weights from home are expected.</summary>
    public bool WeighsAtHome { get; init; }

    /// <summary>The last discharge from hospital for heart failure, if any.</summary>
    public DateOnly? DischargedFromHospitalOn { get; init; }

    /// <summary>Weights in order of time: accepted and held. Struck-out and superseded ones are left out.</summary>
    public ImmutableArray<WeightReading> Weights { get; init; } = [];

    /// <summary>Blood pressure, heart rate and oxygen saturation, accepted, in order of time.</summary>
    public ImmutableArray<VitalReading> Vitals { get; init; } = [];

    /// <summary>Symptom reports in order of day.</summary>
    public ImmutableArray<SymptomReport> Symptoms { get; init; } = [];

    /// <summary>Target weights in order of day; the last one on or before <see cref="AsOf"/> holds.</summary>
    public ImmutableArray<TargetWeight> TargetWeights { get; init; } = [];

    /// <summary>Dose courses in order of start.</summary>
    public ImmutableArray<DoseCourse> DoseCourses { get; init; } = [];

    /// <summary>Blood tests in order of time.</summary>
    public ImmutableArray<BloodResult> BloodTests { get; init; } = [];

    /// <summary>Ejection fractions in order of day.</summary>
    public ImmutableArray<EjectionFraction> EjectionFractions { get; init; } = [];

    /// <summary>Rule identifiers of the flags open for this patient before this assessment.</summary>
    public ImmutableHashSet<string> OpenFlagRules { get; init; } = [];

    /// <summary>A prescriber's word on the phenotype; null when the ejection fractions speak for themselves.</summary>
    public PhenotypeOverride? PhenotypeOverride { get; init; }

    /// <summary>Reasons on record for stopping short of target, in order of day.</summary>
    public ImmutableArray<TitrationLimit> TitrationLimits { get; init; } = [];

    /// <summary>Documented contraindications, intolerances, allergies and refusals.</summary>
    public ImmutableArray<NotGiven> NotGiven { get; init; } = [];

    public ImmutableHashSet<PatientCondition> Conditions { get; init; } = [];

    /// <summary>Rhythms as found, in order of day.</summary>
    public ImmutableArray<Seen<Rhythm>> Rhythms { get; init; } = [];

    /// <summary>New York Heart Association classes, 1 to 4, in order of day.</summary>
    public ImmutableArray<Seen<int>> NyhaClasses { get; init; } = [];

    /// <summary>Whether signs of congestion were found, in order of day.</summary>
    public ImmutableArray<Seen<bool>> Congestion { get; init; } = [];

    /// <summary>Whether low pressure was found to cause symptoms, in order of day.</summary>
    public ImmutableArray<Seen<bool>> SymptomaticHypotension { get; init; } = [];

    /// <summary>The last decompensation other than the admission that ended on <see cref="DischargedFromHospitalOn"/>.</summary>
    public DateOnly? DecompensatedOn { get; init; }

    /// <summary>Same-day safety flags open before this assessment, by class of medicine.</summary>
    public ImmutableArray<OpenSafetyFlag> OpenSafetyFlags { get; init; } = [];

    /// <summary>The rhythm last found up to <see cref="AsOf"/>; null when none is on record.</summary>
    public Seen<Rhythm>? Rhythm => Rhythms.LastOrDefault(seen => seen.Day <= AsOf);

    /// <summary>The target weight that holds on <see cref="AsOf"/>, or null when none was set.</summary>
    public TargetWeight? TargetWeight => TargetWeights.LastOrDefault(target => target.From <= AsOf);

    /// <summary>The individual weight trend up to <see cref="AsOf"/>; computed when first asked for, and kept.</summary>
    public TrendHistory Trend => _trend.Of(this);
}
