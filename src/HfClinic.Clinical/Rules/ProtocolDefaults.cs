using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Rules;

/// <summary>The thresholds a clinic starts with, from the embedded table.</summary>
public static class ProtocolDefaults
{
    private const string File = "protocol.json";

    private static readonly ImmutableHashSet<string> Units =
        ["g", "g/day", "kg", "%", "days", "hours", "mmHg", "beats/min", "mmol/L", "µmol/L", "ng/mL", "mL/min/1.73 m²", "sd"];

    /// <summary>Reads the embedded table as protocol version 0, profile ESC.</summary>
    /// <exception cref="TableFaultException">The table is faulty.</exception>
    public static ClinicProtocol Load() => Parse(StrictTable.Text(File), SourceTable.Load());

    /// <inheritdoc cref="Load"/>
    public static ClinicProtocol Parse(string json, SourceTable sources) => new()
    {
        Version = 0,
        Profile = "ESC",
        Thresholds = StrictTable.Read<Threshold>(File, json, row => row.Key, row => WhyRefused(row, sources))
            .ToImmutableDictionary(row => row.Key, StringComparer.Ordinal),
    };

    private static string? WhyRefused(Threshold row, SourceTable sources) =>
        string.IsNullOrWhiteSpace(row.Title) ? "the title is blank"
        : !Units.Contains(row.Unit) ? $"the unit '{row.Unit}' is not known"
        : row.SourceKeys.IsDefaultOrEmpty ? "no source is named"
        : row.SourceKeys.FirstOrDefault(key => !sources.Has(key)) is { } missing ? $"the source '{missing}' is not in the source table"
        : row.WhyRefused(row.Value);
}
