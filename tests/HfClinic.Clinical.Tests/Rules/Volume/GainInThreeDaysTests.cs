using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>More than 2 kg in 3 days: ESC 2021 self-care advice, as quoted by Gudmundsson (ESC Congress 2019, P6334).</summary>
public class GainInThreeDaysTests
{
    private readonly GainInThreeDays _rule = new();

    [Theory]
    [InlineData(81_999, Outcome.Clear)]
    [InlineData(82_000, Outcome.Clear)]
    [InlineData(82_001, Outcome.Fires)]
    public void Below_at_and_above(int today, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-3, 80_000).Weighed(-1, 81_000).Weighed(0, today)).Outcome);

    /// <summary>In binary floating point 82.1 − 80.1 is more than 2.</summary>
    [Fact]
    public void The_difference_of_82_1_and_80_1_kg_is_not_more_than_2() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Weighed(-3, 80_100).Weighed(0, 82_100)).Outcome);

    [Fact]
    public void It_names_both_days_and_both_weights()
    {
        var finding = _rule.Read(AtHome.Weighed(-3, 72_900).Weighed(-2, 71_900).Weighed(0, 74_500));

        Assert.Equal("Gained 2.6 kg in 3 days", finding.Statement);
        Assert.Equal("more than 2.0 kg in 3 days", finding.Limit);
        Assert.Equal((Urgency.Today, 2_600m), (finding.Urgency, finding.Magnitude));
        Assert.Equal(
            [
                new Evidence("Lowest of the 3 days before", "71.9 kg", Today.AddDays(-2), 101),
                new Evidence("Today", "74.5 kg", Today, 102, RaisedIt: true),
            ],
            finding.Evidence);
    }

    [Fact]
    public void A_gain_of_some_days_ago_says_so() =>
        Assert.Equal("Gained 2.5 kg in 3 days up to 28 Feb", _rule.Read(AtHome.Weighed(-5, 80_000).Weighed(-3, 82_500)).Statement);

    [Fact]
    public void A_gain_just_above_is_written_so_that_it_can_be_told_from_its_limit() =>
        Assert.Equal("Gained 2.04 kg in 3 days", _rule.Read(AtHome.Weighed(-3, 80_000).Weighed(0, 82_040)).Statement);

    [Fact]
    public void In_pounds()
    {
        var finding = _rule.Read(AtHome.Weighed(-3, 80_000).Weighed(0, 82_500), Defaults with { WeightUnit = WeightUnit.Pounds });

        Assert.Equal(("Gained 5.5 lb in 3 days", "more than 4.4 lb in 3 days"), (finding.Statement, finding.Limit));
    }

    [Fact]
    public void The_fourth_day_before_does_not_count()
    {
        var finding = _rule.Read(AtHome.Weighed(-4, 80_000).Weighed(0, 83_000));

        Assert.Equal((Outcome.CannotTell, "no weight on the 3 days before 03 Mar 2026"), (finding.Outcome, finding.Missing));
    }

    [Fact]
    public void Without_a_weight_it_cannot_tell()
    {
        var finding = _rule.Read(AtHome);

        Assert.Equal((Outcome.CannotTell, "no accepted weight"), (finding.Outcome, finding.Missing));
    }

    [Fact]
    public void A_held_weight_does_not_count() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Weighed(-2, 80_000).Weighed(-1, 80_100).Weighed(0, 86_000, HoldReason.Unexplained)).Outcome);

    [Fact]
    public void It_does_not_apply_to_someone_who_neither_weighs_at_home_nor_has_a_weight() =>
        Assert.Empty(_rule.Assess(AtHome with { WeighsAtHome = false }, Defaults));

    [Fact]
    public void A_prescriber_can_set_another_limit_for_one_patient()
    {
        var finding = _rule.Read(AtHome.Weighed(-3, 80_000).Weighed(0, 81_600), Defaults.With([new("weight.gain-3-days", 1500)]));

        Assert.Equal((Outcome.Fires, "more than 1.5 kg in 3 days"), (finding.Outcome, finding.Limit));
    }

    [Fact]
    public void Switched_off_it_does_not_apply() =>
        Assert.Empty(_rule.Assess(AtHome.Weighed(-3, 80_000).Weighed(0, 90_000), Defaults.With([new("weight.gain-3-days", IsOn: false)])));
}
