using HfClinic.Clinical.Calculations;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>ESC heart failure guideline 2021.</summary>
public class IronDeficiencyTests
{
    [Theory]
    [InlineData("85", "25", true)]
    [InlineData("180", "18", true)]
    [InlineData("180", "22", false)]
    [InlineData("300", "15", false)]
    [InlineData("99", "40", true)]
    [InlineData("100", "40", false)]
    [InlineData("101", "40", false)]
    [InlineData("100", "19.9", true)]
    [InlineData("299", "19.9", true)]
    [InlineData("299", "20", false)]
    [InlineData("299", "20.1", false)]
    [InlineData("301", "5", false)]
    public void Ferritin_and_saturation_below_at_and_above_each_limit(string ferritin, string saturation, bool met) =>
        Assert.Equal(met, In.Value(IronDeficiency.IsMet(In.Number(ferritin), In.Number(saturation))));

    [Theory]
    [InlineData("99", "definition met")]
    [InlineData("100", "not computed: no transferrin saturation")]
    [InlineData("299", "not computed: no transferrin saturation")]
    [InlineData("300", "definition not met")]
    public void Saturation_is_needed_only_where_it_decides(string ferritin, string text) =>
        Assert.Equal(text, IronDeficiency.IsMet(In.Number(ferritin), default).Text);

    [Fact]
    public void Without_ferritin_nothing_is_said() =>
        Assert.Equal("no ferritin and no transferrin saturation", IronDeficiency.IsMet(default, default).WhyNot);

    /// <summary>Iron over capacity: common practice. 12 of 60 is 20 % by hand, and 20 % is not below 20 %.</summary>
    [Fact]
    public void Saturation_is_exact_at_its_limit()
    {
        var saturation = IronDeficiency.TransferrinSaturation(12m, 60m);

        Assert.Equal("20 %", saturation.Text);
        Assert.False(In.Value(IronDeficiency.IsMet(150m, saturation)));
        Assert.True(In.Value(IronDeficiency.IsMet(150m, IronDeficiency.TransferrinSaturation(11.9m, 60m))));
    }

    [Fact]
    public void Iron_cannot_exceed_the_capacity() =>
        Assert.Equal("iron 61 µmol/L is above iron-binding capacity 60 µmol/L", IronDeficiency.TransferrinSaturation(61m, 60m).WhyNot);
}
