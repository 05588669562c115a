using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>What is missing or too old before a gap may be shown.</summary>
internal static class Freshness
{
    /// <summary>In words; empty when everything needed is there.</summary>
    public static ImmutableArray<string> Missing(TitrationClass titration, TitrationFacts facts) =>
        [.. GapChecks.For(titration).Where(need => !IsMet(need, facts)).Select(need => Words(need, facts))];

    private static bool IsMet(GapNeed need, TitrationFacts facts) => need switch
    {
        GapNeed.SystolicPressure => facts.Latest(LimitMeasure.SystolicPressure) is not null,
        GapNeed.HeartRate => facts.Latest(LimitMeasure.HeartRate) is not null,
        GapNeed.Rhythm => facts.Picture.Rhythm is not null,
        GapNeed.WeightOrCongestion => StatusDays(facts.Picture).Any(day => facts.IsFresh(day, "fresh.status-days")),
        GapNeed.Potassium => LabCounts(LimitMeasure.Potassium, facts),
        _ => LabCounts(LimitMeasure.Creatinine, facts) || LabCounts(LimitMeasure.Egfr, facts),
    };

    private static IEnumerable<DateOnly> StatusDays(PatientPicture picture) => picture.Weights
        .Where(weight => weight.Held is null).Select(weight => weight.Day)
        .Concat(picture.Congestion.Select(seen => seen.Day))
        .Where(day => day <= picture.AsOf);

    /// <summary>Fresh, and taken long enough after the last step of any RAS inhibitor or MRA.</summary>
    private static bool LabCounts(LimitMeasure measure, TitrationFacts facts) =>
        facts.Latest(measure) is { } latest
        && (facts.LastRasOrMraStep is not { } step || facts.Protocol["fresh.labs-after-step-days"].IsMetBy(latest.Day.DayNumber - step.DayNumber));

    private static string Words(GapNeed need, TitrationFacts facts)
    {
        var (vitals, labs, status) = (facts.Protocol["fresh.vitals-days"].Value, facts.Protocol["fresh.labs-days"].Value, facts.Protocol["fresh.status-days"].Value);
        return need switch
        {
            GapNeed.SystolicPressure => $"systolic pressure of the last {vitals:0} days",
            GapNeed.HeartRate => $"heart rate of the last {vitals:0} days",
            GapNeed.Rhythm => "rhythm",
            GapNeed.WeightOrCongestion => $"weight or congestion status of the last {status:0} days",
            GapNeed.Potassium => $"potassium {Lab(facts, labs)}",
            _ => $"creatinine or eGFR {Lab(facts, labs)}",
        };
    }

    private static string Lab(TitrationFacts facts, decimal days)
    {
        var after = facts.LastRasOrMraStep is { } step
            ? $", from {Values.Wording.Day(step.AddDays((int)facts.Protocol["fresh.labs-after-step-days"].Value))} on"
            : "";
        return $"of the last {days:0} days{after}";
    }
}
