using System.Collections.Immutable;

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
/// <param name="Unit">g, %, days, mmHg …</param>
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
}

/// <summary>How well a figure is confirmed.</summary>
public enum Standing
{
    /// <summary>Read in the source's own text.</summary>
    Confirmed,

    /// <summary>Seen quoted in another publication.</summary>
    SecondHand,

    /// <summary>From memory: a clinician must sign it off.</summary>
    Unconfirmed,

    /// <summary>An engineering or clinic default, to be signed off by the clinic.</summary>
    ClinicDefault,
}

/// <summary>The clinic's thresholds as of one version.</summary>
public sealed record ClinicProtocol
{
    /// <summary>0 for the built-in defaults, then counted up with each publication.</summary>
    public required int Version { get; init; }

    /// <summary>"ESC" or "AHA".</summary>
    public required string Profile { get; init; }

    public required ImmutableDictionary<string, Threshold> Thresholds { get; init; }

    /// <summary>The threshold of the given key.</summary>
    /// <exception cref="KeyNotFoundException">No such threshold: a fault in the program, not in the data.</exception>
    public Threshold this[string key] => Thresholds.TryGetValue(key, out var threshold)
        ? threshold
        : throw new KeyNotFoundException($"The protocol has no threshold '{key}'.");
}
