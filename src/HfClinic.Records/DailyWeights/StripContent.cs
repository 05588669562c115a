using HfClinic.Clinical.Picture;
using HfClinic.Records.Flags;

namespace HfClinic.Records.DailyWeights;

/// <summary>A change of loop diuretic: what it became, in words.</summary>
public sealed record DiureticStep(DateOnly Day, string Words);

/// <summary>What is on record of one patient for the days of a weight strip.</summary>
/// <param name="Days">The weight that stands for each day that has one.</param>
/// <param name="Held">Readings set aside.</param>
/// <param name="Targets">The target that held when the strip begins, and the later ones.</param>
/// <param name="Trend">The filtered line as stored by the last assessment; it reaches back <see cref="TrendLine.Days"/> days.</param>
public sealed record StripContent(
    IReadOnlyList<WeightReading> Days,
    IReadOnlyList<WeightReading> Held,
    IReadOnlyList<TargetWeight> Targets,
    IReadOnlyList<TrendPoint> Trend,
    IReadOnlyList<DiureticStep> Diuretics);
