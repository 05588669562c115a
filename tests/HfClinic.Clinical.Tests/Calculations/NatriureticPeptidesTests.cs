using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>Limits of a table after ESC and HFA, seen second-hand. Ages 50 and 75 in the middle band: as papers write "50-75".</summary>
public class NatriureticPeptidesTests
{
    [Theory]
    [InlineData(49, 460, PeptideBand.AboveRuleIn)]
    [InlineData(76, 1700, PeptideBand.BetweenLimits)]
    [InlineData(80, 290, PeptideBand.BelowRuleOut)]
    [InlineData(60, 299, PeptideBand.BelowRuleOut)]
    [InlineData(60, 300, PeptideBand.BetweenLimits)]
    [InlineData(60, 301, PeptideBand.BetweenLimits)]
    [InlineData(49, 449, PeptideBand.BetweenLimits)]
    [InlineData(49, 450, PeptideBand.BetweenLimits)]
    [InlineData(49, 451, PeptideBand.AboveRuleIn)]
    [InlineData(50, 451, PeptideBand.BetweenLimits)]
    [InlineData(50, 900, PeptideBand.BetweenLimits)]
    [InlineData(50, 901, PeptideBand.AboveRuleIn)]
    [InlineData(75, 900, PeptideBand.BetweenLimits)]
    [InlineData(75, 901, PeptideBand.AboveRuleIn)]
    [InlineData(76, 901, PeptideBand.BetweenLimits)]
    [InlineData(76, 1800, PeptideBand.BetweenLimits)]
    [InlineData(76, 1801, PeptideBand.AboveRuleIn)]
    public void NtProBnp_in_the_acute_setting_below_at_and_above_each_limit(int age, int level, PeptideBand expected) =>
        Assert.Equal(expected, In.Value(NatriureticPeptides.Acute(NtProBnp.FromPgPerMl(level), age)));

    [Theory]
    [InlineData(99, PeptideBand.BelowRuleOut)]
    [InlineData(100, PeptideBand.BetweenLimits)]
    [InlineData(400, PeptideBand.BetweenLimits)]
    [InlineData(401, PeptideBand.AboveRuleIn)]
    public void Bnp_in_the_acute_setting_below_at_and_above_each_limit(int level, PeptideBand expected) =>
        Assert.Equal(expected, In.Value(NatriureticPeptides.Acute(Bnp.FromPgPerMl(level))));

    [Theory]
    [InlineData(124, "below the rule-out limit")]
    [InlineData(125, "at or above the rule-out limit")]
    [InlineData(126, "at or above the rule-out limit")]
    public void NtProBnp_otherwise_below_at_and_above_its_limit(int level, string text) =>
        Assert.Equal(text, NatriureticPeptides.NotAcute(NtProBnp.FromPgPerMl(level)).Text);

    [Theory]
    [InlineData(34, "below the rule-out limit")]
    [InlineData(35, "at or above the rule-out limit")]
    [InlineData(36, "at or above the rule-out limit")]
    public void Bnp_otherwise_below_at_and_above_its_limit(int level, string text) =>
        Assert.Equal(text, NatriureticPeptides.NotAcute(Bnp.FromPgPerMl(level)).Text);

    [Fact]
    public void A_level_typed_in_pmol_is_read_in_pg() => Assert.Equal(
        PeptideBand.AboveRuleIn, In.Value(NatriureticPeptides.Acute(NtProBnp.FromPmolPerLitre(60), 40)));

    [Fact]
    public void What_is_missing_is_named() => Assert.Equal("no NT-proBNP and no age", NatriureticPeptides.Acute(default, default).WhyNot);
}
