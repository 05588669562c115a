using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;
using HfClinic.Clinical.Values;

namespace HfClinic.Records.Audit;

/// <summary>One value of a line of the record of access, in words.</summary>
/// <param name="Field">What it is: "Family name"; empty when the line is a sentence.</param>
/// <param name="Before">Null when there was none.</param>
/// <param name="After">Null when there is none.</param>
public sealed record AuditField(string Field, string? Before, string? After);

/// <summary>The values of a line of the record of access as a person reads them.</summary>
public static partial class AuditDetail
{
    private static readonly HashSet<string> NotShown = ["Id", "SearchText", "Version", "Hash", "EvidenceJson", "PatientId"];

    /// <summary>The values before and after, side by side, in the order of the line.</summary>
    /// <param name="unit">The unit weights are written in.</param>
    /// <param name="people">Names for the people a value points to; without one the identifier is shown.</param>
    public static IReadOnlyList<AuditField> Of(AuditEntry entry, WeightUnit unit, IReadOnlyDictionary<Guid, string>? people = null)
    {
        if (entry.Before is null && entry.After is { } sentence && !sentence.StartsWith('{'))
        {
            return [new("", null, sentence)];
        }

        var (before, after) = (Values(entry.Before), Values(entry.After));
        var isWeight = new[] { before, after }.Any(values => values.GetValueOrDefault("Kind").ValueKind == JsonValueKind.String
            && values["Kind"].GetString() == nameof(ReadingKind.Weight));
        return [.. before.Keys.Concat(after.Keys).Distinct()
            .Where(key => !NotShown.Contains(key) && !IsTheLinesOwn(key, after, entry.ByName))
            .Select(key => new AuditField(Words(key), Shown(before, key, isWeight, unit, people), Shown(after, key, isWeight, unit, people)))];
    }

    /// <summary>Who did it stands at the head of the line already.</summary>
    private static bool IsTheLinesOwn(string key, Dictionary<string, JsonElement> after, string byName) =>
        key.EndsWith("ById", StringComparison.Ordinal)
        || (key.EndsWith("ByName", StringComparison.Ordinal) && after.TryGetValue(key, out var name)
            && name.ValueKind == JsonValueKind.String && name.GetString() == byName);

    private static Dictionary<string, JsonElement> Values(string? json) => json is null
        ? []
        : JsonSerializer.Deserialize<Dictionary<string, JsonElement>>(json) ?? [];

    private static string Words(string key)
    {
        var words = WordStart().Replace(key, " $1").Trim().ToLowerInvariant();
        return Wording.Sentence(words.EndsWith(" id", StringComparison.Ordinal) ? words[..^3] : words == "grams" ? "weight" : words);
    }

    private static string? Shown(
        Dictionary<string, JsonElement> values, string key, bool isWeight, WeightUnit unit, IReadOnlyDictionary<Guid, string>? people)
    {
        if (!values.TryGetValue(key, out var value))
        {
            return null;
        }

        return value.ValueKind switch
        {
            JsonValueKind.Null => null,
            JsonValueKind.True => "yes",
            JsonValueKind.False => "no",
            JsonValueKind.Number when (key == "Grams" || (isWeight && key == "Value")) && value.TryGetInt32(out var grams) =>
                Wording.Weight(new Weight(grams), unit),
            JsonValueKind.String => value.TryGetGuid(out var id) && people?.GetValueOrDefault(id) is { } name ? name : Text(value.GetString()!),
            _ => value.GetRawText(),
        };
    }

    private static string Text(string text) =>
        DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var day) ? Wording.Day(day)
        : IsoTime().IsMatch(text) && DateTime.TryParse(text, CultureInfo.InvariantCulture, DateTimeStyles.RoundtripKind, out var time)
            ? time.ToString("dd MMM yyyy HH:mm 'UTC'", CultureInfo.InvariantCulture)
        : text;

    [GeneratedRegex("([A-Z])")]
    private static partial Regex WordStart();

    [GeneratedRegex(@"^\d{4}-\d\d-\d\dT\d\d:\d\d")]
    private static partial Regex IsoTime();
}
