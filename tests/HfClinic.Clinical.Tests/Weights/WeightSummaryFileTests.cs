using System.Globalization;
using System.Text.Json;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// A month of home weights of 96 invented patients, with what an independent reckoning makes of each to the gram
/// (Files/intake/expected.json).
/// </summary>
public class WeightSummaryFileTests
{
    private static readonly DateOnly AsOf = new(2026, 3, 31);

    [Fact]
    public void Each_patient_comes_out_to_the_gram()
    {
        using var expected = JsonDocument.Parse(File.ReadAllText(PathOf("expected.json")));
        var readings = Accepted(expected.RootElement.GetProperty("lines"));
        var patients = expected.RootElement.GetProperty("patients");

        Assert.Equal(96, patients.EnumerateObject().Count());
        foreach (var patient in patients.EnumerateObject())
        {
            var summary = WeightSummary.Of(new PatientPicture
            {
                AsOf = AsOf,
                EnrolledOn = AsOf.AddYears(-1),
                Weights = [.. readings[patient.Name]],
            });
            AssertFigures(patient.Name, patient.Value, summary);
        }
    }

    private static void AssertFigures(string number, JsonElement expected, WeightSummary summary)
    {
        Assert.Equal((number, expected.GetProperty("last_day").GetString()),
            (number, summary.Latest?.Day.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)));
        AssertFigure(number, expected, "last_g", summary.Latest?.Weight.Grams);
        AssertFigure(number, expected, "silent_days", summary.SilentDays);
        foreach (var days in (int[])[1, 3, 7])
        {
            AssertFigure(number, expected, $"gain_{days}d_g", summary.Gain(days)?.Difference.Grams);
            AssertFigure(number, expected, $"loss_{days}d_g", -summary.Loss(days)?.Difference.Grams);
        }
    }

    private static void AssertFigure(string number, JsonElement expected, string name, int? actual)
    {
        var value = expected.GetProperty(name);
        Assert.Equal((number, name, value.ValueKind == JsonValueKind.Null ? null : value.GetInt32()), (number, name, actual));
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
