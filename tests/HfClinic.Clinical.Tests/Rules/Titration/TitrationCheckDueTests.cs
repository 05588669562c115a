using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Pressure, heart rate and status of 30 days, blood tests of 90 days and at least 7 days after a step: defaults of this program.</summary>
public class TitrationCheckDueTests
{
    private readonly TitrationCheckDue _rule = new();

    [Theory]
    [InlineData(-29, Outcome.Clear)]
    [InlineData(-30, Outcome.Clear)]
    [InlineData(-31, Outcome.Fires)]
    public void Vitals_below_at_and_above(int day, Outcome expected)
    {
        Assert.Equal(expected, _rule.About(Short.NoVitals().Systolic(day, 118).Rate(0, 70), TitrationClass.BetaBlocker).Outcome);
        Assert.Equal(expected, _rule.About(Short.NoVitals().Systolic(0, 118).Rate(day, 70), TitrationClass.BetaBlocker).Outcome);
    }

    [Theory]
    [InlineData(-89, Outcome.Clear)]
    [InlineData(-90, Outcome.Clear)]
    [InlineData(-91, Outcome.Fires)]
    public void Blood_tests_below_at_and_above(int day, Outcome expected)
    {
        Assert.Equal(expected, _rule.About(Short.NoBlood().Blood("potassium", day, 4.4m).Blood("creatinine", 0, 88), TitrationClass.RasInhibitor).Outcome);
        Assert.Equal(expected, _rule.About(Short.NoBlood().Blood("potassium", 0, 4.4m).Blood("egfr", day, 60), TitrationClass.RasInhibitor).Outcome);
    }

    [Theory]
    [InlineData(-29, Outcome.Clear)]
    [InlineData(-30, Outcome.Clear)]
    [InlineData(-31, Outcome.Fires)]
    public void Weight_or_congestion_below_at_and_above(int day, Outcome expected)
    {
        var neither = Short with { Weights = [], Congestion = [] };

        Assert.Equal(expected, _rule.About(neither.Weighed(day, 70_000), TitrationClass.BetaBlocker).Outcome);
        Assert.Equal(expected, _rule.About(neither with { Congestion = [new(Today.AddDays(day), false)] }, TitrationClass.BetaBlocker).Outcome);
    }

    [Theory]
    [InlineData(-24, Outcome.Fires)]
    [InlineData(-23, Outcome.Clear)]
    [InlineData(-22, Outcome.Clear)]
    public void A_blood_test_counts_from_7_days_after_the_last_step_of_a_RAS_inhibitor_or_MRA(int day, Outcome expected)
    {
        var picture = Short.NoBlood().On("eplerenone", 25, 1, -30).Blood("potassium", day, 4.4m).Blood("creatinine", day, 88);

        Assert.Equal(expected, _rule.About(picture, TitrationClass.RasInhibitor).Outcome);
    }

    [Fact]
    public void It_blocks_the_gap_and_says_what_is_needed()
    {
        var picture = Short.NoBlood();

        Assert.Equal(Outcome.CannotTell, new TitrationOverdue().About(picture, TitrationClass.RasInhibitor).Outcome);
        Assert.Equal(
            "needed: potassium of the last 90 days, from 30 Nov 2025 on and creatinine or eGFR of the last 90 days, from 30 Nov 2025 on",
            _rule.About(picture, TitrationClass.RasInhibitor).Limit);
        Assert.Equal(Outcome.Clear, _rule.About(picture, TitrationClass.BetaBlocker).Outcome);
    }
}
