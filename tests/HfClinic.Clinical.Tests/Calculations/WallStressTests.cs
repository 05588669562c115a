using CsCheck;
using HfClinic.Clinical.Calculations;

namespace HfClinic.Clinical.Tests.Calculations;

public class WallStressTests
{
    /// <summary>Stress = pressure × radius / (2 × thickness): common practice; 1 mmHg = 1333.22 dyn/cm² (UCUM). Values computed in R.</summary>
    [Theory]
    [InlineData("2.5", "1.0", 199.98)]
    [InlineData("3.5", "0.8", 349.97)]
    public void Laplace(string radius, string wall, double expected) =>
        In.Check(expected, WallStress.Laplace(120, In.Cm(In.Number(radius)), In.Cm(In.Number(wall))), 2);

    /// <summary>Reichek, Circulation 1982;65:99; formula from memory, values computed in R.</summary>
    [Theory]
    [InlineData(120, "3.2", "1.5", 58.215)]
    [InlineData(108, "5.6", "1.1", 153.490)]
    public void Meridional(int pressure, string diameter, string wall, double expected) =>
        In.Check(expected, WallStress.EndSystolicMeridional(pressure, In.Cm(In.Number(diameter)), In.Cm(In.Number(wall))), 3);

    /// <summary>0.9 × systolic by cuff, as quoted in publications on elastance: 120 gives 108.</summary>
    [Fact]
    public void End_systolic_pressure_by_cuff() => In.Check(108, WallStress.EndSystolicPressureByCuff(120), 10);

    [Theory]
    [InlineData("0.39", "wall thickness 0.39 cm is outside 0.4 to 2.5 cm")]
    [InlineData("0.4", null)]
    [InlineData("2.5", null)]
    [InlineData("2.51", "wall thickness 2.51 cm is outside 0.4 to 2.5 cm")]
    public void A_wall_of_0_4_to_2_5_cm(string wall, string? whyNot) =>
        Assert.Equal(whyNot, WallStress.Laplace(120, In.Cm(3), In.Cm(In.Number(wall))).WhyNot);

    /// <summary>Wider and thinner means more stress (common practice, no source).</summary>
    [Fact]
    public void Stress_rises_with_width_and_falls_with_thickness() => Gen.Select(Gen.Int[20, 80], Gen.Int[5, 24], Gen.Int[60, 200]).Sample((diameter, wall, pressure) =>
    {
        decimal lvids = diameter / 10m;
        decimal pwts = wall / 10m;
        double stress = In.Value(WallStress.EndSystolicMeridional(pressure, In.Cm(lvids), In.Cm(pwts)));

        Assert.True(In.Value(WallStress.EndSystolicMeridional(pressure, In.Cm(lvids + 0.1m), In.Cm(pwts))) > stress);
        Assert.True(In.Value(WallStress.EndSystolicMeridional(pressure, In.Cm(lvids), In.Cm(pwts + 0.1m))) < stress);
        Assert.True(In.Value(WallStress.EndSystolicMeridional(pressure + 1, In.Cm(lvids), In.Cm(pwts))) > stress);
    });
}
