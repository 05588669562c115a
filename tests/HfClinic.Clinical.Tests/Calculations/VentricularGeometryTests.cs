using CsCheck;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>Limits: ASE/EACVI 2015, from memory. Mass formula as quoted in echocardiography tables; values computed in R.</summary>
public class VentricularGeometryTests
{
    [Theory]
    [InlineData("0.9", "4.8", 147.784)]
    [InlineData("1.2", "5.0", 233.746)]
    [InlineData("1.3", "4.2", 200.566)]
    [InlineData("0.8", "6.6", 220.142)]
    public void Mass(string wall, string cavity, double expected)
    {
        var walls = In.Cm(In.Number(wall));

        In.Check(expected, VentricularGeometry.Mass(walls, In.Cm(In.Number(cavity)), walls), 3);
    }

    /// <summary>By hand: 233.746 / 1.81812 = 128.565.</summary>
    [Fact]
    public void Mass_index() => In.Check(128.565, VentricularGeometry.MassIndex(233.746, BodySize.SurfaceAreaMosteller(In.Kg(70), In.Cm(170))), 3);

    [Theory]
    [InlineData("0.9", "4.8", 0.375)]
    [InlineData("1.2", "5.0", 0.480)]
    [InlineData("0.8", "6.6", 0.2424)]
    public void Relative_wall_thickness(string wall, string cavity, double expected) =>
        In.Check(expected, VentricularGeometry.RelativeWallThickness(In.Cm(In.Number(wall)), In.Cm(In.Number(cavity))), 4);

    [Fact]
    public void A_man_with_thick_walls_and_a_small_cavity_has_concentric_remodelling()
    {
        var index = VentricularGeometry.MassIndex(VentricularGeometry.Mass(In.Cm(1.3m), In.Cm(4.2m), In.Cm(1.3m)), 1.9);
        var shape = VentricularGeometry.Shape(
            index, VentricularGeometry.RelativeWallThickness(In.Cm(1.3m), In.Cm(4.2m)), Sex.Male, MassLimit.AseEacvi2015);

        In.Check(105.6, index, 1);
        Assert.Equal("concentric remodelling", shape.Text);
    }

    [Fact]
    public void A_woman_with_thin_walls_and_a_wide_cavity_has_eccentric_hypertrophy()
    {
        var index = VentricularGeometry.MassIndex(VentricularGeometry.Mass(In.Cm(0.8m), In.Cm(6.6m), In.Cm(0.8m)), 1.7);
        var shape = VentricularGeometry.Shape(
            index, VentricularGeometry.RelativeWallThickness(In.Cm(0.8m), In.Cm(6.6m)), Sex.Female, MassLimit.AseEacvi2015);

        In.Check(129.5, index, 1);
        Assert.Equal("eccentric hypertrophy", shape.Text);
    }

    [Theory]
    [InlineData(Sex.Male, 114.9, VentricleShape.Normal)]
    [InlineData(Sex.Male, 115, VentricleShape.Normal)]
    [InlineData(Sex.Male, 115.1, VentricleShape.EccentricHypertrophy)]
    [InlineData(Sex.Female, 94.9, VentricleShape.Normal)]
    [InlineData(Sex.Female, 95, VentricleShape.Normal)]
    [InlineData(Sex.Female, 95.1, VentricleShape.EccentricHypertrophy)]
    public void Mass_index_below_at_and_above_its_limit(Sex sex, double index, VentricleShape expected) =>
        Assert.Equal(expected, In.Value(VentricularGeometry.Shape(index, 0.40, sex, MassLimit.AseEacvi2015)));

    /// <summary>2 × 1.05 / 5.0 is 0.42 by hand, which is not above 0.42.</summary>
    [Theory]
    [InlineData("1.04", VentricleShape.EccentricHypertrophy)]
    [InlineData("1.05", VentricleShape.EccentricHypertrophy)]
    [InlineData("1.06", VentricleShape.ConcentricHypertrophy)]
    public void Thickness_below_at_and_above_its_limit(string wall, VentricleShape expected) => Assert.Equal(expected, In.Value(VentricularGeometry.Shape(
        130, VentricularGeometry.RelativeWallThickness(In.Cm(In.Number(wall)), In.Cm(5)), Sex.Male, MassLimit.AseEacvi2015)));

    [Fact]
    public void Which_limit_was_used_is_shown()
    {
        var newer = VentricularGeometry.Shape(120, 0.3, Sex.Male, MassLimit.AseEacvi2015);
        var older = VentricularGeometry.Shape(120, 0.3, Sex.Male, MassLimit.Older);

        Assert.Equal(VentricleShape.EccentricHypertrophy, newer.Value);
        Assert.Equal(VentricleShape.Normal, older.Value);
        Assert.Contains("ASE/EACVI 2015", newer.Inputs[^1].Shown);
        Assert.Contains("134", older.Inputs[^1].Shown);
    }

    [Fact]
    public void The_sex_must_be_recorded() =>
        Assert.Equal("sex not recorded", VentricularGeometry.Shape(120, 0.3, Sex.NotRecorded, MassLimit.AseEacvi2015).WhyNot);

    [Theory]
    [InlineData("0.3", "5", "0.9")]
    [InlineData("0.9", "2.4", "0.9")]
    [InlineData("0.9", "9.1", "0.9")]
    [InlineData("0.9", "5", "2.6")]
    [InlineData("9", "48", "9")]
    public void Impossible_sizes_are_refused(string septum, string cavity, string wall) => Assert.Contains(
        "is outside", VentricularGeometry.Mass(In.Cm(In.Number(septum)), In.Cm(In.Number(cavity)), In.Cm(In.Number(wall))).WhyNot);

    [Fact]
    public void Millimetres_and_centimetres_give_the_same() => Gen.Select(Gen.Int[40, 250], Gen.Int[250, 900]).Sample((wall, cavity) => Assert.Equal(
        VentricularGeometry.Mass(Length.FromMillimetres(wall / 10m), Length.FromMillimetres(cavity / 10m), Length.FromMillimetres(wall / 10m)).Value,
        VentricularGeometry.Mass(In.Cm(wall / 100m), In.Cm(cavity / 100m), In.Cm(wall / 100m)).Value));

    [Fact]
    public void Mass_rises_with_every_measure() => Gen.Select(Gen.Int[40, 240], Gen.Int[250, 890], Gen.Int[40, 240]).Sample((septum, cavity, wall) =>
    {
        double mass = Of(septum, cavity, wall);
        return Of(septum + 1, cavity, wall) > mass && Of(septum, cavity + 1, wall) > mass && Of(septum, cavity, wall + 1) > mass;

        static double Of(int septum, int cavity, int wall) =>
            In.Value(VentricularGeometry.Mass(In.Cm(septum / 100m), In.Cm(cavity / 100m), In.Cm(wall / 100m)));
    });
}
