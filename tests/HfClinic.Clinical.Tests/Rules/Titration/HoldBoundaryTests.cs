using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Each limit at below, at and above, with the operator of its source, named beside it. 0 is no hold.</summary>
public class HoldBoundaryTests
{
    private const LimitEffect None = 0;

    /// <summary>
    /// Above 5.0 hold, above 5.5 review, above 6.0 urgent: ESC 2021 supplement (second-hand), NHS SPS. The same in both profiles.
    /// </summary>
    [Theory]
    [InlineData(4.9, None)]
    [InlineData(5.0, None)]
    [InlineData(5.1, LimitEffect.Hold)]
    [InlineData(5.5, LimitEffect.Hold)]
    [InlineData(5.6, LimitEffect.Review)]
    [InlineData(6.0, LimitEffect.Review)]
    [InlineData(6.1, LimitEffect.Urgent)]
    public void Potassium(decimal value, LimitEffect effect)
    {
        var picture = Short.Blood("potassium", -1, value);

        Assert.All([Esc, Aha], protocol =>
        {
            Assert.Equal(effect, Effect(picture, TitrationClass.RasInhibitor, protocol));
            Assert.Equal(effect, Effect(picture, TitrationClass.Mra, protocol));
            Assert.Equal(None, Effect(picture, TitrationClass.BetaBlocker, protocol));
        });
    }

    /// <summary>Eplerenone label: urgent at 6.0 and above.</summary>
    [Theory]
    [InlineData(5.9, LimitEffect.Review)]
    [InlineData(6.0, LimitEffect.Urgent)]
    [InlineData(6.1, LimitEffect.Urgent)]
    public void Potassium_on_eplerenone(decimal value, LimitEffect effect) => Assert.Equal(
        effect, Effect(Short.Without("spironolactone").On("eplerenone", 25, 1, -100).Blood("potassium", -1, value), TitrationClass.Mra));

    /// <summary>An MRA is started with potassium of 5.0 or below (ESC), below 5.0 (AHA 2022, 7.3.3).</summary>
    [Theory]
    [InlineData(4.9, None, None)]
    [InlineData(5.0, None, LimitEffect.Hold)]
    [InlineData(5.1, LimitEffect.Hold, LimitEffect.Hold)]
    public void Potassium_before_an_MRA(decimal value, LimitEffect esc, LimitEffect aha)
    {
        var picture = Short.Without("spironolactone").Blood("potassium", -1, value);

        Assert.Equal((esc, aha), (Effect(picture, TitrationClass.Mra), Effect(picture, TitrationClass.Mra, Aha)));
    }

    /// <summary>eGFR below 30 holds an MRA (ESC); 30 and below (AHA 2022); below 50 half the dose is asked for (from memory).</summary>
    [Theory]
    [InlineData(29, "below 30", "at or below 30")]
    [InlineData(30, "below 50", "at or below 30")]
    [InlineData(31, "below 50", "below 50")]
    [InlineData(49, "below 50", "below 50")]
    [InlineData(50, "", "")]
    public void Egfr_before_an_MRA(decimal value, string esc, string aha)
    {
        var picture = Short.Without("spironolactone").Blood("egfr", -1, value);

        Assert.Contains(esc, string.Join(";", picture.Of(TitrationClass.Mra).Holds.Select(hold => hold.Limit)));
        Assert.Contains(aha, string.Join(";", picture.Of(TitrationClass.Mra, Aha).Holds.Select(hold => hold.Limit)));
        Assert.Equal(esc.Length == 0, picture.Of(TitrationClass.Mra).Holds.IsEmpty);
    }

    /// <summary>Below 30 hold, below 20 urgent: ESC 2021 supplement (second-hand).</summary>
    [Theory]
    [InlineData(31, None)]
    [InlineData(30, None)]
    [InlineData(29, LimitEffect.Hold)]
    [InlineData(20, LimitEffect.Hold)]
    [InlineData(19, LimitEffect.Urgent)]
    public void Egfr_on_an_ACE_inhibitor(decimal value, LimitEffect effect) =>
        Assert.Equal(effect, Effect(Short.Blood("egfr", -1, value), TitrationClass.RasInhibitor));

    /// <summary>On sacubitril/valsartan below 30: review in ESC, a hold in AHA, where the US label allows 24/26 mg.</summary>
    [Theory]
    [InlineData(30, None, None)]
    [InlineData(29, LimitEffect.Review, LimitEffect.Hold)]
    public void Egfr_on_an_ARNI(decimal value, LimitEffect esc, LimitEffect aha)
    {
        var picture = Short.Without("ramipril").On("sacubitril/valsartan", 50, 2, -100).Blood("egfr", -1, value);

        Assert.Equal((esc, aha), (Effect(picture, TitrationClass.RasInhibitor), Effect(picture, TitrationClass.RasInhibitor, Aha)));
    }

    /// <summary>An SGLT2 inhibitor is not started below 20: ESC 2021 supplement (second-hand).</summary>
    [Theory]
    [InlineData(19, LimitEffect.Hold)]
    [InlineData(20, None)]
    [InlineData(21, None)]
    public void Egfr_before_an_SGLT2_inhibitor(decimal value, LimitEffect effect) => Assert.Equal(
        effect, Effect(Short.Without("dapagliflozin").Blood("egfr", -1, value), TitrationClass.Sglt2Inhibitor));

    /// <summary>Above 221 hold (supplement, second-hand), 266 and above review (ESC 2021, 13.6), above 310 urgent; no baseline, so no rise.</summary>
    [Theory]
    [InlineData(220, None)]
    [InlineData(221, None)]
    [InlineData(222, LimitEffect.Hold)]
    [InlineData(265, LimitEffect.Hold)]
    [InlineData(266, LimitEffect.Review)]
    [InlineData(310, LimitEffect.Review)]
    [InlineData(311, LimitEffect.Urgent)]
    public void Creatinine(decimal value, LimitEffect effect)
    {
        var picture = Short with { BloodTests = Short.BloodTests.RemoveAll(test => test.Analyte == "creatinine") };

        Assert.Equal(effect, Effect(picture.Blood("creatinine", -1, value), TitrationClass.RasInhibitor));
    }

    /// <summary>Baseline 100: 30 % and above hold (default), above 50 % review (ESC 2021, 13.6), above 100 % urgent (from memory).</summary>
    [Theory]
    [InlineData(129, None)]
    [InlineData(130, LimitEffect.Hold)]
    [InlineData(131, LimitEffect.Hold)]
    [InlineData(150, LimitEffect.Hold)]
    [InlineData(151, LimitEffect.Review)]
    [InlineData(200, LimitEffect.Review)]
    [InlineData(201, LimitEffect.Urgent)]
    public void Rise_of_creatinine(decimal value, LimitEffect effect)
    {
        var picture = (Short with { BloodTests = Short.BloodTests.RemoveAll(test => test.Analyte == "creatinine") }).Blood("creatinine", -101, 100);

        Assert.Equal(effect, Effect(picture.Blood("creatinine", -1, value), TitrationClass.RasInhibitor));
        Assert.Equal(effect, Effect(picture.Blood("creatinine", -1, value), TitrationClass.Mra));
    }

    /// <summary>UK practice, switched on: a rise of 30 % is looked at (Clark 2019).</summary>
    [Theory]
    [InlineData(129, None)]
    [InlineData(130, LimitEffect.Review)]
    public void Rise_of_creatinine_in_UK_practice(decimal value, LimitEffect effect)
    {
        var picture = (Short with { BloodTests = Short.BloodTests.RemoveAll(test => test.Analyte == "creatinine") })
            .Blood("creatinine", -101, 100).Blood("creatinine", -1, value);

        Assert.Equal(effect, Effect(picture, TitrationClass.RasInhibitor, Esc.With([new("creatinine.rise-review-uk", IsOn: true)])));
    }

    /// <summary>A baseline counts when it is not older than 90 days at the step: a default of this program.</summary>
    [Theory]
    [InlineData(-189, LimitEffect.Review)]
    [InlineData(-190, LimitEffect.Review)]
    [InlineData(-191, None)]
    public void Age_of_a_baseline(int day, LimitEffect effect) => Assert.Equal(
        effect,
        Effect(Short.NoBlood().Blood("creatinine", day, 100).Blood("creatinine", -1, 160).Blood("potassium", -1, 4.4m), TitrationClass.RasInhibitor));

    /// <summary>Below 90: ESC 2021 supplement (second-hand).</summary>
    [Theory]
    [InlineData(89, LimitEffect.Hold)]
    [InlineData(90, None)]
    [InlineData(91, None)]
    public void Systolic_pressure(int value, LimitEffect effect) => Assert.All(
        [TitrationClass.BetaBlocker, TitrationClass.RasInhibitor, TitrationClass.Mra],
        titration => Assert.Equal(effect, Effect(Short.NoVitals().Rate(0, 70).Systolic(0, value), titration)));

    /// <summary>On sacubitril/valsartan at or below 95 (label); before it the pillar may begin with an ACE inhibitor.</summary>
    [Theory]
    [InlineData(94, LimitEffect.Hold)]
    [InlineData(95, LimitEffect.Hold)]
    [InlineData(96, None)]
    public void Systolic_pressure_on_an_ARNI(int value, LimitEffect effect) => Assert.Equal(effect, Effect(
        Short.Without("ramipril").On("sacubitril/valsartan", 50, 2, -100).NoVitals().Rate(0, 70).Systolic(0, value), TitrationClass.RasInhibitor));

    /// <summary>With dizziness below 100: a default of this program, after "symptomatic hypotension" of ESC 2021.</summary>
    [Theory]
    [InlineData(99, LimitEffect.Hold)]
    [InlineData(100, None)]
    [InlineData(101, None)]
    public void Systolic_pressure_with_dizziness(int value, LimitEffect effect) => Assert.Equal(effect, Effect(
        Short.NoVitals().Rate(0, 70).Systolic(0, value).Told(-1, Symptoms.Dizziness), TitrationClass.BetaBlocker));

    /// <summary>An SGLT2 inhibitor below 95 (ESC 2021 supplement, second-hand); vericiguat below 100 (label).</summary>
    [Theory]
    [InlineData(94, LimitEffect.Hold, LimitEffect.Hold)]
    [InlineData(95, None, LimitEffect.Hold)]
    [InlineData(96, None, LimitEffect.Hold)]
    [InlineData(99, None, LimitEffect.Hold)]
    [InlineData(100, None, None)]
    public void Systolic_pressure_before_an_SGLT2_inhibitor_and_on_vericiguat(int value, LimitEffect sglt2, LimitEffect vericiguat)
    {
        var picture = Short.Without("dapagliflozin").On("vericiguat", 2.5m, 1, -100).NoVitals().Rate(0, 70).Systolic(0, value);

        Assert.Equal((sglt2, vericiguat), (Effect(picture, TitrationClass.Sglt2Inhibitor), Effect(picture, TitrationClass.Vericiguat)));
    }

    /// <summary>In sinus rhythm below 55 hold (STRONG-HF), below 50 review (supplement, second-hand), below 40 urgent (default).</summary>
    [Theory]
    [InlineData(56, None, None)]
    [InlineData(55, None, None)]
    [InlineData(54, LimitEffect.Hold, None)]
    [InlineData(50, LimitEffect.Hold, None)]
    [InlineData(49, LimitEffect.Review, LimitEffect.Review)]
    [InlineData(40, LimitEffect.Review, LimitEffect.Review)]
    [InlineData(39, LimitEffect.Urgent, LimitEffect.Urgent)]
    public void Heart_rate(int value, LimitEffect sinus, LimitEffect fibrillation)
    {
        var picture = Short.NoVitals().Rate(0, value).Systolic(0, 118);

        Assert.Equal(sinus, Effect(picture, TitrationClass.BetaBlocker));
        Assert.Equal(fibrillation, Effect(picture.InRhythm(0, Rhythm.AtrialFibrillation), TitrationClass.BetaBlocker));
    }

    /// <summary>28 days after a decompensation, from memory.</summary>
    [Theory]
    [InlineData(-27, LimitEffect.Hold)]
    [InlineData(-28, LimitEffect.Hold)]
    [InlineData(-29, None)]
    public void Decompensation_holds_a_beta_blocker(int day, LimitEffect effect)
    {
        Assert.Equal(effect, Effect(Short with { DischargedFromHospitalOn = Today.AddDays(day) }, TitrationClass.BetaBlocker));
        Assert.Equal(effect, Effect(Short with { DecompensatedOn = Today.AddDays(day) }, TitrationClass.BetaBlocker));
        Assert.Equal(None, Effect(Short with { DecompensatedOn = Today.AddDays(day) }, TitrationClass.RasInhibitor));
    }

    /// <summary>CKD-EPI 2021: a woman of 72 with creatinine 1.5 mg/dL (132.6 µmol/L) has 36.8, a man of 80 with 3.5 mg/dL 16.9.</summary>
    [Fact]
    public void Where_no_eGFR_is_reported_it_is_computed_from_the_creatinine()
    {
        var woman = (Short.NoBlood() with { BirthDate = Today.AddYears(-72), Sex = Sex.Female }).Blood("creatinine", 0, 132.6m).Blood("potassium", 0, 4.4m);

        Assert.Contains("eGFR 37 mL/min/1.73 m² on 03 Mar 2026", woman.Of(TitrationClass.Mra).Sentence);
        Assert.True((woman with { Sex = Sex.NotRecorded }).Of(TitrationClass.Mra).Holds.IsEmpty);
    }

    [Fact]
    public void All_reasons_are_told()
    {
        var reading = (Short with { Congestion = [new(Today, true)], NyhaClasses = [new(Today, 4)] })
            .NoVitals().Rate(0, 52).Systolic(0, 88).Of(TitrationClass.BetaBlocker);

        Assert.Equal(4, reading.Holds.Length);
        Assert.All(["heart rate 52/min", "systolic pressure 88 mmHg", "congestion found", "NYHA class IV"], words => Assert.Contains(words, reading.Sentence));
    }

    /// <summary>Asthma: a hold for a beta-1-selective beta blocker (ESC 2021, 13.8), a bar for carvedilol (label, from memory); COPD is no reason.</summary>
    [Fact]
    public void Asthma_and_COPD()
    {
        var asthma = Short with { Conditions = [PatientCondition.Asthma] };

        Assert.Equal(LimitEffect.Hold, Effect(asthma, TitrationClass.BetaBlocker));
        Assert.Equal(LimitEffect.Bars, Effect(asthma.Without("bisoprolol").On("carvedilol", 6.25m, 2, -100), TitrationClass.BetaBlocker));
        Assert.Equal(None, Effect(Short with { Conditions = [PatientCondition.ChronicObstructivePulmonaryDisease] }, TitrationClass.BetaBlocker));
    }

    /// <summary>Contraindications without which a pillar would be asked for (ESC 2021 supplement and 14.1).</summary>
    [Theory]
    [InlineData(PatientCondition.HighGradeAvBlock, TitrationClass.BetaBlocker, TitrationState.NotGiven)]
    [InlineData(PatientCondition.SickSinus, TitrationClass.BetaBlocker, TitrationState.NotGiven)]
    [InlineData(PatientCondition.Pregnancy, TitrationClass.RasInhibitor, TitrationState.NotGiven)]
    [InlineData(PatientCondition.Pregnancy, TitrationClass.Mra, TitrationState.NotGiven)]
    [InlineData(PatientCondition.Pregnancy, TitrationClass.BetaBlocker, TitrationState.NotCovered)]
    [InlineData(PatientCondition.BilateralRenalArteryStenosis, TitrationClass.RasInhibitor, TitrationState.NotGiven)]
    [InlineData(PatientCondition.AngioedemaHistory, TitrationClass.RasInhibitor, TitrationState.Held)]
    [InlineData(PatientCondition.Type1Diabetes, TitrationClass.Sglt2Inhibitor, TitrationState.NotGiven)]
    public void A_contraindicated_pillar_is_not_asked_for(PatientCondition condition, TitrationClass titration, TitrationState state) =>
        Assert.Equal(state, (Well(30) with { Conditions = [condition] }).StateOf(titration));

    [Fact]
    public void A_pacemaker_lifts_the_bar_of_a_block() => Assert.Equal(
        TitrationState.NotCovered,
        (Well(30) with { Conditions = [PatientCondition.HighGradeAvBlock, PatientCondition.Pacemaker] }).StateOf(TitrationClass.BetaBlocker));

    private static LimitEffect Effect(PatientPicture picture, TitrationClass titration, ClinicProtocol? protocol = null)
    {
        var reading = picture.Of(titration, protocol);
        Assert.Equal(reading.Holds.IsEmpty, reading.State is TitrationState.Due or TitrationState.NotCovered);
        return reading.Holds.Select(hold => hold.Effect).FirstOrDefault();
    }
}
