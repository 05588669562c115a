using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>
/// What a class of medicine does to the circulation: −1 lowers, +1 raises, 0 little or mixed. Textbook pharmacology of chronic oral
/// use, from memory; for display only, no flag is derived from it.
/// </summary>
/// <param name="Key">The medicine class in table spelling, or a group with its own names.</param>
/// <param name="Medicines">Names of the group; empty when the class says it.</param>
public sealed record HaemodynamicEffect(
    string Key,
    string Words,
    int Preload,
    int Afterload,
    int Contractility,
    int HeartRate,
    int OxygenDemand,
    string? Note,
    ImmutableArray<string> Medicines,
    ImmutableArray<string> SourceKeys,
    Standing Standing) : IPublished
{
    private const string File = "haemodynamic-effects.json";

    /// <summary>The table built into the program.</summary>
    public static ImmutableArray<HaemodynamicEffect> All { get; } = Parse(StrictTable.Text(File), SourceTable.Load());

    /// <summary>The effect of a medicine as recorded: by its own name first, then by its class; null when the table has none.</summary>
    public static HaemodynamicEffect? Of(string medicine)
    {
        var match = Formulary.BuiltIn.Read(medicine);
        var name = match.Candidates.IsEmpty ? medicine : match.Candidates[0].Name;
        return All.FirstOrDefault(row => row.Medicines.Contains(name))
            ?? (match.Class is { } found ? All.FirstOrDefault(row => row.Key.Replace("-", "", StringComparison.Ordinal)
                .Equals(found.ToString(), StringComparison.OrdinalIgnoreCase)) : null);
    }

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<HaemodynamicEffect> Parse(string json, SourceTable sources) =>
        StrictTable.Read<HaemodynamicEffect>(File, json, row => row.Key, row =>
            new[] { row.Preload, row.Afterload, row.Contractility, row.HeartRate, row.OxygenDemand }.Any(effect => effect is < -1 or > 1)
                ? "an effect is not −1, 0 or +1"
                : SourceCheck.WhyRefused(row.SourceKeys, sources));
}
