using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>One published formula: what it gives, how, and where it comes from.</summary>
/// <param name="Name">What it gives: "stroke volume".</param>
/// <param name="Unit">Unit of the result; empty for a ratio or a class.</param>
/// <param name="Decimals">Decimals to show; the value itself is not rounded.</param>
/// <param name="InWords">The formula as a reader would check it by hand.</param>
/// <param name="SourceKeys">Keys into the source table.</param>
public sealed record Formula(string Name, string Unit, int Decimals, string InWords, ImmutableArray<string> SourceKeys)
{
    /// <summary>The author's name where several formulas give the same thing: "Mosteller"; else empty.</summary>
    public string Method { get; init; } = "";

    /// <summary>Where the formula should not be trusted; empty when nothing is known.</summary>
    public string Caution { get; init; } = "";

    /// <summary>A number from inputs that can all be used and do not contradict each other; else the reason.</summary>
    internal Computed<double> Compute(ImmutableArray<Input> inputs, Func<double> value, Func<string?>? conflict = null) =>
        Compute(inputs, value, number => Figures.WithUnit(Figures.Fixed(number, Decimals), Unit), conflict);

    /// <summary>As the other, for a result that is no plain number.</summary>
    /// <param name="inputs">All inputs, also those the result can do without.</param>
    /// <param name="value">Called only when every input can be used.</param>
    /// <param name="words">The result as shown.</param>
    /// <param name="conflict">Why the inputs cannot all be true, or null. Called only when every input can be used.</param>
    internal Computed<T> Compute<T>(ImmutableArray<Input> inputs, Func<T> value, Func<T, string> words, Func<string?>? conflict = null)
        where T : struct
    {
        string[] reasons = [.. inputs.Select(input => input.WhyNot).OfType<string>().Distinct()];
        if ((reasons.Length > 0 ? Wording.List(reasons) : conflict?.Invoke()) is { } whyNot)
        {
            return new Computed<T>(this, inputs, null, whyNot, "");
        }

        var result = value();
        return new Computed<T>(this, inputs, result, null, words(result));
    }

    /// <summary>The sum of the points of all inputs.</summary>
    internal Computed<int> Score(ImmutableArray<Input> inputs) =>
        Compute(inputs, () => inputs.Sum(input => input.Points ?? 0), sum => Wording.Count(sum, "point", "points"));
}
