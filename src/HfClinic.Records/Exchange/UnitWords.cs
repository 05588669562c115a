using System.Collections.Frozen;
using HfClinic.Clinical.Values;

namespace HfClinic.Records.Exchange;

/// <summary>The ways in which files write kilograms and pounds. Stones are not among them: they come as two numbers.</summary>
internal static class UnitWords
{
    private static readonly FrozenDictionary<string, WeightUnit> Known = new Dictionary<string, WeightUnit>
    {
        ["kg"] = WeightUnit.Kilograms,
        ["kgs"] = WeightUnit.Kilograms,
        ["kilo"] = WeightUnit.Kilograms,
        ["kilos"] = WeightUnit.Kilograms,
        ["kilogram"] = WeightUnit.Kilograms,
        ["kilograms"] = WeightUnit.Kilograms,
        ["kilogramme"] = WeightUnit.Kilograms,
        ["kilogrammes"] = WeightUnit.Kilograms,
        ["lb"] = WeightUnit.Pounds,
        ["lbs"] = WeightUnit.Pounds,
        ["pound"] = WeightUnit.Pounds,
        ["pounds"] = WeightUnit.Pounds,
    }.ToFrozenDictionary(StringComparer.OrdinalIgnoreCase);

    /// <summary>The unit, or null when the word is not known.</summary>
    public static WeightUnit? Read(string text) => Known.TryGetValue(text.Trim().TrimEnd('.'), out var unit) ? unit : null;
}
