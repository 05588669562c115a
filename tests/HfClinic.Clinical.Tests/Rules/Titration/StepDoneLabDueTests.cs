using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Day 7, late after day 14 (default); MRA days 7, 28, 56, 84 (review tables), then every 120 days, late at 180 (default).</summary>
public class StepDoneLabDueTests
{
    private readonly StepDoneLabDue _rule = new();

    [Theory]
    [InlineData(6, Outcome.Clear, Urgency.ForInformation)]
    [InlineData(7, Outcome.Fires, Urgency.NextVisit)]
    [InlineData(8, Outcome.Fires, Urgency.NextVisit)]
    [InlineData(14, Outcome.Fires, Urgency.NextVisit)]
    [InlineData(15, Outcome.Fires, Urgency.ThisWeek)]
    public void Below_at_and_above(int days, Outcome outcome, Urgency urgency)
    {
        var finding = _rule.About(Well(30).On("ramipril", 2.5m, 2, -days), TitrationClass.RasInhibitor);

        Assert.Equal((outcome, urgency), (finding.Outcome, finding.Urgency));
    }

    [Theory]
    [InlineData(27, 7, Outcome.Clear)]
    [InlineData(28, 7, Outcome.Fires)]
    [InlineData(28, 17, Outcome.Fires)]
    [InlineData(28, 18, Outcome.Clear)]
    [InlineData(55, 28, Outcome.Clear)]
    [InlineData(56, 28, Outcome.Fires)]
    [InlineData(83, 56, Outcome.Clear)]
    [InlineData(84, 56, Outcome.Fires)]
    [InlineData(84, 70, Outcome.Clear)]
    [InlineData(203, 84, Outcome.Clear)]
    [InlineData(204, 84, Outcome.Fires)]
    public void An_MRA_has_four_due_days_and_then_120(int days, int testedOn, Outcome expected) => Assert.Equal(expected, _rule.About(
        Well(30).NoBlood().On("spironolactone", 25, 1, -days).Blood("potassium", testedOn - days, 4.4m).Blood("creatinine", testedOn - days, 88),
        TitrationClass.Mra).Outcome);

    [Theory]
    [InlineData(-119, Outcome.Clear, Urgency.ForInformation)]
    [InlineData(-120, Outcome.Fires, Urgency.NextVisit)]
    [InlineData(-179, Outcome.Fires, Urgency.NextVisit)]
    [InlineData(-180, Outcome.Fires, Urgency.ThisWeek)]
    public void On_a_stable_dose(int tested, Outcome outcome, Urgency urgency)
    {
        var finding = _rule.About(
            Well(30).NoBlood().On("ramipril", 5, 2, -250).Blood("potassium", tested, 4.4m).Blood("egfr", tested, 70), TitrationClass.RasInhibitor);

        Assert.Equal((outcome, urgency), (finding.Outcome, finding.Urgency));
    }

    [Fact]
    public void It_names_step_and_last_test() => Assert.Equal(
        "Potassium and creatinine due since 02 Mar 2026: ramipril 2.5 mg twice daily since 23 Feb 2026; last on 11 Feb 2026",
        _rule.About(Well(30).On("ramipril", 2.5m, 2, -8), TitrationClass.RasInhibitor).Statement);

    [Fact]
    public void A_beta_blocker_has_a_blood_test_after_start_and_target_only()
    {
        var step = Well(30).NoBlood().On("bisoprolol", 1.25m, 1, -40, -10).On("bisoprolol", 2.5m, 1, -10);

        Assert.Equal(Outcome.Clear, _rule.About(step, TitrationClass.BetaBlocker).Outcome);
        Assert.Equal(Outcome.Fires, _rule.About(step.Without("bisoprolol").On("bisoprolol", 1.25m, 1, -10), TitrationClass.BetaBlocker).Outcome);
        Assert.Equal(Outcome.Fires, _rule.About(step.Without("bisoprolol").On("bisoprolol", 7.5m, 1, -40, -10).On("bisoprolol", 10, 1, -10), TitrationClass.BetaBlocker).Outcome);
    }
}
