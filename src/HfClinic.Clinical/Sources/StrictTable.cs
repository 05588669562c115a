using System.Collections.Immutable;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace HfClinic.Clinical.Sources;

/// <summary>
/// Reads a table of facts (a JSON array of rows) and refuses anything it does not know: an unknown, missing, empty or
/// repeated field stops the load, because a fact that is silently skipped is worse than a program that does not start.
/// </summary>
public static class StrictTable
{
    private static readonly JsonSerializerOptions Strict = new(JsonSerializerDefaults.Web)
    {
        PropertyNameCaseInsensitive = false,
        NumberHandling = JsonNumberHandling.Strict,
        UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
        RespectNullableAnnotations = true,
        RespectRequiredConstructorParameters = true,
        AllowDuplicateProperties = false,
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower, allowIntegerValues: false) },
    };

    /// <summary>The text of an embedded table.</summary>
    /// <param name="file">Its file name: "sources.json".</param>
    /// <exception cref="TableFaultException">There is no such table.</exception>
    public static string Text(string file)
    {
        using var stream = typeof(StrictTable).Assembly.GetManifestResourceStream($"tables/{file}")
            ?? throw new TableFaultException(file, 0, "the table is not embedded in the program");
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }

    /// <summary>Reads all rows and checks each.</summary>
    /// <param name="file">File name, for messages.</param>
    /// <param name="json">A JSON array of objects.</param>
    /// <param name="key">The row's key; must be unique and not blank.</param>
    /// <param name="whyRefused">What is wrong with a row, or null when nothing is.</param>
    /// <exception cref="TableFaultException">A row is not as it must be; rows count from 1.</exception>
    public static ImmutableArray<TRow> Read<TRow>(string file, string json, Func<TRow, string> key, Func<TRow, string?> whyRefused)
    {
        var rows = ImmutableArray.CreateBuilder<TRow>();
        var keys = new HashSet<string>(StringComparer.Ordinal);
        foreach (var element in Elements(file, json))
        {
            var number = rows.Count + 1;
            var row = ReadRow<TRow>(file, number, element);
            var reason = string.IsNullOrWhiteSpace(key(row)) ? "the key is blank"
                : !keys.Add(key(row)) ? $"the key '{key(row)}' is there twice"
                : whyRefused(row);
            if (reason is not null)
            {
                throw new TableFaultException(file, number, reason);
            }

            rows.Add(row);
        }

        return rows.ToImmutable();
    }

    private static List<JsonElement> Elements(string file, string json)
    {
        try
        {
            using var document = JsonDocument.Parse(json, new JsonDocumentOptions { AllowDuplicateProperties = true });
            return document.RootElement.ValueKind == JsonValueKind.Array
                ? [.. document.RootElement.EnumerateArray().Select(element => element.Clone())]
                : throw new TableFaultException(file, 0, "a table is an array of rows");
        }
        catch (JsonException fault)
        {
            throw new TableFaultException(file, 0, $"not JSON: {fault.Message}", fault);
        }
    }

    private static TRow ReadRow<TRow>(string file, int number, JsonElement element)
    {
        try
        {
            return JsonSerializer.Deserialize<TRow>(element.GetRawText(), Strict)
                ?? throw new TableFaultException(file, number, "the row is null");
        }
        catch (JsonException fault)
        {
            throw new TableFaultException(file, number, fault.Message, fault);
        }
    }
}
