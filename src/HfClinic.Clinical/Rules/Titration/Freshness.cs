using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>What is missing or too old before a gap may be shown.</summary>
internal static class Freshness
{
    private static readonly ImmutableArray<MedicineClass> StepClasses =
        [MedicineClass.AceInhibitor, MedicineClass.Arb, MedicineClass.Arni, MedicineClass.Mra];

    /// <summary>In words; empty when everything needed is there.</summary>
    public static ImmutableArray<string> Missing(TitrationClass titration, PatientPicture picture, ClinicProtocol protocol) =>
        [.. GapChecks.For(titration).Where(need => !IsMet(need, picture, protocol)).Select(need => Words(need, picture, protocol))];

    private static bool IsMet(GapNeed need, PatientPicture picture, ClinicProtocol protocol) => need switch
    {
        GapNeed.SystolicPressure => MeasuredHolds.Latest(LimitMeasure.SystolicPressure, picture, protocol) is not null,
        GapNeed.HeartRate => MeasuredHolds.Latest(LimitMeasure.HeartRate, picture, protocol) is not null,
        GapNeed.Rhythm => picture.Rhythm is not null,
        GapNeed.WeightOrCongestion => StatusDays(picture).Any(day => protocol["fresh.status-days"].IsMetBy(picture.AsOf.DayNumber - day.DayNumber)),
        GapNeed.Potassium => LabCounts(LimitMeasure.Potassium, picture, protocol),
        _ => LabCounts(LimitMeasure.Creatinine, picture, protocol) || LabCounts(LimitMeasure.Egfr, picture, protocol),
    };

    private static IEnumerable<DateOnly> StatusDays(PatientPicture picture) => picture.Weights
        .Where(weight => weight.Held is null).Select(weight => weight.Day)
        .Concat(picture.Congestion.Select(seen => seen.Day))
        .Where(day => day <= picture.AsOf);

    /// <summary>Fresh, and taken long enough after the last step of any RAS inhibitor or MRA.</summary>
    private static bool LabCounts(LimitMeasure measure, PatientPicture picture, ClinicProtocol protocol) =>
        MeasuredHolds.Latest(measure, picture, protocol) is { } latest
        && (LastStep(picture) is not { } step || protocol["fresh.labs-after-step-days"].IsMetBy(latest.Day.DayNumber - step.DayNumber));

    private static DateOnly? LastStep(PatientPicture picture) => TakenMedicine.Steps(picture, StepClasses).Cast<DateOnly?>().FirstOrDefault();

    private static string Words(GapNeed need, PatientPicture picture, ClinicProtocol protocol)
    {
        var (vitals, labs, status) = (protocol["fresh.vitals-days"].Value, protocol["fresh.labs-days"].Value, protocol["fresh.status-days"].Value);
        return need switch
        {
            GapNeed.SystolicPressure => $"systolic pressure of the last {vitals:0} days",
            GapNeed.HeartRate => $"heart rate of the last {vitals:0} days",
            GapNeed.Rhythm => "rhythm",
            GapNeed.WeightOrCongestion => $"weight or congestion status of the last {status:0} days",
            GapNeed.Potassium => $"potassium {Lab(picture, protocol, labs)}",
            _ => $"creatinine or eGFR {Lab(picture, protocol, labs)}",
        };
    }

    private static string Lab(PatientPicture picture, ClinicProtocol protocol, decimal days)
    {
        var after = LastStep(picture) is { } step
            ? $", from {Values.Wording.Day(step.AddDays((int)protocol["fresh.labs-after-step-days"].Value))} on"
            : "";
        return $"of the last {days:0} days{after}";
    }
}
