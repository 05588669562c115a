using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>What a medicine does to digoxin.</summary>
public enum DigoxinDirection
{
    Up,
    Down,

    /// <summary>The same level is more toxic.</summary>
    SameLevelMoreToxic,

    AdditiveBradycardia,
    ClearanceFalls,
}

/// <summary>The label's groups of advice.</summary>
public enum DigoxinGroup
{
    /// <summary>A rise of more than 50 %: measured before, lowered by about 30 to 50 %, watched (label, from memory).</summary>
    A,

    /// <summary>A smaller rise: measured before, lowered by about 15 to 30 %, watched (label, from memory).</summary>
    B,

    /// <summary>Measured and watched.</summary>
    Measure,

    /// <summary>Less is absorbed: doses taken apart, measured.</summary>
    Absorption,
}

/// <summary>What a published percentage speaks of.</summary>
public enum DigoxinMeasure
{
    /// <summary>Serum concentration.</summary>
    Level,

    /// <summary>Area under the curve.</summary>
    Exposure,
}

/// <summary>Medicines that act on digoxin in one way. The program never states a new dose of digoxin.</summary>
/// <param name="PercentLow">Change in percent, lower end; null when its size is unclear.</param>
/// <param name="AlsoWatch">What is watched besides the level.</param>
public sealed record DigoxinInteraction(
    string Key,
    ImmutableArray<string> Medicines,
    DigoxinDirection Direction,
    DigoxinGroup Group,
    decimal? PercentLow,
    decimal? PercentHigh,
    DigoxinMeasure? Measure,
    string Text,
    string? AlsoWatch,
    ImmutableArray<string> SourceKeys,
    Standing Standing) : IPublished
{
    private const string File = "digoxin-interactions.json";

    /// <summary>The table built into the program.</summary>
    public static ImmutableArray<DigoxinInteraction> All { get; } = Parse(StrictTable.Text(File), SourceTable.Load());

    /// <summary>Every row that names the medicine; a medicine may act in several ways.</summary>
    public static IEnumerable<DigoxinInteraction> Of(string medicine) => All.Where(row => row.Medicines.Contains(medicine));

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<DigoxinInteraction> Parse(string json, SourceTable sources) =>
        StrictTable.Read<DigoxinInteraction>(File, json, row => row.Key, row =>
            row.Medicines.IsDefaultOrEmpty ? "no medicine is named"
            : row.PercentHigh < row.PercentLow || row.PercentLow is null != row.PercentHigh is null ? "the percentages do not make a range"
            : row.Group is DigoxinGroup.A or DigoxinGroup.B && row.PercentLow is null ? "the group goes by a percentage and none is given"
            : SourceCheck.WhyRefused(row.SourceKeys, sources));
}
