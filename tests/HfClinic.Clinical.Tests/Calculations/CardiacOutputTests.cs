using CsCheck;
using HfClinic.Clinical.Calculations;

namespace HfClinic.Clinical.Tests.Calculations;

public class CardiacOutputTests
{
    private static readonly Gen<decimal> Diameter = Gen.Int[140, 299].Select(hundredths => hundredths / 100m);
    private static readonly Gen<decimal> Vti = Gen.Int[30, 399].Select(tenths => tenths / 10m);

    /// <summary>Doppler in the outflow tract: formula from memory, values computed in R.</summary>
    [Theory]
    [InlineData("2.0", "20", 62.832)]
    [InlineData("2.1", "14.5", 50.222)]
    public void Stroke_volume(string cm, string vti, double expected) => In.Check(expected, CardiacOutput.StrokeVolume(
        In.Cm(In.Number(cm)), In.Cm(In.Number(vti))), 3);

    /// <summary>Output = stroke volume × rate: common practice, no source.</summary>
    [Theory]
    [InlineData(62.5, 80, 5.000)]
    [InlineData(48, 72, 3.456)]
    public void Output(double volume, int rate, double expected) => In.Check(expected, CardiacOutput.PerMinute(volume, rate), 10);

    [Theory]
    [InlineData(5.0, 1.8181, 2.7501)]
    [InlineData(3.456, 2.0, 1.728)]
    public void Index(double output, double area, double expected) => In.Check(expected, CardiacOutput.PerSquareMetre(output, area), 4);

    /// <summary>Low below 2.2 L/min/m²: Stevenson and Perloff 1989.</summary>
    [Theory]
    [InlineData(2.19, true)]
    [InlineData(2.2, false)]
    [InlineData(2.21, false)]
    public void A_low_index_below_at_and_above_its_limit(double index, bool low) => Assert.Equal(low, CardiacOutput.IsLowIndex(index));

    /// <summary>Factor 80: haemodynamics texts (first line seen there, second computed).</summary>
    [Theory]
    [InlineData(95, 5, 5.0, 1440)]
    [InlineData(72, 14, 3.2, 1450)]
    public void Vascular_resistance(double mean, double venous, double output, double expected) =>
        In.Check(expected, CardiacOutput.VascularResistance(mean, venous, output), 9);

    /// <summary>First line seen in a haemodynamics text (output 5.0, area 1.7), second computed.</summary>
    [Theory]
    [InlineData(95, 5, 5.0 / 1.7, 2448)]
    [InlineData(72, 14, 2.0, 2320)]
    public void Vascular_resistance_index(double mean, double venous, double index, double expected) =>
        In.Check(expected, CardiacOutput.VascularResistanceIndex(mean, venous, index), 9);

    [Theory]
    [InlineData(9.9, 80)]
    [InlineData(200.1, 80)]
    [InlineData(60, 24)]
    [InlineData(60, 221)]
    public void Impossible_outputs_are_refused(double volume, double rate) => Assert.Contains("is outside", CardiacOutput.PerMinute(volume, rate).WhyNot);

    [Theory]
    [InlineData("2", "2.9")]
    [InlineData("2", "40.1")]
    [InlineData("1.39", "20")]
    [InlineData("3.01", "20")]
    public void Impossible_echo_measures_are_refused(string cm, string vti) => Assert.Contains("is outside", CardiacOutput.StrokeVolume(
        In.Cm(In.Number(cm)),
        In.Cm(In.Number(vti))).WhyNot);

    [Theory]
    [InlineData(0.99)]
    [InlineData(15.01)]
    public void Resistance_needs_an_output_of_1_to_15(double output) =>
        Assert.Contains("is outside 1 to 15 L/min", CardiacOutput.VascularResistance(90, 5, output).WhyNot);

    [Fact]
    public void Resistance_needs_a_fall_of_pressure() =>
        Assert.Equal("mean arterial pressure 30 mmHg is not above central venous pressure 30 mmHg", CardiacOutput.VascularResistance(30, 30, 4).WhyNot);

    [Fact]
    public void Stroke_volume_rises_with_the_velocity_time_integral() => Gen.Select(Diameter, Vti).Sample((cm, vti) =>
        In.Value(CardiacOutput.StrokeVolume(In.Cm(cm), In.Cm(vti + 0.1m))) > In.Value(CardiacOutput.StrokeVolume(In.Cm(cm), In.Cm(vti))));

    [Fact]
    public void Output_rises_with_rate_and_volume() => Gen.Select(Gen.Double[10, 199], Gen.Int[25, 219]).Sample((volume, rate) =>
        In.Value(CardiacOutput.PerMinute(volume + 1, rate)) > In.Value(CardiacOutput.PerMinute(volume, rate))
        && In.Value(CardiacOutput.PerMinute(volume, rate + 1)) > In.Value(CardiacOutput.PerMinute(volume, rate)));

    [Fact]
    public void Resistance_falls_as_output_rises() => Gen.Double[1, 14].Sample(output =>
        In.Value(CardiacOutput.VascularResistance(80, 8, output + 0.5)) < In.Value(CardiacOutput.VascularResistance(80, 8, output)));

    /// <summary>An error of the diameter counts twice (follows from the formula).</summary>
    [Fact]
    public void Stroke_volume_goes_with_the_square_of_the_diameter() => Gen.Select(Gen.Int[140, 150], Vti).Sample((hundredths, vti) => Assert.Equal(
        4 * In.Value(CardiacOutput.StrokeVolume(In.Cm(hundredths / 100m), In.Cm(vti))),
        In.Value(CardiacOutput.StrokeVolume(In.Cm(hundredths / 50m), In.Cm(vti))),
        8));
}
