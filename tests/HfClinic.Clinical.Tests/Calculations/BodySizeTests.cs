using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

public class BodySizeTests
{
    /// <summary>Du Bois and Du Bois 1916; constants from memory, values computed in R.</summary>
    [Theory]
    [InlineData(170, 70, 1.80971)]
    [InlineData(175, 110, 2.23955)]
    public void Surface_area_by_Du_Bois(int cm, int kg, double expected) => In.Check(expected, BodySize.SurfaceAreaDuBois(In.Kg(kg), In.Cm(cm)), 5);

    /// <summary>Mosteller, N Engl J Med 1987;317:1098; values computed in R.</summary>
    [Theory]
    [InlineData(170, 70, 1.81812)]
    [InlineData(180, 80, 2.00000)]
    [InlineData(175, 110, 2.31241)]
    public void Surface_area_by_Mosteller(int cm, int kg, double expected) => In.Check(expected, BodySize.SurfaceAreaMosteller(In.Kg(kg), In.Cm(cm)), 5);

    /// <summary>86.7 kg at 1.70 m is 30 by hand; binary arithmetic gives the neighbour above, which would count in a score.</summary>
    [Fact]
    public void A_body_mass_index_of_30_is_exactly_30() => Assert.Equal(30.0, In.Value(BodySize.BodyMassIndex(In.Kg(86.7m), In.Cm(170))));

    /// <summary>Devine 1974, from memory: 50 kg for a man and 45.5 kg for a woman of 60 inches.</summary>
    [Theory]
    [InlineData(Sex.Male, 50)]
    [InlineData(Sex.Female, 45.5)]
    public void Ideal_weight_at_sixty_inches(Sex sex, double expected) => In.Check(expected, BodySize.IdealWeight(In.Cm(152.4m), sex), 10);

    [Theory]
    [InlineData("29.9", 170)]
    [InlineData("250.1", 170)]
    [InlineData("70", 119)]
    [InlineData("70", 221)]
    public void Impossible_sizes_are_refused(string kg, int cm)
    {
        var weight = In.Kg(In.Number(kg));

        Assert.Contains("is outside", BodySize.SurfaceAreaMosteller(weight, In.Cm(cm)).WhyNot);
        Assert.Contains("is outside", BodySize.SurfaceAreaDuBois(weight, In.Cm(cm)).WhyNot);
        Assert.Contains("is outside", BodySize.BodyMassIndex(weight, In.Cm(cm)).WhyNot);
    }

    /// <summary>Digoxin is dosed by lean weight (US label); adjusted weight for the obese, pharmacokinetics texts.</summary>
    [Theory]
    [InlineData(178, 120, 73.2, "73.2 kg (ideal)", 91.9)]
    [InlineData(178, 60, 60.0, "60.0 kg (measured, below ideal)", null)]
    [InlineData(178, 80, 73.2, "73.2 kg (ideal)", null)]
    public void Lean_weight_is_ideal_or_the_lower_measured_one(int cm, int kg, double expected, string text, double? adjusted)
    {
        var lean = LeanWeight.Choose(In.Kg(kg), In.Cm(cm), Sex.Male);

        In.Check(expected, lean.Kilograms, 1);
        Assert.Equal(text, lean.Kilograms.Text);
        Assert.Equal(adjusted, lean.Adjusted?.Value is { } value ? Math.Round(value, 1) : null);
    }

    /// <summary>Obese from a BMI of 30 (WHO; common practice).</summary>
    [Theory]
    [InlineData("86.6", false)]
    [InlineData("86.7", true)]
    [InlineData("86.8", true)]
    public void Adjusted_weight_below_at_and_above_obesity(string kg, bool shown) => Assert.Equal(
        shown,
        LeanWeight.Choose(In.Kg(In.Number(kg)), In.Cm(170), Sex.Female).Adjusted is not null);
}
