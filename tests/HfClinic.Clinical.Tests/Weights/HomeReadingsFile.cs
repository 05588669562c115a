using System.Globalization;
using System.Text.Json;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>The good lines of the home-scale file, read just well enough for these tests.</summary>
internal static class HomeReadingsFile
{
    /// <summary>One line: its number in the file, counting from 1.</summary>
    public sealed record Line(int Number, string Clinic, DateTime LocalTime, Weight Weight);

    /// <summary>What must come of the lines that are not simply accepted.</summary>
    public static IReadOnlyDictionary<int, string> Expected { get; } = ReadExpected();

    /// <summary>The lines that are neither refused nor duplicates, in order of time within each patient.</summary>
    public static IReadOnlyList<Line> GoodLines() =>
    [
        .. File.ReadLines(At("home-readings.csv"))
            .Select((text, index) => (Text: text, Number: index + 1))
            .Skip(1)
            .Where(line => line.Text.Length > 0 && !IsDropped(line.Number))
            .Select(line => Parse(line.Number, line.Text.Split(';')))
            .OrderBy(line => line.LocalTime)
            .ThenBy(line => line.Number),
    ];

    public static IReadOnlyDictionary<string, Weight> Targets() => File.ReadLines(At("patients.csv"))
        .Skip(1)
        .Select(line => line.Split(','))
        .ToDictionary(fields => fields[0], fields => Weight.FromKilograms(decimal.Parse(fields[6], CultureInfo.InvariantCulture)));

    private static bool IsDropped(int number) =>
        Expected.TryGetValue(number, out string? outcome) && (outcome == "duplicate" || outcome.StartsWith("refused", StringComparison.Ordinal));

    private static Line Parse(int number, string[] fields)
    {
        decimal value = decimal.Parse(fields[2].Replace(',', '.'), CultureInfo.InvariantCulture);
        return new Line(
            number,
            fields[0].Trim(),
            DateTime.ParseExact(fields[1], "yyyy-MM-dd HH:mm:ss", CultureInfo.InvariantCulture),
            fields[3].Trim().ToLowerInvariant() == "lb" ? Weight.FromPounds(value) : Weight.FromKilograms(value));
    }

    private static Dictionary<int, string> ReadExpected()
    {
        using var document = JsonDocument.Parse(File.ReadAllText(At("expected.json")));
        return document.RootElement.GetProperty("lines").EnumerateObject()
            .ToDictionary(line => int.Parse(line.Name, CultureInfo.InvariantCulture), line => line.Value.GetString()!);
    }

    private static string At(string name) => Path.Combine(AppContext.BaseDirectory, "Files", "intake", name);
}
