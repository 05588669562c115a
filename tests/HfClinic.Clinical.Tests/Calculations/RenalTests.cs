using CsCheck;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

public class RenalTests
{
    private static readonly Gen<decimal> Scr = Gen.Int[20, 1999].Select(hundredths => hundredths / 100m);
    private static readonly Gen<int> Age = Gen.Int[18, 109];
    private static readonly Gen<Sex> AnySex = Gen.Bool.Select(female => female ? Sex.Female : Sex.Male);

    /// <summary>CKD-EPI 2021, formula as printed by the US National Kidney Foundation; values computed in R. There is no official table.</summary>
    [Theory]
    [InlineData("0.5", 30, Sex.Female, 129.317)]
    [InlineData("0.7", 40, Sex.Female, 112.054)]
    [InlineData("0.9", 55, Sex.Female, 75.499)]
    [InlineData("1.0", 60, Sex.Female, 64.495)]
    [InlineData("1.5", 72, Sex.Female, 36.796)]
    [InlineData("2.4", 80, Sex.Female, 19.918)]
    [InlineData("0.7", 30, Sex.Male, 127.122)]
    [InlineData("0.9", 45, Sex.Male, 107.335)]
    [InlineData("1.0", 50, Sex.Male, 91.691)]
    [InlineData("1.2", 65, Sex.Male, 67.111)]
    [InlineData("2.0", 70, Sex.Male, 35.243)]
    [InlineData("3.5", 80, Sex.Male, 16.921)]
    public void Egfr_by_CKD_EPI_2021(string scr, int age, Sex sex, double expected) =>
        In.Check(expected, Renal.Egfr(In.MgPerDl(In.Number(scr)), age, sex), 3);

    /// <summary>At Scr = k both brackets are 1 (follows from the formula): 142 × 0.9938^age, × 1.012 for women.</summary>
    [Theory]
    [InlineData("0.7", Sex.Female, 1.012)]
    [InlineData("0.9", Sex.Male, 1.0)]
    public void Both_sides_meet_at_the_kink(string k, Sex sex, double bySex)
    {
        decimal kink = In.Number(k);
        double at = In.Value(Renal.Egfr(In.MgPerDl(kink), 50, sex));

        Assert.Equal(142 * Math.Pow(0.9938, 50) * bySex, at, 9);
        In.Check(at, Renal.Egfr(In.MgPerDl(kink - 0.000001m), 50, sex), 3);
        In.Check(at, Renal.Egfr(In.MgPerDl(kink + 0.000001m), 50, sex), 3);
        Assert.True(at < In.Value(Renal.Egfr(In.MgPerDl(kink - 0.01m), 50, sex)));
        Assert.True(at > In.Value(Renal.Egfr(In.MgPerDl(kink + 0.01m), 50, sex)));
    }

    [Fact]
    public void Egfr_is_reported_whole()
    {
        Assert.Equal("67 mL/min/1.73 m²", Renal.Egfr(In.MgPerDl(1.2m), 65, Sex.Male).Text);
        Assert.Equal(68, Renal.Whole(67.5));
        Assert.Equal(67, Renal.Whole(67.49));
    }

    /// <summary>Cockcroft and Gault 1976; values computed in R.</summary>
    [Theory]
    [InlineData(50, 70, "0.9", Sex.Male, 97.222)]
    [InlineData(72, 55, "1.3", Sex.Female, 33.964)]
    [InlineData(80, 60, "1.5", Sex.Female, 28.333)]
    public void Clearance_by_Cockcroft_and_Gault(int age, int kg, string scr, Sex sex, double expected) => In.Check(
        expected, Renal.CreatinineClearance(age, kg, In.MgPerDl(In.Number(scr)), sex), 3);

    /// <summary>Older US digoxin label: (140 − age) / Scr, × 0.85 for women; the weight does not enter. By hand: 80 / 1.6 = 50.</summary>
    [Theory]
    [InlineData(Sex.Male, 50)]
    [InlineData(Sex.Female, 42.5)]
    public void Clearance_per_70_kg_as_the_older_label_wants_it(Sex sex, double expected) =>
        In.Check(expected, Renal.CreatinineClearancePer70Kilograms(60, In.MgPerDl(1.6m), sex), 10);

    [Fact]
    public void Clearance_per_70_kg_is_that_of_72_kg() => Gen.Select(Scr, Age, AnySex).Sample((scr, age, sex) => In.Check(
        In.Value(Renal.CreatinineClearance(age, 72, In.MgPerDl(scr), sex)), Renal.CreatinineClearancePer70Kilograms(age, In.MgPerDl(scr), sex), 6));

    [Fact]
    public void Egfr_falls_as_creatinine_rises() => Gen.Select(Scr, Age, AnySex).Sample((scr, age, sex) =>
        In.Value(Renal.Egfr(In.MgPerDl(scr + 0.01m), age, sex)) < In.Value(Renal.Egfr(In.MgPerDl(scr), age, sex)));

    [Fact]
    public void Egfr_falls_with_age() => Gen.Select(Scr, Age, AnySex).Sample((scr, age, sex) =>
        In.Value(Renal.Egfr(In.MgPerDl(scr), age + 1, sex)) < In.Value(Renal.Egfr(In.MgPerDl(scr), age, sex)));

    [Fact]
    public void The_unit_typed_does_not_change_the_reported_egfr() => Gen.Select(Gen.Int[20, 1700], Age, AnySex).Sample((micromol, age, sex) =>
        Renal.Whole(In.Value(Renal.Egfr(In.Micromol(micromol), age, sex)))
        == Renal.Whole(In.Value(Renal.Egfr(In.MgPerDl(Creatinine.FromMicromolPerLitre(micromol).MgPerDl), age, sex))));

    [Theory]
    [InlineData("0.2")]
    [InlineData("20")]
    public void The_ends_of_the_accepted_range_are_accepted(string scr) =>
        Assert.Null(Renal.Egfr(In.MgPerDl(In.Number(scr)), 60, Sex.Male).WhyNot);

    [Theory]
    [InlineData("0.19", 60, "creatinine 17 µmol/L (0.19 mg/dL) is outside 0.2 to 20 mg/dL")]
    [InlineData("88", 60, "creatinine 7779 µmol/L (88.00 mg/dL) is outside 0.2 to 20 mg/dL")]
    [InlineData("1", 17, "age 17 years is outside 18 to 110 years")]
    [InlineData("1", 111, "age 111 years is outside 18 to 110 years")]
    public void Impossible_inputs_are_refused(string scr, int age, string whyNot) => Assert.Equal(
        whyNot, Renal.Egfr(In.MgPerDl(In.Number(scr)), age, Sex.Male).WhyNot);
}
