using System.Globalization;
using System.Text.Json;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

public class WeightSummaryFileTests
{
    [Fact]
    public void Each_patient_comes_out_to_the_gram()
    {
        var patients = IntakeFiles.Patients();

        Assert.Equal(96, patients.Count);
        foreach (var (number, picture, expected) in patients)
        {
            var summary = WeightSummary.Of(picture);
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
    }

    private static void AssertFigure(string number, JsonElement expected, string name, int? actual)
    {
        var value = expected.GetProperty(name);
        Assert.Equal((number, name, value.ValueKind == JsonValueKind.Null ? null : value.GetInt32()), (number, name, actual));
    }
}
