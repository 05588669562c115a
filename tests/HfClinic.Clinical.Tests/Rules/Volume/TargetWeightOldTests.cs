using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>90 days, 30 after a discharge: a default of this program, no published source.</summary>
public class TargetWeightOldTests
{
    private readonly TargetWeightOld _rule = new();

    [Theory]
    [InlineData(-89, Outcome.Clear)]
    [InlineData(-90, Outcome.Clear)]
    [InlineData(-91, Outcome.Fires)]
    public void Below_at_and_above(int setOn, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Target(setOn, 80_000)).Outcome);

    [Theory]
    [InlineData(-29, -29, Outcome.Clear)]
    [InlineData(-30, -30, Outcome.Clear)]
    [InlineData(-31, -31, Outcome.Fires)]
    [InlineData(-31, -90, Outcome.Fires)]
    [InlineData(-31, -91, Outcome.Clear)]
    [InlineData(-31, 1, Outcome.Clear)]
    public void After_a_discharge_it_is_old_sooner(int setOn, int dischargedOn, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Target(setOn, 80_000) with { DischargedFromHospitalOn = Today.AddDays(dischargedOn) }).Outcome);

    [Fact]
    public void It_says_how_old()
    {
        var finding = _rule.Read(AtHome.Target(-112, 80_000));

        Assert.Equal(("Target weight set 112 days ago", "more than 90 days ago"), (finding.Statement, finding.Limit));
        Assert.Equal(Urgency.NextVisit, finding.Urgency);
        Assert.Equal([new Evidence("Target weight", "80.0 kg", Today.AddDays(-112), RaisedIt: true)], finding.Evidence);
    }

    [Fact]
    public void Without_a_target_it_cannot_tell() => Assert.Equal("no target weight", _rule.Read(AtHome).Missing);

    [Fact]
    public void A_new_target_clears_it() => Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Target(-112, 80_000).Target(0, 80_000)).Outcome);
}
