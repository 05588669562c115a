using System.Collections.Immutable;

namespace HfClinic.Web.Ui;

/// <summary>Everything a weight strip draws, all in grams and clinic days. Order does not matter.</summary>
public sealed record WeightStripData
{
    public required DateOnly From { get; init; }

    /// <summary>Last day shown, included.</summary>
    public required DateOnly To { get; init; }

    /// <summary>Days before this are not counted as missing: the person was not yet expected to weigh. Null: the whole strip.</summary>
    public DateOnly? ExpectedFrom { get; init; }

    /// <summary>Last day a weight is expected; a day still running is not missing. Null: the whole strip.</summary>
    public DateOnly? ExpectedTo { get; init; }

    public ImmutableArray<StripReading> Readings { get; init; } = [];

    public ImmutableArray<StripTarget> Targets { get; init; } = [];

    public ImmutableArray<StripTrendPoint> Trend { get; init; } = [];

    public ImmutableArray<StripChange> DiureticChanges { get; init; } = [];
}

/// <summary>One weight of one day.</summary>
/// <param name="Grams">As recorded.</param>
/// <param name="Raised">Whether it is evidence that raised an open flag.</param>
/// <param name="Held">Whether it is set aside to be checked, so that nothing was computed from it.</param>
public sealed record StripReading(DateOnly Day, int Grams, bool Raised = false, bool Held = false);

/// <summary>A target weight and the day it began to hold; it holds until the next.</summary>
public sealed record StripTarget(DateOnly From, int Grams);

/// <summary>The filtered weight of a day, with its band of doubt when there is one.</summary>
public sealed record StripTrendPoint(DateOnly Day, double Grams, double? LowGrams = null, double? HighGrams = null);

/// <summary>A change of a loop diuretic in words: "furosemide 80 → 40 mg daily".</summary>
public sealed record StripChange(DateOnly Day, string What);
