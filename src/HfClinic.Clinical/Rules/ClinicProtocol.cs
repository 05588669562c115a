using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules;

/// <summary>The clinic's thresholds as of one version.</summary>
public sealed record ClinicProtocol
{
    /// <summary>0 for the built-in defaults, then counted up with each publication.</summary>
    public required int Version { get; init; }

    /// <summary>"ESC" or "AHA".</summary>
    public required string Profile { get; init; }

    public required ImmutableDictionary<string, Threshold> Thresholds { get; init; }

    /// <summary>The unit in which statements name weights.</summary>
    public WeightUnit WeightUnit { get; init; } = WeightUnit.Kilograms;

    /// <summary>The threshold of the given key.</summary>
    /// <exception cref="KeyNotFoundException">No such threshold: a fault in the program, not in the data.</exception>
    public Threshold this[string key] => Thresholds.TryGetValue(key, out var threshold)
        ? threshold
        : throw new KeyNotFoundException($"The protocol has no threshold '{key}'.");

    /// <summary>Why the change may not be made, in words for the person who asked for it; null when it may.</summary>
    public string? WhyRefused(ThresholdOverride change) => !Thresholds.TryGetValue(change.Key, out var threshold)
        ? $"There is no threshold '{change.Key}'"
        : change.Value is { } value ? threshold.WhyRefused(value) : null;

    /// <summary>The protocol with the changes made, under the same version number. Later changes win over earlier ones.</summary>
    /// <exception cref="ArgumentException">A change is refused; see <see cref="WhyRefused"/>. None is made.</exception>
    public ClinicProtocol With(IEnumerable<ThresholdOverride> changes)
    {
        var thresholds = Thresholds.ToBuilder();
        foreach (var change in changes)
        {
            if (WhyRefused(change) is { } reason)
            {
                throw new ArgumentException(reason, nameof(changes));
            }

            var threshold = thresholds[change.Key];
            thresholds[change.Key] = threshold with
            {
                Value = change.Value ?? threshold.Value,
                IsOn = change.IsOn ?? threshold.IsOn,
            };
        }

        return this with { Thresholds = thresholds.ToImmutable() };
    }
}
