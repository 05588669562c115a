using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>28 days (MRA 56), a default of this program; targets: ESC 2021, Table 8, and AHA 2022, Table 14.</summary>
public class BelowTargetAndDueTests
{
    private readonly BelowTargetAndDue _rule = new();

    [Theory]
    [InlineData("bisoprolol", 2.5, 1, TitrationClass.BetaBlocker, 28, 42)]
    [InlineData("ramipril", 2.5, 1, TitrationClass.RasInhibitor, 28, 42)]
    [InlineData("valsartan", 40, 2, TitrationClass.RasInhibitor, 28, 42)]
    [InlineData("sacubitril/valsartan", 50, 2, TitrationClass.RasInhibitor, 28, 42)]
    [InlineData("spironolactone", 12.5, 1, TitrationClass.Mra, 56, 84)]
    [InlineData("sotagliflozin", 200, 1, TitrationClass.Sglt2Inhibitor, 28, 42)]
    [InlineData("vericiguat", 2.5, 1, TitrationClass.Vericiguat, 28, 42)]
    [InlineData("hydralazine/isosorbide dinitrate", 57.5, 3, TitrationClass.HydralazineNitrate, 28, 42)]
    public void Below_at_and_above(string medicine, decimal milligrams, decimal times, TitrationClass titration, int gap, int overdue)
    {
        PatientPicture After(int days) => Well(30).Blood("potassium", 0, 4.4m).Blood("creatinine", 0, 88).On(medicine, milligrams, times, -days);

        Assert.All([Esc, Aha], protocol =>
        {
            Assert.Equal(Outcome.Clear, _rule.About(After(gap - 1), titration, protocol).Outcome);
            Assert.Equal(Outcome.Fires, _rule.About(After(gap), titration, protocol).Outcome);
            Assert.Equal(Outcome.Fires, _rule.About(After(gap + 1), titration, protocol).Outcome);
            Assert.Equal(Outcome.Fires, _rule.About(After(overdue - 1), titration, protocol).Outcome);
            Assert.Equal(Outcome.Clear, _rule.About(After(overdue), titration, protocol).Outcome);
        });
    }

    [Theory]
    [InlineData(41, Outcome.Clear)]
    [InlineData(42, Outcome.Fires)]
    public void Finerenone_where_the_ejection_fraction_is_not_reduced(int days, Outcome expected) => Assert.Equal(
        expected, _rule.About(Well(55).On("finerenone", 10, 1, -days).Blood("egfr", -days, 40), TitrationClass.Finerenone).Outcome);

    [Fact]
    public void The_days_count_from_the_change_of_dose_not_from_a_renewal()
    {
        var renewed = Well(30).On("bisoprolol", 2.5m, 1, -35, -10).On("bisoprolol", 2.5m, 1, -10);

        Assert.Equal(35, renewed.Of(TitrationClass.BetaBlocker).DaysUnchanged);
    }

    [Fact]
    public void A_recorded_limit_closes_it() => Assert.Equal(
        "beta blocker: below target: bisoprolol 2.5 mg daily, 25 % of 10 mg daily (ESC), unchanged for 100 days; limit recorded by Dr Invented on 21 Feb 2026: dizzy at the next step",
        Short.Limit(TitrationClass.BetaBlocker, -10).Of(TitrationClass.BetaBlocker).Sentence);

    [Theory]
    [InlineData("losartan", 50, TitrationState.Due)]
    [InlineData("losartan", 100, TitrationState.Information)]
    [InlineData("losartan", 150, TitrationState.AtTarget)]
    [InlineData("perindopril erbumine", 2, TitrationState.Due)]
    [InlineData("telmisartan", 40, TitrationState.AtTarget)]
    public void Where_a_label_stops_short_of_the_target_it_is_information(string medicine, decimal milligrams, TitrationState state) =>
        Assert.Equal(state, Well(30).On(medicine, milligrams, 1, -30).StateOf(TitrationClass.RasInhibitor));

    /// <summary>EU label of perindopril, from memory: 4 mg erbumine.</summary>
    [Theory]
    [InlineData("ESC", TitrationState.Information)]
    [InlineData("AHA", TitrationState.Due)]
    public void Perindopril_4(string profile, TitrationState state) => Assert.Equal(
        state, Well(30).On("perindopril erbumine", 4, 1, -30).StateOf(TitrationClass.RasInhibitor, Defaults with { Profile = profile }));

    [Fact]
    public void A_safety_flag_sets_it_aside_without_clearing_it()
    {
        var picture = Short with { OpenSafetyFlags = [new("safety.potassium", TitrationClass.BetaBlocker)] };

        var finding = _rule.About(picture, TitrationClass.BetaBlocker);
        Assert.Equal((Outcome.CannotTell, "set aside while safety flag safety.potassium is open"), (finding.Outcome, finding.Missing));
    }

    /// <summary>
    /// Shortest intervals: ESC 2021 supplement (second-hand) 14 days; sacubitril/valsartan label 14, after a low start 21; MRA 28, from memory.
    /// </summary>
    [Theory]
    [InlineData("bisoprolol", 2.5, 1, TitrationClass.BetaBlocker, 14)]
    [InlineData("ramipril", 2.5, 2, TitrationClass.RasInhibitor, 14)]
    [InlineData("sacubitril/valsartan", 100, 2, TitrationClass.RasInhibitor, 14)]
    [InlineData("sacubitril/valsartan", 50, 2, TitrationClass.RasInhibitor, 21)]
    [InlineData("spironolactone", 12.5, 1, TitrationClass.Mra, 28)]
    public void The_first_day_a_step_could_come(string medicine, decimal milligrams, decimal times, TitrationClass titration, int days) =>
        Assert.Equal(Today.AddDays(days - 10), Well(30).On(medicine, milligrams, times, -10).Of(titration).StepFrom);

    [Fact]
    public void Hydralazine_and_nitrate_given_apart_go_by_the_one_farther_from_its_target() => Assert.Equal(
        50, Well(30).On("hydralazine", 75, 3, -30).On("isosorbide dinitrate", 20, 3, -30).Of(TitrationClass.HydralazineNitrate).Percent);

    /// <summary>Finerenone label: 40 mg from an eGFR of 60 at the start, 20 mg from 25 to below 60 (the latter from memory).</summary>
    [Theory]
    [InlineData(59, 100)]
    [InlineData(60, 50)]
    [InlineData(61, 50)]
    public void The_target_of_finerenone_goes_by_the_eGFR_at_its_start(decimal egfr, decimal percent) => Assert.Equal(
        percent, Well(55).NoBlood().On("finerenone", 20, 1, -30).Blood("egfr", -30, egfr).Of(TitrationClass.Finerenone).Percent);
}
