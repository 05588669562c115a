using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>More than 2 % off target for 28 days with less than 0.03 kg a day of change: a default of this program, no published source.</summary>
public class TargetWeightStaleTests
{
    private readonly TargetWeightStale _rule = new();

    private static PatientPicture Steady => AtHome.Target(-100, 80_000).WeighedDaily(0, About(82_000, 90));

    [Theory]
    [InlineData(0.001, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(-0.001, Outcome.Fires)]
    public void Below_at_and_above_the_distance(double further, Outcome expected)
    {
        var least = Enumerable.Range(0, 28).Min(back => (decimal)(Steady.Trend.On(Today.AddDays(-back))!.Value.Excess!.Value / 80 * 100));

        Assert.Equal(expected, _rule.Read(Steady, Defaults.With([new("target.stale-percent", least + (decimal)further)])).Outcome);
    }

    [Theory]
    [InlineData(-0.001, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(0.001, Outcome.Fires)]
    public void Below_at_and_above_the_slope(double further, Outcome expected)
    {
        var growing = AtHome.Target(-100, 80_000).WeighedDaily(0, Enumerable.Range(0, 90).Select(day => 82_000 + (day * 20)));
        var slope = (decimal)Enumerable.Range(0, 28).Reverse().Average(back => growing.Trend.On(Today.AddDays(-back))!.Value.Trend.Slope) * 1000;

        Assert.InRange(slope, 15, 25);
        Assert.Equal(expected, _rule.Read(growing, Defaults.With([new("target.stale-slope", slope + (decimal)further)])).Outcome);
    }

    [Fact]
    public void It_says_how_far_and_how_long()
    {
        var finding = _rule.Read(Steady);

        Assert.Equal("Steady 1.9 kg above target for 28 days: the target weight may be out of step", finding.Statement);
        Assert.Equal("more than 2 % off target for 28 days, changing by less than 0.03 kg a day", finding.Limit);
        Assert.Equal(Urgency.NextVisit, finding.Urgency);
    }

    [Fact]
    public void Below_target_counts_as_well() =>
        Assert.StartsWith("Steady 2.1 kg below target", _rule.Read(AtHome.Target(-100, 80_000).WeighedDaily(0, About(78_000, 90))).Statement);

    [Theory]
    [InlineData(-27, Outcome.Fires)]
    [InlineData(-26, Outcome.Clear)]
    public void A_target_must_have_held_all_those_days(int from, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Target(from, 80_000).WeighedDaily(0, About(82_000, 90))).Outcome);

    [Fact]
    public void Not_with_a_fluid_gain_open() =>
        Assert.Equal(Outcome.Clear, _rule.Read(Steady with { OpenFlagRules = ["volume.fluid-gain"] }).Outcome);

    [Fact]
    public void Without_target_or_days_enough_it_cannot_tell()
    {
        Assert.Equal("no target weight", _rule.Read(AtHome.WeighedDaily(0, About(82_000, 90))).Missing);
        Assert.Equal("28 days of trend are needed, there are 27", _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(0, About(82_000, 27))).Missing);
    }
}
