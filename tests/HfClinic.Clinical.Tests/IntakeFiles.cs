using System.Globalization;
using System.Text.Json;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests;

/// <summary>
/// Two months of home weights of 96 invented patients, with what an independent reckoning makes of each to the gram
/// (Files/intake).
/// </summary>
internal static class IntakeFiles
{
    private static readonly DateOnly AsOf = new(2026, 3, 31);

    /// <summary>Each patient's accepted weights as a picture, beside the figures expected of it.</summary>
    public static IReadOnlyList<(string Number, PatientPicture Picture, JsonElement Expected)> Patients()
    {
        using var expected = JsonDocument.Parse(File.ReadAllText(PathOf("expected.json")));
        var readings = Accepted(expected.RootElement.GetProperty("lines"));
        return
        [
            .. expected.RootElement.GetProperty("patients").EnumerateObject().Select(patient => (
                patient.Name,
                new PatientPicture
                {
                    AsOf = AsOf,
                    EnrolledOn = AsOf.AddYears(-1),
                    WeighsAtHome = true,
                    Weights = [.. readings[patient.Name].OrderBy(reading => reading.LocalTime)],
                },
                patient.Value.Clone())),
        ];
    }

    private static ILookup<string, WeightReading> Accepted(JsonElement verdicts) => File
        .ReadAllLines(PathOf("home-readings.csv"))
        .Select((line, index) => (Number: index + 1, Cells: line.Split(';')))
        .Where(row => row.Number > 1 && row.Cells.Length > 3)
        .Where(row => !verdicts.TryGetProperty(row.Number.ToString(CultureInfo.InvariantCulture), out var verdict)
            || verdict.GetString() == "later")
        .ToLookup(row => row.Cells[0].Trim(), row => new WeightReading(
            row.Number,
            DateTime.ParseExact(row.Cells[1], "yyyy-MM-dd HH:mm:ss", CultureInfo.InvariantCulture),
            WeightOf(row.Cells[2], row.Cells[3])));

    private static Weight WeightOf(string number, string unit)
    {
        var value = decimal.Parse(number.Replace(',', '.'), CultureInfo.InvariantCulture);
        return unit.Equals("lb", StringComparison.OrdinalIgnoreCase) ? Weight.FromPounds(value) : Weight.FromKilograms(value);
    }

    private static string PathOf(string file) => Path.Combine(AppContext.BaseDirectory, "Files", "intake", file);
}
