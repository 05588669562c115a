using CsCheck;
using HfClinic.Clinical.Calculations;

namespace HfClinic.Clinical.Tests.Calculations;

public class HaemodynamicsTests
{
    private static readonly Gen<(int Systolic, int Diastolic)> Cuff = Gen.Int[20, 160].SelectMany(diastolic =>
        Gen.Int[Math.Max(50, diastolic + 1), 260].Select(systolic => (systolic, diastolic)));

    /// <summary>Mean = (systolic + 2 × diastolic) / 3: common practice, no source.</summary>
    [Theory]
    [InlineData(120, 80, 93.33)]
    [InlineData(140, 90, 106.67)]
    public void Mean_pressure(int systolic, int diastolic, double expected) => In.Check(expected, Haemodynamics.MeanArterialPressure(systolic, diastolic), 2);

    /// <summary>Stevenson and Perloff, JAMA 1989;261:884.</summary>
    [Theory]
    [InlineData(100, 78, 22, 0.220, true)]
    [InlineData(120, 80, 40, 0.333, false)]
    public void Proportional_pulse_pressure(int systolic, int diastolic, double pulse, double proportion, bool low)
    {
        In.Check(pulse, Haemodynamics.PulsePressure(systolic, diastolic), 10);
        In.Check(proportion, Haemodynamics.ProportionalPulsePressure(systolic, diastolic), 3);
        Assert.Equal(low, Haemodynamics.IsLowProportion(In.Value(Haemodynamics.ProportionalPulsePressure(systolic, diastolic))));
    }

    /// <summary>"Below 25 %" is strict: 25 of 100 is not low.</summary>
    [Theory]
    [InlineData(100, 76, true)]
    [InlineData(100, 75, false)]
    [InlineData(100, 74, false)]
    public void A_low_proportion_below_at_and_above_a_quarter(int systolic, int diastolic, bool low) => Assert.Equal(
        low, Haemodynamics.IsLowProportion(In.Value(Haemodynamics.ProportionalPulsePressure(systolic, diastolic))));

    [Fact]
    public void A_quarter_is_never_low() => Gen.Int[13, 65].Sample(quarter => !Haemodynamics.IsLowProportion(
        In.Value(Haemodynamics.ProportionalPulsePressure(4 * quarter, Math.Min(160, 3 * quarter)))));

    /// <summary>Rate × systolic, from memory.</summary>
    [Theory]
    [InlineData(72, 120, 8640)]
    [InlineData(98, 104, 10192)]
    public void Rate_pressure_product(int rate, int systolic, double expected) => In.Check(expected, Haemodynamics.RatePressureProduct(rate, systolic), 10);

    [Theory]
    [InlineData(80, 90, "systolic pressure 80 mmHg is not above diastolic pressure 90 mmHg")]
    [InlineData(90, 90, "systolic pressure 90 mmHg is not above diastolic pressure 90 mmHg")]
    [InlineData(49, 30, "systolic pressure 49 mmHg is outside 50 to 260 mmHg")]
    [InlineData(261, 90, "systolic pressure 261 mmHg is outside 50 to 260 mmHg")]
    [InlineData(120, 19, "diastolic pressure 19 mmHg is outside 20 to 160 mmHg")]
    [InlineData(220, 161, "diastolic pressure 161 mmHg is outside 20 to 160 mmHg")]
    public void Impossible_pressures_are_refused(int systolic, int diastolic, string whyNot)
    {
        Assert.Equal(whyNot, Haemodynamics.MeanArterialPressure(systolic, diastolic).WhyNot);
        Assert.Equal(whyNot, Haemodynamics.PulsePressure(systolic, diastolic).WhyNot);
        Assert.Equal(whyNot, Haemodynamics.ProportionalPulsePressure(systolic, diastolic).WhyNot);
    }

    [Fact]
    public void The_mean_lies_between_diastolic_and_systolic() => Cuff.Sample((systolic, diastolic) =>
        In.Value(Haemodynamics.MeanArterialPressure(systolic, diastolic)) is var mean && mean > diastolic && mean < systolic);
}
