using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Whole patients, all invented, with what the rules must say and must not say. What a case does not give is well and fresh.</summary>
public class WorkedCaseTests
{
    private static PatientPicture PlainBetaBlockerGap => Well(30).NoVitals().Rate(0, 78).Systolic(0, 118)
        .On("bisoprolol", 2.5m, 1, -35).On("ramipril", 5, 2, -90).On("spironolactone", 25, 1, -90).On("dapagliflozin", 10, 1, -90);

    /// <summary>ESC 2021, Table 8.</summary>
    [Fact]
    public void T1_plain_beta_blocker_gap()
    {
        var betaBlocker = PlainBetaBlockerGap.Of(TitrationClass.BetaBlocker);

        Assert.Equal((TitrationState.Due, false, 25m, 35), (betaBlocker.State, betaBlocker.IsOverdue, betaBlocker.Percent, betaBlocker.DaysUnchanged));
        Assert.Equal("10 mg daily", betaBlocker.Target);
        Assert.Equal(
            "beta blocker: below target: bisoprolol 2.5 mg daily, 25 % of 10 mg daily (ESC), unchanged for 35 days; due since 24 Feb 2026",
            betaBlocker.Sentence);
        Assert.Equal(["below-target"], PlainBetaBlockerGap.Firing(TitrationClass.BetaBlocker));
        Assert.Empty(PlainBetaBlockerGap.Firing(TitrationClass.RasInhibitor));
        Assert.Empty(PlainBetaBlockerGap.Firing(TitrationClass.Sglt2Inhibitor));
        Assert.Equal(["information"], PlainBetaBlockerGap.Firing(TitrationClass.Mra));
        Assert.Equal(TitrationState.Information, PlainBetaBlockerGap.StateOf(TitrationClass.Mra));
    }

    [Fact]
    public void T1_in_the_AHA_profile_says_nothing_of_spironolactone_25()
    {
        Assert.Equal(["below-target"], PlainBetaBlockerGap.Firing(TitrationClass.BetaBlocker, Aha));
        Assert.Empty(PlainBetaBlockerGap.Firing(TitrationClass.Mra, Aha));
        Assert.Empty(PlainBetaBlockerGap.Firing(TitrationClass.RasInhibitor, Aha));
        Assert.Equal(TitrationState.AtTarget, PlainBetaBlockerGap.StateOf(TitrationClass.Mra, Aha));
    }

    /// <summary>ESC 2021, Table 8, footnote e (above 85 kg); ACC 2017, Table 1 (85 kg or more).</summary>
    [Theory]
    [InlineData(80_000, "ESC", TitrationState.AtTarget, 100, false)]
    [InlineData(85_000, "ESC", TitrationState.AtTarget, 100, false)]
    [InlineData(85_001, "ESC", TitrationState.AtTarget, 100, true)]
    [InlineData(92_000, "ESC", TitrationState.AtTarget, 100, true)]
    [InlineData(80_000, "AHA", TitrationState.AtTarget, 100, false)]
    [InlineData(84_999, "AHA", TitrationState.AtTarget, 100, false)]
    [InlineData(85_000, "AHA", TitrationState.Due, 50, false)]
    [InlineData(92_000, "AHA", TitrationState.Due, 50, false)]
    public void T2_weight_dependent_carvedilol(int grams, string profile, TitrationState state, decimal percent, bool information)
    {
        var protocol = Defaults with { Profile = profile };
        var picture = Carvedilol(grams);
        var reading = picture.Of(TitrationClass.BetaBlocker, protocol);

        Assert.Equal((state, percent), (reading.State, reading.Percent));
        Assert.Equal(information, picture.Firing(TitrationClass.BetaBlocker, protocol).Contains("information"));
        Assert.Equal(state == TitrationState.Due, picture.Firing(TitrationClass.BetaBlocker, protocol).Contains("overdue"));
    }

    [Fact]
    public void T2_it_names_the_weight() => Assert.Contains(
        "50 mg twice daily may be given: weight 92.0 kg, above 85 kg",
        new TitrationInformation().About(Carvedilol(92_000), TitrationClass.BetaBlocker).Statement);

    [Theory]
    [InlineData(-90, TitrationState.Due)]
    [InlineData(-91, TitrationState.CheckDue)]
    public void T2_a_weight_too_old_is_asked_for(int weighedOn, TitrationState state) => Assert.Equal(
        state, (Carvedilol(92_000) with { Weights = [] }).Weighed(weighedOn, 92_000).StateOf(TitrationClass.BetaBlocker, Aha));

    /// <summary>ESC 2021, Supplementary Table 3; STRONG-HF: no step below 55/min in sinus rhythm.</summary>
    [Theory]
    [InlineData("ESC")]
    [InlineData("AHA")]
    public void T3_slow_heart_rate(string profile)
    {
        var protocol = Defaults with { Profile = profile };
        var picture = Well(28).NoVitals().Rate(0, 48).Systolic(0, 112).On("bisoprolol", 5, 1, -50).Told(0, Symptoms.Fatigue);
        var reading = picture.Of(TitrationClass.BetaBlocker, protocol);

        Assert.Equal((TitrationState.Held, true, LimitEffect.Review), (reading.State, reading.IsSetAside, reading.Holds[0].Effect));
        Assert.Equal(["held"], picture.Firing(TitrationClass.BetaBlocker, protocol));
        Assert.Contains("heart rate 48/min on 03 Mar 2026 (limit: below 50/min; slow heart rate: ECG and other rate-lowering medicines)", reading.Sentence);
    }

    /// <summary>ESC 2021, Table 37 (quality indicators) and Table 8.</summary>
    [Theory]
    [InlineData("metoprolol tartrate", 100, 2, "ESC")]
    [InlineData("metoprolol tartrate", 100, 2, "AHA")]
    [InlineData("atenolol", 50, 1, "ESC")]
    [InlineData("atenolol", 50, 1, "AHA")]
    public void T8_wrong_beta_blocker(string medicine, decimal milligrams, decimal times, string profile)
    {
        var protocol = Defaults with { Profile = profile };
        var picture = Well(36).NoVitals().Rate(0, 68).Systolic(0, 118).On(medicine, milligrams, times, -100);
        var reading = picture.Of(TitrationClass.BetaBlocker, protocol);

        Assert.Null(reading.Percent);
        Assert.Null(reading.Taken);
        Assert.Equal(["beta-blocker-not-evidence-based", "overdue"], picture.Firing(TitrationClass.BetaBlocker, protocol));
        Assert.Equal(TitrationState.NotCovered, reading.State);
        Assert.Empty((picture with { EjectionFractions = [] }).Ejection("58").Firing(TitrationClass.BetaBlocker, protocol));
    }

    /// <summary>ESC 2023, recommendation table 2; AHA 2022.</summary>
    [Theory]
    [InlineData("ESC")]
    [InlineData("AHA")]
    public void T9_preserved_ejection_fraction_is_no_titration_phenotype(string profile)
    {
        var protocol = Defaults with { Profile = profile };
        var picture = Well(58).NoVitals().NoBlood().Rate(0, 82).Systolic(0, 130).InRhythm(-1, Rhythm.AtrialFibrillation).Blood("egfr", -20, 55)
            .On("bisoprolol", 2.5m, 1, -100).On("candesartan", 8, 1, -100).On("diltiazem", 120, 1, -100);

        Assert.Equal(TitrationState.NotCovered, picture.StateOf(TitrationClass.Sglt2Inhibitor, protocol));
        Assert.Equal(["overdue"], picture.Firing(TitrationClass.Sglt2Inhibitor, protocol));
        Assert.DoesNotContain("below-target", picture.Firing(TitrationClass.BetaBlocker, protocol).Concat(picture.Firing(TitrationClass.RasInhibitor, protocol)));
        Assert.DoesNotContain("overdue", picture.Firing(TitrationClass.BetaBlocker, protocol).Concat(picture.Firing(TitrationClass.RasInhibitor, protocol)));
        Assert.Empty(picture.Firing(TitrationClass.Mra, protocol));
    }

    /// <summary>In atrial fibrillation a beta blocker's gap counts one level lower (ESC 2021, 5.3.2).</summary>
    [Fact]
    public void T9_with_an_ejection_fraction_of_38_dose_gaps_appear()
    {
        var picture = Well(38).NoVitals().Rate(0, 82).Systolic(0, 130).InRhythm(-1, Rhythm.AtrialFibrillation)
            .On("bisoprolol", 2.5m, 1, -30).On("candesartan", 8, 1, -30).On("dapagliflozin", 10, 1, -30);

        Assert.Equal(Urgency.ForInformation, new BelowTargetAndDue().About(picture, TitrationClass.BetaBlocker).Urgency);
        Assert.Equal(Urgency.NextVisit, new BelowTargetAndDue().About(picture, TitrationClass.RasInhibitor).Urgency);
        Assert.Equal(HarmFlag.Review, HarmList.Find("diltiazem")!.Flag);
        Assert.Equal(HarmScope.ReducedNow, HarmList.Find("diltiazem")!.Scope);
    }

    /// <summary>STRONG-HF as told in ESC 2023.</summary>
    [Fact]
    public void T11_post_discharge_track()
    {
        var picture = AfterDischarge(8, 5.2m, 1150);
        var track = TitrationAssessment.Of(picture, Track).Track!;

        Assert.Equal(2, track.SafetyIndicators.Length);
        Assert.Equal(["potassium 5.2 mmol/L on 03 Mar 2026", "NT-proBNP 15 % above the value before discharge on 03 Mar 2026"], track.SafetyIndicators.Select(one => one.Words));
        Assert.Equal((2, Today.AddDays(6)), (track.NextVisit!.Value.Week, track.NextVisit.Value.On));
        Assert.All([TitrationClass.BetaBlocker, TitrationClass.RasInhibitor], one => Assert.Equal(TitrationState.Held, picture.StateOf(one, Track)));
        var step = Assert.Single(new PostDischargeStep().Assess(picture, Track));
        Assert.Contains("visit of week 2 due 09 Mar 2026", step.Statement);
        Assert.Contains("potassium 5.2 mmol/L", step.Statement);
        Assert.Contains("NT-proBNP 15 %", step.Statement);
    }

    [Theory]
    [InlineData(20, 4.4, TitrationState.NotYetDue)]
    [InlineData(21, 4.4, TitrationState.Due)]
    [InlineData(21, 5.2, TitrationState.Held)]
    public void T11_overdue_on_day_21_but_not_while_held(int day, decimal potassium, TitrationState state)
    {
        var reading = AfterDischarge(day, potassium, 900).Of(TitrationClass.RasInhibitor, Track);

        Assert.Equal((state, state == TitrationState.Due), (reading.State, reading.IsOverdue));
    }

    /// <summary>Ivabradine label; ESC 2021, 5.4.3.</summary>
    [Fact]
    public void T14_ivabradine()
    {
        Assert.Empty(Ivabradine(58).Firing(TitrationClass.Ivabradine));
        Assert.Equal(["below-target"], Ivabradine(66).Firing(TitrationClass.Ivabradine));
        var fibrillating = Ivabradine(66).InRhythm(-1, Rhythm.AtrialFibrillation);
        Assert.Equal(["ivabradine-rhythm"], fibrillating.Firing(TitrationClass.Ivabradine));
        var finding = new IvabradineNotInSinusRhythm().About(fibrillating, TitrationClass.Ivabradine);
        Assert.Equal(Urgency.ThisWeek, finding.Urgency);
        Assert.EndsWith("acts only in sinus rhythm", finding.Statement);
    }

    [Theory]
    [InlineData(49, TitrationState.Held)]
    [InlineData(50, TitrationState.AtTarget)]
    [InlineData(51, TitrationState.AtTarget)]
    [InlineData(59, TitrationState.AtTarget)]
    [InlineData(60, TitrationState.AtTarget)]
    [InlineData(61, TitrationState.Due)]
    public void T14_the_target_is_50_to_60_inclusive(int rate, TitrationState state)
    {
        Assert.Equal(state, Ivabradine(rate).StateOf(TitrationClass.Ivabradine));
        Assert.Equal(state, Ivabradine(rate).StateOf(TitrationClass.Ivabradine, Aha));
    }

    private static readonly ClinicProtocol Track = Defaults.With([new("titration.after-discharge.days", IsOn: true)]);

    private static PatientPicture Carvedilol(int grams) =>
        (Well(32).NoVitals().NoBlood() with { Weights = [] }).Weighed(0, grams).Rate(0, 70).Systolic(0, 124).On("carvedilol", 25, 2, -60);

    private static PatientPicture Ivabradine(int rate) => Well(30).NoVitals().Rate(0, rate).Systolic(0, 118)
        .On("ivabradine", 5, 2, -30).On("bisoprolol", 5, 1, -60).Limit(TitrationClass.BetaBlocker, -30);

    private static PatientPicture AfterDischarge(int day, decimal potassium, decimal peptide) =>
        (Well(30).NoVitals().NoBlood() with { DischargedFromHospitalOn = Today.AddDays(-day) })
            .Rate(0, 72).Systolic(0, 104).Blood("potassium", 0, potassium).Blood("creatinine", 0, 95).Blood("egfr", 0, 56)
            .Blood("nt-probnp", -day, 1000).Blood("nt-probnp", 0, peptide)
            .On("bisoprolol", 5, 1, -day).On("enalapril", 5, 2, -day).On("spironolactone", 25, 1, -day);
}
