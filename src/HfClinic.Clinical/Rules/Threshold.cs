using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Rules;

/// <summary>Which side of a limit counts.</summary>
public enum Comparison
{
    Above,
    AtLeast,
    Below,
    AtMost,
}

/// <summary>One threshold of the clinic.</summary>
/// <param name="Key">Stable key: "weight.gain-3-days".</param>
/// <param name="Title">Its name on screen.</param>
/// <param name="Value">In <paramref name="Unit"/>.</param>
/// <param name="Unit">One of the units known to <see cref="ProtocolDefaults"/>: g, %, days, mmHg, mmol/L …; "sd" is standard deviations.</param>
/// <param name="Comparison">How a measured value is compared with it.</param>
/// <param name="IsOn">Whether the clinic uses it.</param>
/// <param name="Lowest">Lower end of the range a clinic may set.</param>
/// <param name="Highest">Upper end of the range a clinic may set.</param>
/// <param name="SourceKeys">Keys into the source table.</param>
/// <param name="Standing">How well the figure is confirmed.</param>
public sealed record Threshold(
    string Key,
    string Title,
    decimal Value,
    string Unit,
    Comparison Comparison,
    bool IsOn,
    decimal Lowest,
    decimal Highest,
    ImmutableArray<string> SourceKeys,
    Standing Standing)
{
    /// <summary>Whether the measured value, in the same unit, meets the threshold. False when it is switched off.</summary>
    public bool IsMetBy(decimal measured) => IsOn && Comparison switch
    {
        Comparison.Above => measured > Value,
        Comparison.AtLeast => measured >= Value,
        Comparison.Below => measured < Value,
        _ => measured <= Value,
    };

    /// <summary>Why the value may not be set here, in words for the person who typed it; null when it may.</summary>
    public string? WhyRefused(decimal value) => value >= Lowest && value <= Highest
        ? null
        : string.Create(CultureInfo.InvariantCulture, $"{Title}: {value} {Unit} is outside {Lowest} to {Highest} {Unit}");
}
