using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>5 days, 3 under close watch: a default of this program, no published source.</summary>
public class NoWeightTests
{
    private readonly NoWeight _rule = new();

    [Theory]
    [InlineData(-4, Outcome.Clear)]
    [InlineData(-5, Outcome.Fires)]
    [InlineData(-6, Outcome.Fires)]
    public void Below_at_and_above(int lastDay, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(lastDay, 80_000)).Outcome);

    [Theory]
    [InlineData(-2, Outcome.Clear)]
    [InlineData(-3, Outcome.Fires)]
    [InlineData(-4, Outcome.Fires)]
    public void With_an_open_flag_below_at_and_above(int lastDay, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(lastDay, 80_000) with { OpenFlagRules = ["volume.above-target"] }).Outcome);

    [Fact]
    public void Its_own_flag_does_not_shorten_the_time() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Weighed(-3, 80_000) with { OpenFlagRules = [_rule.Id] }).Outcome);

    [Theory]
    [InlineData(-29, Outcome.Fires)]
    [InlineData(-30, Outcome.Fires)]
    [InlineData(-31, Outcome.Clear)]
    public void A_discharge_within_30_days_shortens_the_time(int dischargedOn, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-3, 80_000) with { DischargedFromHospitalOn = Today.AddDays(dischargedOn) }).Outcome);

    [Theory]
    [InlineData("furosemide", -13, Outcome.Fires)]
    [InlineData("furosemide", -14, Outcome.Fires)]
    [InlineData("furosemide", -15, Outcome.Clear)]
    [InlineData("bisoprolol", -2, Outcome.Clear)]
    public void A_diuretic_changed_within_14_days_shortens_the_time(string medicine, int from, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-3, 80_000).Dose(medicine, 80, -100, from).Dose(medicine, 40, from)).Outcome);

    [Fact]
    public void A_diuretic_stopped_is_a_change() =>
        Assert.Equal("No weight for 3 days; diuretic changed 01 Mar", _rule.Read(AtHome.Weighed(-3, 80_000).Dose("bumetanide", 1, -100, -2)).Statement);

    [Fact]
    public void The_same_dose_written_anew_is_no_change() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Weighed(-3, 80_000).Dose("furosemide", 40, -100, -2).Dose("furosemide", 40, -2)).Outcome);

    [Fact]
    public void It_says_for_how_long_and_why_so_soon()
    {
        var finding = _rule.Read(AtHome.Weighed(-6, 80_000) with { OpenFlagRules = ["volume.gain-3-days"] });

        Assert.Equal(("No weight for 6 days; open flag", "3 days or more without a weight, under close watch"), (finding.Statement, finding.Limit));
        Assert.Equal((Urgency.ThisWeek, 6m), (finding.Urgency, finding.Magnitude));
        Assert.Equal([new Evidence("Last weight", "80.0 kg", Today.AddDays(-6), 100, RaisedIt: true)], finding.Evidence);
    }

    [Fact]
    public void Without_any_weight_the_days_count_from_enrolment()
    {
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome with { EnrolledOn = Today.AddDays(-4) }).Outcome);
        Assert.Equal("No weight for 5 days", _rule.Read(AtHome with { EnrolledOn = Today.AddDays(-5) }).Statement);
    }

    [Fact]
    public void A_held_reading_is_no_silence() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Weighed(-9, 80_000).Weighed(0, 170_000, HoldReason.PoundsTakenAsKilograms)).Outcome);

    [Fact]
    public void It_does_not_apply_to_someone_who_does_not_weigh_at_home() =>
        Assert.Empty(_rule.Assess(AtHome.Weighed(-60, 80_000) with { WeighsAtHome = false }, Defaults));
}
