using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>One quantity by several published methods that do not agree. The spread is the result; none of them is "the" value.</summary>
/// <param name="Methods">Each method with its own result or the reason why it has none. All give the same unit.</param>
public sealed record MethodRange(ImmutableArray<Computed<double>> Methods)
{
    /// <summary>The lowest result; null when no method gave one.</summary>
    public double? Lowest => Methods.Min(method => method.Value);

    /// <summary>The highest result; null when no method gave one.</summary>
    public double? Highest => Methods.Max(method => method.Value);

    /// <summary>"0.62 to 0.88 ng/mL (Koup and Jusko 0.62, Sheiner 0.79 and Nomura 0.88)", or why nothing could be computed.</summary>
    public string Text => Lowest is { } lowest && Highest is { } highest
        ? $"{Spread(lowest, highest)} ({Wording.List([.. Methods.Where(method => method.Value is not null).Select(Named)])})"
        : $"not computed: {string.Join("; ", Methods.Select(method => method.WhyNot).Distinct())}";

    private Formula Formula => Methods[0].Formula;

    private string Spread(double lowest, double highest)
    {
        var (from, to) = (Figures.Fixed(lowest, Formula.Decimals), Figures.Fixed(highest, Formula.Decimals));
        return from == to ? Figures.WithUnit(from, Formula.Unit) : $"{from} to {Figures.WithUnit(to, Formula.Unit)}";
    }

    private string Named(Computed<double> method) => $"{method.Formula.Method} {Figures.Fixed(method.Value!.Value, Formula.Decimals)}";
}
