using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>More than the larger of 2 kg and 2.5 % of the target: a default of this program, no published source.</summary>
public class AboveTargetTests
{
    private readonly AboveTarget _rule = new();

    [Theory]
    [InlineData(60_000, 61_999, Outcome.Clear)]
    [InlineData(60_000, 62_000, Outcome.Clear)]
    [InlineData(60_000, 62_001, Outcome.Fires)]
    [InlineData(80_000, 82_000, Outcome.Clear)]
    [InlineData(80_000, 82_001, Outcome.Fires)]
    [InlineData(100_000, 102_499, Outcome.Clear)]
    [InlineData(100_000, 102_500, Outcome.Clear)]
    [InlineData(100_000, 102_501, Outcome.Fires)]
    public void Below_at_and_above(int target, int today, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Target(-10, target).Weighed(0, today)).Outcome);

    [Fact]
    public void It_names_target_and_weight()
    {
        var finding = _rule.Read(AtHome.Target(-10, 71_500).Weighed(0, 74_200));

        Assert.Equal(("Above target by 2.7 kg", "more than 2.0 kg above target"), (finding.Statement, finding.Limit));
        Assert.Equal((Urgency.ThisWeek, 2_700m), (finding.Urgency, finding.Magnitude));
        Assert.Equal(
            [new Evidence("Target weight", "71.5 kg", Today.AddDays(-10)), new Evidence("Today", "74.2 kg", Today, 100, RaisedIt: true)],
            finding.Evidence);
    }

    [Fact]
    public void A_share_of_the_target_is_named_as_such()
    {
        var finding = _rule.Read(AtHome.Target(-10, 100_000).Weighed(-1, 103_000));

        Assert.Equal("more than 2.5 kg (2.5 % of target) above target", finding.Limit);
        Assert.Equal("Above target by 3.0 kg on 02 Mar", finding.Statement);
    }

    [Fact]
    public void The_target_that_holds_today_counts() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Target(-10, 70_000).Target(-1, 80_000).Target(1, 60_000).Weighed(0, 81_000)).Outcome);

    [Fact]
    public void Without_the_one_or_the_other_it_cannot_tell()
    {
        Assert.Equal("no target weight", _rule.Read(AtHome.Weighed(0, 80_000)).Missing);
        Assert.Equal("no accepted weight", _rule.Read(AtHome.Target(-1, 80_000)).Missing);
    }

    [Fact]
    public void With_one_half_switched_off_the_other_counts_alone()
    {
        var heavy = AtHome.Target(-1, 100_000).Weighed(0, 102_100);

        Assert.Equal(Outcome.Fires, _rule.Read(heavy, Defaults.With([new("weight.above-target-percent", IsOn: false)])).Outcome);
        Assert.Equal(Outcome.Clear, _rule.Read(heavy, Defaults.With([new("weight.above-target-kg", IsOn: false)])).Outcome);
    }
}
