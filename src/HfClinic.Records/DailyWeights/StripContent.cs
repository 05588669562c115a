using HfClinic.Clinical.Picture;

namespace HfClinic.Records.DailyWeights;

/// <summary>A change of loop diuretic: what it became, in words.</summary>
public sealed record DiureticStep(DateOnly Day, string Words);

/// <summary>The filtered weight at the end of a day: body mass and fluid without the scatter of weighing.</summary>
public sealed record TrendStep(DateOnly Day, double Grams);

/// <summary>What is on record of one patient for the days of a weight strip.</summary>
/// <param name="Days">The weight that stands for each day that has one.</param>
/// <param name="Held">Readings set aside.</param>
/// <param name="Targets">The target that held when the strip begins, and the later ones.</param>
public sealed record StripContent(
    IReadOnlyList<WeightReading> Days,
    IReadOnlyList<WeightReading> Held,
    IReadOnlyList<TargetWeight> Targets,
    IReadOnlyList<TrendStep> Trend,
    IReadOnlyList<DiureticStep> Diuretics);
