using HfClinic.Clinical.Calculations.RiskScores;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations.RiskScores;

/// <summary>
/// Points of Pocock, Eur Heart J 2013;34:1404, as confirmed in a secondary text; the age rows at EF 30 to 39 and at 40 and above
/// are from memory.
/// </summary>
public class MaggicTests
{
    /// <summary>5 + 4 + 4 + 2 + 2 + 6 + 1 + 3 + 2, added by hand.</summary>
    private static readonly MaggicPatient Man = new()
    {
        Sex = Sex.Male,
        AgeYears = 68,
        EjectionFraction = 28m,
        SystolicMmHg = 118,
        BodyMassIndex = 27,
        Creatinine = In.Micromol(115),
        NyhaClass = 3,
        Diabetes = true,
        DiagnosedEighteenMonthsAgo = true,
        Smoker = false,
        Copd = false,
        BetaBlocker = true,
        AceInhibitorOrArb = true,
    };

    [Fact]
    public void The_man_has_29_points()
    {
        var score = Maggic.Points(Man);

        Assert.Equal("29 points", score.Text);
        Assert.Equal(
            ["sex 1", "diabetes 3", "heart failure diagnosed 18 months ago or earlier 2", "EF 5", "age 4", "systolic pressure 4", "BMI 2", "creatinine 2", "NYHA class 6"],
            score.Inputs.Where(input => input.Points > 0).Select(input => $"{input.Name} {input.Points}"));
    }

    /// <summary>0 + 12 + 0 + 0 + 1 + 2 + 2 + 3, added by hand; uses an age row from memory.</summary>
    [Fact]
    public void The_woman_has_20_points() => Assert.Equal(20, In.Value(Maggic.Points(new MaggicPatient
    {
        Sex = Sex.Female,
        AgeYears = 77,
        EjectionFraction = 55m,
        SystolicMmHg = 145,
        BodyMassIndex = 31,
        Creatinine = In.Micromol(95),
        NyhaClass = 2,
        Copd = true,
        DiagnosedEighteenMonthsAgo = false,
        Diabetes = false,
        Smoker = false,
        BetaBlocker = false,
        AceInhibitorOrArb = true,
    })));

    [Theory]
    [InlineData("19", 7)]
    [InlineData("20", 6)]
    [InlineData("24", 6)]
    [InlineData("24.5", 5)]
    [InlineData("25", 5)]
    [InlineData("29", 5)]
    [InlineData("30", 3)]
    [InlineData("34", 3)]
    [InlineData("35", 2)]
    [InlineData("39", 2)]
    [InlineData("40", 0)]
    public void Ejection_fraction_at_each_edge(string percent, int points) =>
        Assert.Equal(points, PointsOf("EF", Man with { EjectionFraction = In.Number(percent) }));

    [Theory]
    [InlineData("89.9", 0)]
    [InlineData("90", 1)]
    [InlineData("109.9", 1)]
    [InlineData("110", 2)]
    [InlineData("129", 2)]
    [InlineData("130", 3)]
    [InlineData("149", 3)]
    [InlineData("150", 4)]
    [InlineData("169", 4)]
    [InlineData("170", 5)]
    [InlineData("209", 5)]
    [InlineData("210", 6)]
    [InlineData("249", 6)]
    [InlineData("250", 8)]
    public void Creatinine_at_each_edge(string micromol, int points) =>
        Assert.Equal(points, PointsOf("creatinine", Man with { Creatinine = In.Micromol(In.Number(micromol)) }));

    [Theory]
    [InlineData(14.9, 6)]
    [InlineData(15, 5)]
    [InlineData(19.9, 5)]
    [InlineData(20, 3)]
    [InlineData(24.9, 3)]
    [InlineData(25, 2)]
    [InlineData(29.9, 2)]
    [InlineData(30, 0)]
    public void Body_mass_index_at_each_edge(double index, int points) => Assert.Equal(points, PointsOf("BMI", Man with { BodyMassIndex = index }));

    [Theory]
    [InlineData(1, 0)]
    [InlineData(2, 2)]
    [InlineData(3, 6)]
    [InlineData(4, 8)]
    public void Nyha_class(int nyha, int points) => Assert.Equal(points, PointsOf("NYHA class", Man with { NyhaClass = nyha }));

    [Theory]
    [InlineData(29, new[] { 5, 4, 3, 2, 1, 0 })]
    [InlineData(30, new[] { 3, 2, 1, 1, 0, 0 })]
    [InlineData(39, new[] { 3, 2, 1, 1, 0, 0 })]
    [InlineData(40, new[] { 2, 1, 1, 0, 0, 0 })]
    public void Systolic_pressure_by_ejection_fraction(int ef, int[] points)
    {
        int[] lower = [100, 110, 120, 130, 140, 150];
        int[] upper = [109, 119, 129, 139, 149, 200];

        Assert.All([lower, upper], band => Assert.Equal(points, band.Select(systolic => PointsOf(
            "systolic pressure", Man with { EjectionFraction = (decimal)ef, SystolicMmHg = systolic }))));
    }

    /// <summary>The first row as seen, the other two from memory.</summary>
    [Theory]
    [InlineData(29, new[] { 0, 1, 2, 4, 6, 8, 10 })]
    [InlineData(30, new[] { 0, 2, 4, 6, 8, 10, 13 })]
    [InlineData(40, new[] { 0, 3, 5, 7, 9, 12, 15 })]
    public void Age_by_ejection_fraction(int ef, int[] points)
    {
        int[] lower = [18, 55, 60, 65, 70, 75, 80];
        int[] upper = [54, 59, 64, 69, 74, 79, 100];

        Assert.All([lower, upper], band => Assert.Equal(points, band.Select(age => PointsOf(
            "age", Man with { EjectionFraction = (decimal)ef, AgeYears = age }))));
    }

    [Fact]
    public void Each_answer_counts_its_own()
    {
        Assert.Equal(28, In.Value(Maggic.Points(Man with { Sex = Sex.Female })));
        Assert.Equal(30, In.Value(Maggic.Points(Man with { Smoker = true })));
        Assert.Equal(26, In.Value(Maggic.Points(Man with { Diabetes = false })));
        Assert.Equal(31, In.Value(Maggic.Points(Man with { Copd = true })));
        Assert.Equal(27, In.Value(Maggic.Points(Man with { DiagnosedEighteenMonthsAgo = false })));
        Assert.Equal(32, In.Value(Maggic.Points(Man with { BetaBlocker = false })));
        Assert.Equal(30, In.Value(Maggic.Points(Man with { AceInhibitorOrArb = false })));
    }

    [Fact]
    public void What_is_missing_is_named_and_never_a_no()
    {
        var score = Maggic.Points(Man with { EjectionFraction = default, Smoker = default });

        Assert.Null(score.Value);
        Assert.Equal("not computed: no answer on smoker and no EF", score.Text);
        Assert.Null(score.Inputs.Single(input => input.Name == "age").Points);
        Assert.Equal(3, score.Inputs.Single(input => input.Name == "diabetes").Points);
    }

    /// <summary>The published risk tables could not be confirmed.</summary>
    [Fact]
    public void No_risk_is_printed()
    {
        var score = Maggic.Points(Man);

        Assert.DoesNotContain("%", score.Text + score.Formula.InWords + score.Formula.Caution);
    }

    private static int PointsOf(string input, MaggicPatient patient) =>
        Assert.NotNull(Maggic.Points(patient).Inputs.Single(row => row.Name == input).Points);
}
