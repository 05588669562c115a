using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>The target that holds for one patient and medicine.</summary>
/// <param name="Figure">The published dose.</param>
/// <param name="From">The profile it comes from; the other one where the clinic's has no row.</param>
/// <param name="HigherByWeight">A dose that may be given at this weight without being the target; else null.</param>
/// <param name="WeightMissing">The target depends on a weight that is missing or too old.</param>
internal sealed record TargetDose(DoseFigure Figure, DoseProfile From, DoseByWeight? HigherByWeight, bool WeightMissing)
{
    /// <summary>Null when the medicine has no target dose.</summary>
    public static TargetDose? Of(Medicine medicine, TitrationFacts facts)
    {
        var (picture, protocol) = (facts.Picture, facts.Protocol);
        var profile = protocol.DoseProfile();
        if (medicine.SteeredBy != SteeredBy.Dose || medicine.DosesFor(profile) is not { Target: { } target } doses)
        {
            return null;
        }

        var figure = ByKidney(medicine, facts) ?? target;
        if (medicine.ByWeight.FirstOrDefault(entry => entry.Profile == profile) is not { } byWeight)
        {
            return new(figure, doses.Profile, null, false);
        }

        var weight = Weight(picture, protocol);
        return weight is { } kilograms && protocol[byWeight.ThresholdKey].IsMetBy(kilograms)
            ? byWeight.IsTarget ? new(byWeight.Dose, profile, null, false) : new(figure, profile, byWeight, false)
            : new(figure, profile, null, weight is null && byWeight.IsTarget);
    }

    /// <summary>"10 mg daily", "10 mg to 20 mg twice daily".</summary>
    public string Words(string medicine)
    {
        var low = DoseWords.Amount(medicine, Figure.AtTargetFrom ?? Figure.Low);
        var range = Figure.AtTargetFrom is not null || Figure.High == Figure.Low ? low : $"{low} to {DoseWords.Amount(medicine, Figure.High)}";
        return $"{range} {DoseWords.Schedule(Figure.TimesDaily)}";
    }

    /// <summary>The last accepted weight not older than the protocol's number of days, in kg.</summary>
    internal static decimal? Weight(PatientPicture picture, ClinicProtocol protocol) =>
        picture.Weights.LastOrDefault(reading => reading.Held is null && reading.Day <= picture.AsOf) is { } latest
        && protocol["carvedilol.weight-days"].IsMetBy(picture.AsOf.DayNumber - latest.Day.DayNumber)
            ? latest.Weight.Kilograms
            : null;

    /// <summary>By the eGFR at the start; by the first one after it when there is none before.</summary>
    private static DoseFigure? ByKidney(Medicine medicine, TitrationFacts facts)
    {
        if (medicine.ByKidney.IsEmpty)
        {
            return null;
        }

        var start = facts.Picture.DoseCourses.Where(course => Formulary.BuiltIn.Read(course.Medicine).Medicine == medicine).Select(course => course.From).FirstOrDefault();
        var known = facts.Series(LimitMeasure.Egfr);
        var egfr = (known.LastOrDefault(value => value.Day <= start) ?? known.FirstOrDefault())?.Value;
        return medicine.ByKidney.FirstOrDefault(entry => egfr >= entry.From && (entry.Below is null || egfr < entry.Below))?.Target;
    }
}
