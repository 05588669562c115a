using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>A fluid score above 2.0: a default of this program, no published source. The score itself is checked against reference series.</summary>
public class FluidGainTests
{
    private readonly FluidGain _rule = new();

    private static PatientPicture Gaining => AtHome.Target(-60, 80_000).WeighedDaily(0, [.. About(80_000, 40), 80_500, 81_000, 81_400, 82_000]);

    [Theory]
    [InlineData(-0.001, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(0.001, Outcome.Fires)]
    public void Below_at_and_above(double beyond, Outcome expected)
    {
        var score = _rule.Read(Gaining).Magnitude!.Value;

        Assert.InRange(score, 1.6m, 3.9m);
        Assert.Equal(expected, _rule.Read(Gaining, Defaults.With([new("trend.fluid-gain", score - (decimal)beyond)])).Outcome);
    }

    [Fact]
    public void It_says_it_in_kilograms_days_and_scatter_and_never_as_a_score()
    {
        var finding = _rule.Read(Gaining);

        Assert.Matches(@"^\d\.\d kg above own baseline over \d days; day-to-day scatter 0\.\d kg$", finding.Statement);
        Assert.Matches(@"^more than \d\.\d kg of fluid, 2\.0 times this person's usual coming and going$", finding.Limit);
        Assert.Equal(Urgency.ThisWeek, finding.Urgency);
        Assert.Equal(
            ["Own baseline", "Today", "Weight with the scatter taken out", "Of it counted as fluid", "Day-to-day scatter", "Change per week"],
            finding.Evidence.Select(evidence => evidence.What));
        Assert.Equal("82.0 kg", finding.Evidence[1].Value);
        Assert.Equal(Today.AddDays(-4), finding.Evidence[0].Day);
        Assert.All(finding.Evidence, evidence => Assert.Contains("kg", evidence.Value));
    }

    [Fact]
    public void The_amount_is_what_the_evidence_shows_between_baseline_and_now()
    {
        var finding = _rule.Read(Gaining);
        var (baseline, now) = (Kilograms(finding.Evidence[0]), Kilograms(finding.Evidence[2]));

        Assert.InRange(Kilograms(finding.Statement) - (now - baseline), -0.1m, 0.1m);
        Assert.InRange(now - baseline, 1.2m, 2.2m);
        Assert.Equal(80.0m, baseline, 0);
    }

    [Fact]
    public void A_baseline_that_falls_meanwhile_does_not_make_a_gain_look_smaller()
    {
        var falling = AtHome.Target(-60, 80_000).WeighedDaily(0, [.. Enumerable.Range(0, 60).Select(day => 84_000 - (day * 60)), 81_800, 82_600, 83_200, 83_400]);

        var finding = _rule.Read(falling);

        Assert.True(Kilograms(finding.Statement) >= Kilograms(finding.Evidence[3]) - 0.1m);
    }

    [Fact]
    public void The_days_count_from_where_the_fluid_last_stood_at_the_baseline() =>
        Assert.Contains(" over 4 days", _rule.Read(Gaining).Statement);

    [Fact]
    public void A_step_is_named_as_such() =>
        Assert.Contains(
            "; in one step on 02 Mar: another scale or a true change",
            _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(0, [.. About(80_000, 40), 85_000, 85_100])).Statement);

    [Fact]
    public void A_gain_of_days_ago_is_named_with_its_day() =>
        Assert.Contains(" days up to 01 Mar;", _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(-2, [.. About(80_000, 40), 80_500, 81_000, 81_400, 82_000])).Statement);

    [Theory]
    [InlineData(-7, Outcome.Fires)]
    [InlineData(-8, Outcome.CannotTell)]
    public void A_week_after_the_last_weight_it_cannot_tell(int lastDay, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(lastDay, [.. About(80_000, 40), 80_500, 81_000, 81_400, 82_000])).Outcome);

    [Theory]
    [InlineData(6, Outcome.CannotTell)]
    [InlineData(7, Outcome.Fires)]
    public void It_learns_until_there_are_7_weights_in_14_days(int weights, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(0, Enumerable.Range(0, weights).Select(day => 80_000 + (day * 500)))).Outcome);

    [Fact]
    public void While_it_learns_it_says_how_far_it_is()
    {
        Assert.Equal(
            "still learning this person's own scatter: 3 of 7 weights in 14 days",
            _rule.Read(AtHome.Weighed(-14, 80_000).Weighed(-13, 80_000).Weighed(-2, 80_000).Weighed(0, 80_000)).Missing);
        Assert.Equal("no accepted weight", _rule.Read(AtHome).Missing);
    }

    [Fact]
    public void A_held_weight_does_not_count() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(-1, About(80_000, 40)).Weighed(0, 90_000, HoldReason.Unexplained)).Outcome);

    [Fact]
    public void A_discharge_is_a_new_baseline()
    {
        var lost = AtHome.Target(-60, 80_000).Target(-5, 76_000).WeighedDaily(0, [.. About(76_000, 40), 80_000, 80_000, 80_000, 80_000]);

        Assert.Equal(Outcome.Fires, _rule.Read(lost).Outcome);
        Assert.Equal(Outcome.Clear, _rule.Read(lost with { DischargedFromHospitalOn = Today.AddDays(-3), TargetWeights = [] }).Outcome);
    }

    [Fact]
    public void A_repeat_joins_the_flag_and_one_standard_deviation_more_is_news()
    {
        var first = Open(_rule.Read(Gaining));
        var same = _rule.Read(Gaining) with { Magnitude = first.Magnitude + 0.999m, Statement = "further" };
        var more = same with { Magnitude = first.Magnitude + 1 };

        Assert.Equal(FlagChangeKind.Join, Assert.Single(FlagReconciler.Reconcile([first], [same], [_rule], Today)).Kind);
        Assert.Equal(FlagChangeKind.Escalate, Assert.Single(FlagReconciler.Reconcile([first], [more], [_rule], Today)).Kind);
    }

    [Fact]
    public void It_stays_when_the_fluid_falls()
    {
        var change = Assert.Single(FlagReconciler.Reconcile([Open(_rule.Read(Gaining))], [_rule.Read(AtHome.WeighedDaily(0, About(80_000, 40)))], [_rule], Today));

        Assert.Equal((FlagChangeKind.NoLongerMet, FlagState.Open), (change.Kind, change.After.State));
    }

    private static decimal Kilograms(Evidence evidence) => Kilograms(evidence.Value.TrimStart('+'));

    private static decimal Kilograms(string words) => decimal.Parse(words[..words.IndexOf(' ')], System.Globalization.CultureInfo.InvariantCulture);

    private LiveFlag Open(Finding finding) => Assert.Single(FlagReconciler.Reconcile([], [finding], [_rule], Today)).After with { Id = 1 };
}
