using System.Collections.Immutable;

namespace HfClinic.Clinical.Calculations;

/// <summary>What came of a calculation: a result, or the reason why there is none; always with its inputs, formula and sources.</summary>
/// <param name="Formula">The formula with its sources.</param>
/// <param name="Inputs">Every input with its range, in the order of the formula.</param>
/// <param name="WhyNot">Why there is no result: "no LVOT diameter"; null when there is one.</param>
/// <param name="Shown">The result, rounded and with its unit; empty when there is none.</param>
public abstract record Computed(Formula Formula, ImmutableArray<Input> Inputs, string? WhyNot, string Shown)
{
    /// <summary>The day of the oldest dated input; null when no input is dated.</summary>
    public DateOnly? OldestDay => Inputs.Min(input => input.Day);

    /// <summary>For the screen: "62.8 mL" or "not computed: no LVOT diameter".</summary>
    public string Text => WhyNot is null ? Shown : $"not computed: {WhyNot}";
}

/// <inheritdoc cref="Computed"/>
/// <param name="Value">The unrounded result in the formula's unit; null when there is none. No value is ever put in its place.</param>
public sealed record Computed<T>(Formula Formula, ImmutableArray<Input> Inputs, T? Value, string? WhyNot, string Shown)
    : Computed(Formula, Inputs, WhyNot, Shown)
    where T : struct;
