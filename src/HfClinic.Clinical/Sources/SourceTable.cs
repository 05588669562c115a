using System.Collections.Immutable;

namespace HfClinic.Clinical.Sources;

/// <summary>Every source that rules and tables refer to, by key.</summary>
public sealed class SourceTable
{
    private const string File = "sources.json";

    private readonly ImmutableDictionary<string, Source> _byKey;

    private SourceTable(ImmutableArray<Source> all)
    {
        All = all;
        _byKey = all.ToImmutableDictionary(source => source.Key, StringComparer.Ordinal);
    }

    /// <summary>In the order of the file.</summary>
    public ImmutableArray<Source> All { get; }

    /// <summary>The source of the given key.</summary>
    /// <exception cref="KeyNotFoundException">No such source: a fault in the program, not in the data.</exception>
    public Source this[string key] => _byKey.TryGetValue(key, out var source)
        ? source
        : throw new KeyNotFoundException($"The source table has no '{key}'.");

    public bool Has(string key) => _byKey.ContainsKey(key);

    /// <summary>Reads the embedded table.</summary>
    /// <exception cref="TableFaultException">The table is faulty.</exception>
    public static SourceTable Load() => Parse(StrictTable.Text(File));

    /// <inheritdoc cref="Load"/>
    public static SourceTable Parse(string json) => new(StrictTable.Read<Source>(File, json, source => source.Key, WhyRefused));

    private static string? WhyRefused(Source source) =>
        string.IsNullOrWhiteSpace(source.Title) ? "the title is blank"
        : string.IsNullOrWhiteSpace(source.Where) ? "where to find it is blank"
        : source.Year is < 1900 or > 2100 ? $"{source.Year} is not a year of publication"
        : null;
}
