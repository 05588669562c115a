using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Holds read from measured values. Every limit that is met is told; of one measure only the gravest.</summary>
internal static class MeasuredHolds
{
    /// <summary>What holds a step of that class now, by values that are fresh enough to count.</summary>
    public static IEnumerable<HoldReason> Now(Candidate candidate, TitrationFacts facts) =>
        Applicable(candidate, facts)
            .Select(limit => (Limit: limit, Value: facts.Latest(limit.Measure)))
            .Where(met => met.Value is not null && facts.Protocol[met.Limit.ThresholdKey].IsMetBy(met.Value.Value))
            .GroupBy(met => met.Limit.Measure)
            .Select(group => group.MaxBy(met => met.Limit.Effect))
            .Select(met => Reason(met.Limit, met.Value!, facts.Protocol));

    /// <summary>The last day on which a value that had met a limit no longer did; null when none has cleared since the given day.</summary>
    public static DateOnly? LastCleared(Candidate candidate, TitrationFacts facts, DateOnly since) => Applicable(candidate, facts)
        .Select(limit => Cleared(facts.Series(limit.Measure), facts.Protocol[limit.ThresholdKey], since))
        .Max();

    /// <summary>The day of the value after the last one that met the limit; a value before the given day can still have cleared after it.</summary>
    private static DateOnly? Cleared(ImmutableArray<Measured> series, Threshold limit, DateOnly since)
    {
        DateOnly? after = null;
        for (var at = series.Length - 1; at >= 0 && !(after < since); at--)
        {
            if (limit.IsMetBy(series[at].Value))
            {
                return after;
            }

            after = series[at].Day;
        }

        return null;
    }

    /// <summary>"above 5.0 mmol/L".</summary>
    public static string LimitWords(LimitMeasure measure, Threshold threshold) => threshold.Comparison switch
    {
        Comparison.Above => "above ",
        Comparison.AtLeast => "at or above ",
        Comparison.Below => "below ",
        _ => "at or below ",
    } + Measured.Amount(measure, threshold.Value);

    private static IEnumerable<ClassLimit> Applicable(Candidate candidate, TitrationFacts facts) => ClassLimit.All
        .Where(limit => limit.IsFor(candidate.Class, candidate.Medicine, candidate.Starting, facts.Protocol.DoseProfile()))
        .Where(limit => limit.Rhythm == LimitRhythm.Any || facts.Picture.Rhythm?.What != Rhythm.AtrialFibrillation);

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
