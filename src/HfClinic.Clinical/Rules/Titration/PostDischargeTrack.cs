using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// The weeks after a discharge in which RAS inhibitor, beta blocker and MRA are brought to target fast, if the clinic or the prescriber
/// has switched the track on. Source: STRONG-HF as told in the ESC focused update 2023; its safety indicators delay a step.
/// </summary>
public sealed record PostDischargeTrack(DateOnly DischargedOn, int Day, ImmutableArray<HoldReason> SafetyIndicators)
{
    private static readonly ImmutableArray<string> Sources = ["strong-hf-2022", "esc-2023-update"];

    private static readonly ImmutableArray<int> VisitWeeks = [1, 2, 3, 6];

    /// <summary>The track the patient is on, or null.</summary>
    internal static PostDischargeTrack? Of(TitrationFacts facts)
    {
        var picture = facts.Picture;
        if (picture.DischargedFromHospitalOn is not { } discharged || discharged > picture.AsOf)
        {
            return null;
        }

        var day = picture.AsOf.DayNumber - discharged.DayNumber;
        return facts.Protocol["titration.after-discharge.days"].IsMetBy(day)
            ? new(discharged, day, [.. Indicators(discharged, facts).OfType<HoldReason>()])
            : null;
    }

    /// <summary>Whether the class is brought to target on the track.</summary>
    public static bool Covers(TitrationClass titration) =>
        titration is TitrationClass.BetaBlocker or TitrationClass.RasInhibitor or TitrationClass.Mra;

    /// <summary>The next visit of the scheme on or after the picture's day: week and day; null when all are past.</summary>
    public (int Week, DateOnly On)? NextVisit => VisitWeeks
        .Select(week => ((int Week, DateOnly On)?)(week, DischargedOn.AddDays(week * 7)))
        .FirstOrDefault(visit => visit!.Value.On >= DischargedOn.AddDays(Day));

    /// <summary>Half of target is looked for after a week, full target on the overdue day.</summary>
    internal static (int Gap, int Overdue) Days(decimal? percent, ClinicProtocol protocol)
    {
        var full = (int)protocol["titration.after-discharge.full-days"].Value;
        return (percent is null or < 50 ? (int)protocol["titration.after-discharge.half-days"].Value : full, full);
    }

    private static IEnumerable<HoldReason?> Indicators(DateOnly discharged, TitrationFacts facts)
    {
        yield return Of(LimitMeasure.Egfr, "egfr.hold", facts);
        yield return Of(LimitMeasure.Potassium, "potassium.hold", facts);
        yield return Of(LimitMeasure.SystolicPressure, "pressure.hold-after-discharge", facts);
        yield return Of(LimitMeasure.HeartRate, "heart-rate.hold", facts);
        yield return Peptide(discharged, facts);
    }

    private static HoldReason? Of(LimitMeasure measure, string key, TitrationFacts facts) =>
        facts.Latest(measure) is { } latest && facts.Protocol[key].IsMetBy(latest.Value)
            ? new(LimitEffect.Hold, latest.Words, MeasuredHolds.LimitWords(measure, facts.Protocol[key]), "safety indicator of the track", latest.Day, latest.Id, Sources)
            : null;

    private static HoldReason? Peptide(DateOnly discharged, TitrationFacts facts)
    {
        var known = facts.Picture.BloodTests.Where(test => test.Analyte == "nt-probnp" && test.Day <= facts.Picture.AsOf).ToList();
        var before = known.LastOrDefault(test => test.Day <= discharged);
        var latest = known.LastOrDefault(test => test.Day > discharged);
        if (before is not { Value: > 0 } || latest is null)
        {
            return null;
        }

        var limit = facts.Protocol["nt-probnp.rise-after-discharge"];
        var rise = (latest.Value - before.Value) / before.Value * 100;
        return limit.IsMetBy(rise)
            ? new(
                LimitEffect.Hold,
                string.Create(CultureInfo.InvariantCulture, $"NT-proBNP {rise:0.#} % above the value before discharge on {Wording.Day(latest.Day)}"),
                string.Create(CultureInfo.InvariantCulture, $"above {limit.Value:0.#} %"),
                "safety indicator of the track",
                latest.Day,
                latest.Id,
                Sources)
            : null;
    }
}
