using HfClinic.Clinical.Calculations;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>Universal definition of heart failure 2021; rounding halves up is a choice of this program.</summary>
public class EjectionFractionClassTests
{
    [Theory]
    [InlineData("39", "HFrEF")]
    [InlineData("40", "HFrEF")]
    [InlineData("40.49", "HFrEF")]
    [InlineData("40.5", "HFmrEF")]
    [InlineData("41", "HFmrEF")]
    [InlineData("49", "HFmrEF")]
    [InlineData("49.4", "HFmrEF")]
    [InlineData("49.5", "HFpEF")]
    [InlineData("50", "HFpEF")]
    [InlineData("51", "HFpEF")]
    public void By_number_below_at_and_above_each_limit(string percent, string expected) =>
        Assert.Equal(expected, EjectionFractionClass.Of(In.Number(percent), default).Text);

    [Theory]
    [InlineData("35", "44", "HFmrEF")]
    [InlineData("35", "45", "HFimpEF")]
    [InlineData("32", "45", "HFimpEF")]
    [InlineData("40", "49", "HFmrEF")]
    [InlineData("40", "50", "HFimpEF")]
    [InlineData("40", "51", "HFimpEF")]
    [InlineData("41", "55", "HFpEF")]
    [InlineData("40.5", "55", "HFpEF")]
    [InlineData("38", "39", "HFrEF")]
    [InlineData("25", "40", "HFrEF")]
    [InlineData("25", "41", "HFimpEF")]
    [InlineData("60", "35", "HFrEF")]
    public void By_rise_from_the_baseline(string baseline, string latest, string expected) =>
        Assert.Equal(expected, EjectionFractionClass.Of(In.Number(latest), In.Number(baseline)).Text);

    [Fact]
    public void Without_a_baseline_that_is_shown()
    {
        var kind = EjectionFractionClass.Of(45m, default);

        Assert.Equal(EjectionFractionKind.MildlyReduced, kind.Value);
        Assert.Equal("not recorded", kind.Inputs[1].Shown);
        Assert.Contains("cannot be told", kind.Formula.Caution);
    }

    [Theory]
    [InlineData("4.9", "not computed: EF 4.9 % is outside 5 to 90 %")]
    [InlineData("90.1", "not computed: EF 90.1 % is outside 5 to 90 %")]
    public void An_impossible_EF_is_refused(string percent, string text) =>
        Assert.Equal(text, EjectionFractionClass.Of(In.Number(percent), default).Text);

    [Fact]
    public void An_impossible_baseline_is_not_passed_over() =>
        Assert.Equal("baseline EF 0 % is outside 5 to 90 %", EjectionFractionClass.Of(45m, 0m).WhyNot);
}
