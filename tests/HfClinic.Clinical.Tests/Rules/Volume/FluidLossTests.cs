using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>
/// A fluid score below −2.0: a default of this program. Creatinine +26.5 µmol/L in 48 hours, 1.5 times in 7 days: KDIGO 2012,
/// from memory. The other signs: common practice, no source.
/// </summary>
public class FluidLossTests
{
    private readonly FluidLoss _rule = new();

    private static PatientPicture Losing => AtHome.Target(-60, 80_000).WeighedDaily(0, [.. About(80_000, 40), 79_500, 79_000, 78_600, 78_000]);

    [Theory]
    [InlineData(-0.001, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(0.001, Outcome.Fires)]
    public void Below_at_and_above(double beyond, Outcome expected)
    {
        var score = _rule.Read(Losing).Magnitude!.Value;
        var protocol = Defaults.With([new("trend.fluid-loss", score - (decimal)beyond), new("trend.off-target-certainty", IsOn: false)]);

        Assert.InRange(score, 1.6m, 3.9m);
        Assert.Equal(expected, _rule.Read(Losing, protocol).Outcome);
    }

    [Fact]
    public void Alone_it_is_a_plain_loss_for_this_week()
    {
        var finding = _rule.Read(Losing);

        Assert.Matches(@"^\d\.\d kg below own baseline over 5 days; day-to-day scatter 0\.\d kg$", finding.Statement);
        Assert.Equal(Urgency.ThisWeek, finding.Urgency);
    }

    [Fact]
    public void A_trend_below_target_for_certain_is_a_loss_too()
    {
        var finding = _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(0, About(76_500, 60)));

        Assert.Matches(@"^3\.\d kg below target with the scatter taken out \(2\.\d to 4\.\d kg\)$", finding.Statement);
        Assert.Equal("more than 2.0 kg, and 1.0 kg or more beyond doubt", finding.Limit);
    }

    [Fact]
    public void With_signs_beside_it_it_is_possible_over_diuresis_for_today()
    {
        var finding = _rule.Read(Losing.Told(-1, Symptoms.Dizziness | Symptoms.Cough).Systolic(0, 88).Tested("potassium", -2, 3.2m));

        Assert.StartsWith("Possible over-diuresis: ", finding.Statement);
        Assert.EndsWith("; dizzy; systolic 88; potassium 3.2 mmol/L", finding.Statement);
        Assert.Equal(Urgency.Today, finding.Urgency);
        Assert.Equal(["Reported", "Systolic pressure", "Potassium"], finding.Evidence.Skip(6).Select(evidence => evidence.What));
    }

    [Theory]
    [InlineData(Symptoms.Dizziness, Urgency.Today)]
    [InlineData(Symptoms.Syncope, Urgency.Today)]
    [InlineData(Symptoms.PoorAppetite, Urgency.ThisWeek)]
    public void Dizziness_and_fainting_are_signs(Symptoms told, Urgency expected) => Assert.Equal(expected, _rule.Read(Losing.Told(-3, told)).Urgency);

    [Theory]
    [InlineData(89, Urgency.Today)]
    [InlineData(90, Urgency.ThisWeek)]
    public void So_is_a_systolic_pressure_below_90(int systolic, Urgency expected) => Assert.Equal(expected, _rule.Read(Losing.Systolic(0, systolic)).Urgency);

    [Theory]
    [InlineData(118, 99, Urgency.ThisWeek)]
    [InlineData(119, 99, Urgency.Today)]
    [InlineData(120, 99, Urgency.Today)]
    [InlineData(130, 100, Urgency.ThisWeek)]
    public void So_is_a_fall_by_20_from_the_own_median_to_below_100(int usual, int now, Urgency expected) =>
        Assert.Equal(expected, _rule.Read(Losing.Systolic(-14, usual).Systolic(-9, usual).Systolic(-5, usual).Systolic(0, now)).Urgency);

    [Fact]
    public void A_median_needs_three_pressures_of_the_last_14_days() =>
        Assert.Equal(Urgency.ThisWeek, _rule.Read(Losing.Systolic(-15, 130).Systolic(-9, 130).Systolic(-5, 130).Systolic(0, 95)).Urgency);

    [Theory]
    [InlineData(-2, 100, 126.4, Urgency.ThisWeek)]
    [InlineData(-2, 100, 126.5, Urgency.Today)]
    [InlineData(-3, 100, 126.5, Urgency.ThisWeek)]
    [InlineData(-7, 60, 89.9, Urgency.ThisWeek)]
    [InlineData(-7, 60, 90, Urgency.Today)]
    [InlineData(-90, 100, 129.9, Urgency.ThisWeek)]
    [InlineData(-90, 100, 130, Urgency.Today)]
    [InlineData(-400, 100, 200, Urgency.ThisWeek)]
    public void So_is_a_rise_of_creatinine(int day, decimal earlier, decimal now, Urgency expected) =>
        Assert.Equal(expected, _rule.Read(Losing.Tested("creatinine", day, earlier).Tested("creatinine", 0, now)).Urgency);

    [Fact]
    public void The_rise_is_named_with_both_values() =>
        Assert.EndsWith("; creatinine 90 → 130.5 µmol/L", _rule.Read(Losing.Tested("creatinine", -30, 90).Tested("creatinine", -1, 130.5m)).Statement);

    [Theory]
    [InlineData("sodium", 134.9, Urgency.Today)]
    [InlineData("sodium", 135, Urgency.ThisWeek)]
    [InlineData("sodium", 145, Urgency.ThisWeek)]
    [InlineData("sodium", 145.1, Urgency.Today)]
    [InlineData("potassium", 3.4, Urgency.Today)]
    [InlineData("potassium", 3.5, Urgency.ThisWeek)]
    [InlineData("potassium", 5.5, Urgency.ThisWeek)]
    [InlineData("potassium", 5.6, Urgency.Today)]
    public void So_are_sodium_and_potassium_out_of_range(string analyte, decimal value, Urgency expected) =>
        Assert.Equal(expected, _rule.Read(Losing.Tested(analyte, -14, value)).Urgency);

    [Fact]
    public void An_old_blood_test_is_no_sign() => Assert.Equal(Urgency.ThisWeek, _rule.Read(Losing.Tested("potassium", -15, 3.0m)).Urgency);

    [Fact]
    public void Signs_without_a_loss_are_none_of_its_business() =>
        Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Target(-60, 80_000).WeighedDaily(0, About(80_000, 40)).Told(0, Symptoms.Dizziness)).Outcome);

    [Fact]
    public void While_the_trend_learns_it_cannot_tell() => Assert.Equal(Outcome.CannotTell, _rule.Read(AtHome.Weighed(0, 80_000)).Outcome);
}
