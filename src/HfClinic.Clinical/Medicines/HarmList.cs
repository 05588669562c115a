using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>For whom a medicine may harm.</summary>
public enum HarmScope
{
    All,

    /// <summary>The present ejection fraction is 40 % or less.</summary>
    ReducedNow,

    /// <summary>HFrEF.</summary>
    Reduced,

    EgfrBelow30,
}

/// <summary>How a medicine of the harm list is flagged.</summary>
public enum HarmFlag
{
    None,
    Information,
    Review,
    Urgent,

    /// <summary>For review in the AHA profile, information in the ESC profile.</summary>
    ProfileAhaReview,
}

/// <summary>What one guideline says.</summary>
public sealed record HarmWord(string Text, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished;

/// <summary>A group of medicines that may harm in heart failure.</summary>
/// <param name="RaisedWith">What, taken or found together with it, makes it one level more urgent.</param>
public sealed record HarmfulMedicine(
    string Key,
    ImmutableArray<string> Medicines,
    HarmScope Scope,
    HarmFlag Flag,
    ImmutableArray<string> RaisedWith,
    string Words,
    HarmWord? Esc,
    HarmWord? Aha);

/// <summary>Medicines that may harm together or under a condition.</summary>
/// <param name="Together">One of each group; a group names medicines and medicine classes.</param>
/// <param name="Condition">The condition under which it counts; null for always.</param>
/// <param name="WithinHours">They count as together when less than this far apart; null when both are being taken.</param>
public sealed record HarmfulTogether(
    string Key,
    ImmutableArray<ImmutableArray<string>> Together,
    string? Condition,
    int? WithinHours,
    HarmFlag Flag,
    string Text,
    ImmutableArray<string> SourceKeys,
    Standing Standing) : IPublished;

/// <summary>The medicines that may harm in heart failure, as published.</summary>
public static class HarmList
{
    private const string SingleFile = "harm.json";

    private const string TogetherFile = "harm-together.json";

    /// <summary>Single medicines.</summary>
    public static ImmutableArray<HarmfulMedicine> All { get; } = Parse(StrictTable.Text(SingleFile), SourceTable.Load());

    /// <summary>Medicines together, and medicines under a condition.</summary>
    public static ImmutableArray<HarmfulTogether> Together { get; } = ParseTogether(StrictTable.Text(TogetherFile), SourceTable.Load());

    /// <summary>The row that names the medicine, or null.</summary>
    public static HarmfulMedicine? Find(string medicine) => All.FirstOrDefault(row => row.Medicines.Contains(medicine));

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<HarmfulMedicine> Parse(string json, SourceTable sources) =>
        StrictTable.Read<HarmfulMedicine>(SingleFile, json, row => row.Key, row =>
            row.Medicines.IsDefaultOrEmpty ? "no medicine is named"
            : row.Esc is null && row.Aha is null ? "no guideline speaks of it"
            : SourceCheck.WhyRefused(new IPublished?[] { row.Esc, row.Aha }.OfType<IPublished>(), sources));

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<HarmfulTogether> ParseTogether(string json, SourceTable sources) =>
        StrictTable.Read<HarmfulTogether>(TogetherFile, json, row => row.Key, row =>
            row.Together.IsDefaultOrEmpty || row.Together.Any(group => group.IsDefaultOrEmpty) ? "a group names no medicine"
            : row.Together.Length == 1 && row.Condition is null ? "one group alone needs a condition"
            : SourceCheck.WhyRefused(row.SourceKeys, sources));
}
