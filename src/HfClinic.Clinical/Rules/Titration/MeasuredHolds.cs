using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Holds read from measured values. Every limit that is met is told; of one measure only the gravest.</summary>
internal static class MeasuredHolds
{
    /// <summary>What holds a step of that class now, by values that are fresh enough to count.</summary>
    public static IEnumerable<HoldReason> Now(Candidate candidate, PatientPicture picture, ClinicProtocol protocol) =>
        Applicable(candidate, picture, protocol)
            .Select(limit => (Limit: limit, Value: Latest(limit.Measure, picture, protocol)))
            .Where(met => met.Value is not null && protocol[met.Limit.ThresholdKey].IsMetBy(met.Value.Value))
            .GroupBy(met => met.Limit.Measure)
            .Select(group => group.MaxBy(met => met.Limit.Effect))
            .Select(met => Reason(met.Limit, met.Value!, protocol));

    /// <summary>The last day on which a value that had met a limit no longer did; null when none ever cleared.</summary>
    public static DateOnly? LastCleared(Candidate candidate, PatientPicture picture, ClinicProtocol protocol)
    {
        DateOnly? cleared = null;
        foreach (var limit in Applicable(candidate, picture, protocol))
        {
            var wasMet = false;
            foreach (var value in Measured.Series(limit.Measure, picture, protocol))
            {
                var isMet = protocol[limit.ThresholdKey].IsMetBy(value.Value);
                cleared = wasMet && !isMet && !(value.Day < cleared) ? value.Day : cleared;
                wasMet = isMet;
            }
        }

        return cleared;
    }

    /// <summary>The latest value, or null when it is missing or too old to count.</summary>
    public static Measured? Latest(LimitMeasure measure, PatientPicture picture, ClinicProtocol protocol)
    {
        var key = measure is LimitMeasure.SystolicPressure or LimitMeasure.HeartRate ? "fresh.vitals-days" : "fresh.labs-days";
        return Measured.Series(measure, picture, protocol).LastOrDefault() is { } latest
            && protocol[key].IsMetBy(picture.AsOf.DayNumber - latest.Day.DayNumber) ? latest : null;
    }

    /// <summary>"above 5.0 mmol/L".</summary>
    public static string LimitWords(LimitMeasure measure, Threshold threshold) => threshold.Comparison switch
    {
        Comparison.Above => "above ",
        Comparison.AtLeast => "at or above ",
        Comparison.Below => "below ",
        _ => "at or below ",
    } + Measured.Amount(measure, threshold.Value);

    private static IEnumerable<ClassLimit> Applicable(Candidate candidate, PatientPicture picture, ClinicProtocol protocol) => ClassLimit.All
        .Where(limit => limit.IsFor(candidate.Class, candidate.Medicine, candidate.Starting, protocol.DoseProfile()))
        .Where(limit => limit.Rhythm == LimitRhythm.Any || picture.Rhythm?.What != Rhythm.AtrialFibrillation);

    private static HoldReason Reason(ClassLimit limit, Measured value, ClinicProtocol protocol) => new(
        limit.Effect,
        value.Words,
        LimitWords(limit.Measure, protocol[limit.ThresholdKey]),
        limit.Words,
        value.Day,
        value.Id,
        limit.SourceKeys);
}

/// <summary>A medicine or class for which a step is thought of.</summary>
/// <param name="Medicine">The generic name; null when only the class is known.</param>
/// <param name="Starting">Whether it would be started.</param>
internal sealed record Candidate(MedicineClass Class, string? Medicine, bool Starting);
