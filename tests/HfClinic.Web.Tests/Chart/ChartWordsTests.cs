using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;
using HfClinic.Web.Chart;

namespace HfClinic.Web.Tests.Chart;

public class ChartWordsTests
{
    [Theory]
    [InlineData("nt-probnp", "NT-proBNP")]
    [InlineData("tsat", "TSAT")]
    [InlineData("digoxin-level", "Digoxin level")]
    [InlineData("potassium", "Potassium")]
    public void Names_a_blood_test_as_laboratories_print_it(string key, string words) => Assert.Equal(words, ChartWords.Analyte(key));

    [Theory]
    [InlineData(ReadingKind.Weight, 74_600, WeightUnit.Kilograms, "74.6 kg")]
    [InlineData(ReadingKind.Weight, 74_616, WeightUnit.Pounds, "164.5 lb")]
    [InlineData(ReadingKind.SystolicPressure, 118, WeightUnit.Kilograms, "118 mmHg")]
    [InlineData(ReadingKind.HeartRate, 72, WeightUnit.Kilograms, "72 per minute")]
    [InlineData(ReadingKind.OxygenSaturation, 96, WeightUnit.Kilograms, "96 %")]
    public void Writes_a_value_with_its_unit(ReadingKind kind, int value, WeightUnit unit, string words) =>
        Assert.Equal(words, ChartWords.Value(kind, value, unit));

    [Theory]
    [InlineData("weight.gain-3-days", "more than 2.0 kg")]
    [InlineData("silence.days", "at least 5 days")]
    [InlineData("pressure.low-systolic", "below 90 mmHg")]
    [InlineData("symptoms.days", "at most 3 days")]
    public void Says_on_which_side_of_a_threshold_a_flag_is_raised(string key, string words)
    {
        var threshold = ProtocolDefaults.Load()[key];
        Assert.Equal(words, ChartWords.Limit(threshold, threshold.Value, WeightUnit.Kilograms));
    }

    [Fact]
    public void Says_how_a_reading_stands()
    {
        Reading Of(ReadingState state, long? corrects = null) => new()
        {
            Kind = ReadingKind.Weight,
            Value = 155_000,
            State = state,
            SupersedesId = corrects,
            HoldReason = HoldReason.PoundsTakenAsKilograms,
        };
        Assert.Equal("held: 155.0 kg looks like pounds", ChartWords.State(Of(ReadingState.Held), WeightUnit.Kilograms));
        Assert.Equal("struck out", ChartWords.State(Of(ReadingState.StruckOut), WeightUnit.Kilograms));
        Assert.Equal("corrected", ChartWords.State(Of(ReadingState.Superseded), WeightUnit.Kilograms));
        Assert.Equal("correction", ChartWords.State(Of(ReadingState.Accepted, 7), WeightUnit.Kilograms));
        Assert.Equal("", ChartWords.State(Of(ReadingState.Accepted), WeightUnit.Kilograms));
    }

    [Fact]
    public void Names_sources_by_title() =>
        Assert.Equal(["Default of this program, for the clinic to sign off", "no-such"], ChartWords.SourceTitles("clinic-default no-such"));
}
