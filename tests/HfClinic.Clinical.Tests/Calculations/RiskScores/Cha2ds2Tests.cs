using HfClinic.Clinical.Calculations.RiskScores;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations.RiskScores;

/// <summary>Lip, Chest 2010, and ESC 2024, both from memory. Totals added by hand.</summary>
public class Cha2ds2Tests
{
    private static readonly StrokePatient Nothing = new()
    {
        Sex = Sex.Male,
        AgeYears = 50,
        Hypertension = false,
        Diabetes = false,
        StrokeOrEmbolism = false,
        VascularDisease = false,
    };

    /// <summary>1 + 1 + 2 + 1; without the point for sex 4.</summary>
    [Fact]
    public void A_woman_of_76_with_hypertension() => Check(5, 4, Nothing with { Sex = Sex.Female, AgeYears = 76, Hypertension = true });

    /// <summary>1 + 1 + 1.</summary>
    [Fact]
    public void A_man_of_66_with_diabetes() => Check(3, 3, Nothing with { AgeYears = 66, Diabetes = true });

    [Fact]
    public void Heart_failure_alone_counts_1() => Check(1, 1, Nothing);

    [Theory]
    [InlineData(64, 1)]
    [InlineData(65, 2)]
    [InlineData(74, 2)]
    [InlineData(75, 3)]
    public void Age_at_each_edge(int age, int points) => Check(points, points, Nothing with { AgeYears = age });

    [Fact]
    public void Everything_counts_9_and_8() => Check(9, 8, new StrokePatient
    {
        Sex = Sex.Female,
        AgeYears = 80,
        Hypertension = true,
        Diabetes = true,
        StrokeOrEmbolism = true,
        VascularDisease = true,
    });

    [Fact]
    public void Without_the_sex_only_the_newer_score_is_computed()
    {
        var patient = Nothing with { Sex = Sex.NotRecorded };

        Assert.Equal("not computed: sex not recorded", Cha2ds2.WithSex(patient).Text);
        Assert.Equal("1 point", Cha2ds2.WithoutSex(patient).Text);
    }

    [Fact]
    public void A_missing_answer_is_not_a_no() =>
        Assert.Equal("no answer on vascular disease", Cha2ds2.WithoutSex(Nothing with { VascularDisease = default }).WhyNot);

    private static void Check(int withSex, int withoutSex, StrokePatient patient)
    {
        Assert.Equal(withSex, In.Value(Cha2ds2.WithSex(patient)));
        Assert.Equal(withoutSex, In.Value(Cha2ds2.WithoutSex(patient)));
    }
}
