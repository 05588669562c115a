using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>More than the larger of 2 kg and 2.5 % of the target, and 1 kg for certain: a default of this program, no published source.</summary>
public class AboveTargetTrendTests
{
    private readonly AboveTargetTrend _rule = new();

    private static PatientPicture Above => AtHome.Target(-60, 80_000).WeighedDaily(0, About(83_000, 40));

    [Theory]
    [InlineData(1, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(-1, Outcome.Fires)]
    public void Below_at_and_above_the_mass(int further, Outcome expected)
    {
        var grams = (decimal)(Above.Trend.On(Today)!.Value.Excess!.Value * 1000);
        var protocol = Defaults.With([new("trend.off-target-kg", grams + further), new("trend.off-target-percent", IsOn: false)]);

        Assert.Equal(expected, _rule.Read(Above, protocol).Outcome);
    }

    [Theory]
    [InlineData(0.001, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(-0.001, Outcome.Fires)]
    public void Below_at_and_above_the_certainty(double further, Outcome expected)
    {
        // Margin so that (E − margin) / SE is exactly 2, then the certainty asked for is moved about it.
        var day = Above.Trend.On(Today)!.Value;
        var margin = (day.Excess!.Value - (2 * day.ExcessError)) * 1000;
        var certainty = (decimal)((day.Excess.Value - ((double)(decimal)margin / 1000)) / day.ExcessError);
        var protocol = Defaults.With([new("trend.off-target-margin", (decimal)margin), new("trend.off-target-certainty", certainty + (decimal)further)]);

        Assert.Equal(expected, _rule.Read(Above, protocol).Outcome);
    }

    [Fact]
    public void It_says_how_far_with_its_interval()
    {
        var finding = _rule.Read(Above);

        Assert.Matches(@"^[23]\.\d kg above target with the scatter taken out \([12]\.\d to [34]\.\d kg\)$", finding.Statement);
        Assert.Equal("more than 2.0 kg, and 1.0 kg or more beyond doubt", finding.Limit);
        Assert.Equal(Urgency.ThisWeek, finding.Urgency);
        Assert.Equal(["Target weight", "Today", "Change per week"], finding.Evidence.Select(evidence => evidence.What));
    }

    [Fact]
    public void One_high_weight_is_for_the_plain_rule_alone()
    {
        var once = AtHome.Target(-60, 80_000).WeighedDaily(0, [.. About(80_000, 40), 82_100]);

        Assert.Equal(Outcome.Clear, _rule.Read(once).Outcome);
        Assert.Equal(Outcome.Fires, new AboveTarget().Read(once).Outcome);
    }

    [Fact]
    public void Of_a_heavy_person_the_share_of_the_target_counts() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Target(-60, 120_000).WeighedDaily(0, About(122_800, 40))).Outcome);

    [Fact]
    public void A_target_set_after_the_last_weight_counts_at_once()
    {
        var steady = AtHome.Target(-60, 80_000).WeighedDaily(-1, About(80_000, 40));

        Assert.Equal(Outcome.Clear, _rule.Read(steady).Outcome);
        Assert.Equal(Outcome.Fires, _rule.Read(steady.Target(0, 77_000)).Outcome);
    }

    [Fact]
    public void Without_a_target_it_cannot_tell() =>
        Assert.Equal("no target weight", _rule.Read(AtHome.WeighedDaily(0, About(80_000, 40))).Missing);
}
