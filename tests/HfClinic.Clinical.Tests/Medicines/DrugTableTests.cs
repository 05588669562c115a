using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Medicines;

/// <summary>The tables beside the formulary: limits, harm, digoxin, haemodynamics.</summary>
public class DrugTableTests
{
    private static readonly SourceTable Sources = SourceTable.Load();

    /// <summary>
    /// Settings with their operators. Potassium, creatinine, eGFR, pressure: ESC 2021 supplement and text, NHS SPS, labels; heart rate 55:
    /// STRONG-HF; carvedilol weight: ESC 2021, Table 8, and ACC 2017, Table 1; digoxin levels: ESC 2021, 5.4.5, and AHA 2022, Table 14; the
    /// rest are defaults for the clinic to sign off.
    /// </summary>
    [Theory]
    [InlineData("potassium.hold", 5.0, Comparison.Above)]
    [InlineData("potassium.review", 5.5, Comparison.Above)]
    [InlineData("potassium.urgent", 6.0, Comparison.Above)]
    [InlineData("potassium.urgent-eplerenone", 6.0, Comparison.AtLeast)]
    [InlineData("potassium.low-review", 3.5, Comparison.Below)]
    [InlineData("creatinine.rise-hold", 30, Comparison.AtLeast)]
    [InlineData("creatinine.rise-review", 50, Comparison.Above)]
    [InlineData("creatinine.rise-urgent", 100, Comparison.Above)]
    [InlineData("creatinine.rise-review-uk", 30, Comparison.AtLeast)]
    [InlineData("creatinine.hold", 221, Comparison.Above)]
    [InlineData("creatinine.review", 266, Comparison.AtLeast)]
    [InlineData("creatinine.urgent", 310, Comparison.Above)]
    [InlineData("egfr.hold", 30, Comparison.Below)]
    [InlineData("egfr.urgent", 20, Comparison.Below)]
    [InlineData("egfr.sglt2-start", 20, Comparison.Below)]
    [InlineData("egfr.finerenone-start", 25, Comparison.Below)]
    [InlineData("egfr.vericiguat", 15, Comparison.Below)]
    [InlineData("pressure.hold", 90, Comparison.Below)]
    [InlineData("pressure.hold-after-discharge", 95, Comparison.Below)]
    [InlineData("pressure.arni-hold", 95, Comparison.AtMost)]
    [InlineData("pressure.arni-start", 100, Comparison.Below)]
    [InlineData("pressure.vericiguat-start", 100, Comparison.Below)]
    [InlineData("pressure.sglt2-start", 95, Comparison.Below)]
    [InlineData("heart-rate.hold", 55, Comparison.Below)]
    [InlineData("heart-rate.review", 50, Comparison.Below)]
    [InlineData("heart-rate.urgent", 40, Comparison.Below)]
    [InlineData("decompensation.days", 28, Comparison.AtMost)]
    [InlineData("ace-to-arni.hours", 36, Comparison.Below)]
    [InlineData("carvedilol.weight-esc", 85, Comparison.Above)]
    [InlineData("carvedilol.weight-aha", 85, Comparison.AtLeast)]
    [InlineData("carvedilol.weight-days", 90, Comparison.AtMost)]
    [InlineData("digoxin.level-esc", 1.2, Comparison.AtLeast)]
    [InlineData("digoxin.level-aha", 0.9, Comparison.AtLeast)]
    [InlineData("titration-limit.days", 180, Comparison.Above)]
    [InlineData("titration.beta-blocker.gap-days", 28, Comparison.AtLeast)]
    [InlineData("titration.beta-blocker.overdue-days", 42, Comparison.AtLeast)]
    [InlineData("titration.mra.earliest-days", 28, Comparison.AtLeast)]
    [InlineData("titration.mra.gap-days", 56, Comparison.AtLeast)]
    [InlineData("titration.mra.overdue-days", 84, Comparison.AtLeast)]
    [InlineData("titration.finerenone.gap-days", 42, Comparison.AtLeast)]
    [InlineData("titration.absent.gap-days", 14, Comparison.AtLeast)]
    [InlineData("titration.absent.overdue-days", 42, Comparison.AtLeast)]
    [InlineData("titration.regimen-days", 90, Comparison.AtLeast)]
    public void The_settings_and_their_operators(string key, decimal value, Comparison comparison) =>
        Assert.Equal((value, comparison), (Pictures.Defaults[key].Value, Pictures.Defaults[key].Comparison));

    /// <summary>US digoxin label, second-hand or from memory; group A above 50 %, group B below.</summary>
    [Theory]
    [InlineData("amiodarone", DigoxinGroup.A, 70, 70)]
    [InlineData("verapamil", DigoxinGroup.A, 50, 75)]
    [InlineData("dronedarone", DigoxinGroup.A, 150, 150)]
    [InlineData("gentamicin", DigoxinGroup.A, 129, 212)]
    [InlineData("captopril", DigoxinGroup.A, 58, 58)]
    [InlineData("diltiazem", DigoxinGroup.B, 20, 20)]
    [InlineData("carvedilol", DigoxinGroup.B, 16, 16)]
    [InlineData("spironolactone", DigoxinGroup.B, 25, 25)]
    [InlineData("atorvastatin", DigoxinGroup.B, 22, 22)]
    public void Digoxin_interactions(string medicine, DigoxinGroup group, int low, int high)
    {
        var row = DigoxinInteraction.Of(medicine).First(entry => entry.Direction == DigoxinDirection.Up);

        Assert.Equal((group, low, high), (row.Group, row.PercentLow, row.PercentHigh));
    }

    [Fact]
    public void A_group_of_digoxin_advice_and_its_percentage_agree() => Assert.All(
        DigoxinInteraction.All.Where(row => row.Group is DigoxinGroup.A or DigoxinGroup.B),
        row => Assert.Equal(row.Group, row.PercentHigh >= 50 ? DigoxinGroup.A : DigoxinGroup.B));

    /// <summary>ESC 2021 and 2024, AHA 2022.</summary>
    [Theory]
    [InlineData("verapamil", HarmScope.ReducedNow, HarmFlag.Review)]
    [InlineData("diltiazem", HarmScope.ReducedNow, HarmFlag.Review)]
    [InlineData("amlodipine", HarmScope.ReducedNow, HarmFlag.None)]
    [InlineData("ibuprofen", HarmScope.All, HarmFlag.Review)]
    [InlineData("pioglitazone", HarmScope.All, HarmFlag.Review)]
    [InlineData("saxagliptin", HarmScope.All, HarmFlag.Review)]
    [InlineData("alogliptin", HarmScope.All, HarmFlag.ProfileAhaReview)]
    [InlineData("dronedarone", HarmScope.Reduced, HarmFlag.Review)]
    [InlineData("metformin", HarmScope.EgfrBelow30, HarmFlag.Information)]
    public void Medicines_that_may_harm(string medicine, HarmScope scope, HarmFlag flag) =>
        Assert.Equal((scope, flag), (HarmList.Find(medicine)!.Scope, HarmList.Find(medicine)!.Flag));

    [Fact]
    public void Medicines_that_may_harm_together()
    {
        Assert.Equal((HarmFlag.Urgent, 36), (HarmList.Together.Single(row => row.Key == "ace-arni").Flag, HarmList.Together.Single(row => row.Key == "ace-arni").WithinHours));
        Assert.Equal(HarmFlag.Urgent, HarmList.Together.Single(row => row.Key == "pregnancy").Flag);
    }

    /// <summary>
    /// Common practice, no source: hydralazine acts on arteries, nitrates mainly on veins, ACE inhibitors and ARBs on both; digoxin raises
    /// contractility; beta-1 blockade, verapamil and diltiazem lower it.
    /// </summary>
    [Theory]
    [InlineData("hydralazine", 0, -1, 0, 1)]
    [InlineData("isosorbide dinitrate", -1, 0, 0, 0)]
    [InlineData("ramipril", -1, -1, 0, 0)]
    [InlineData("candesartan", -1, -1, 0, 0)]
    [InlineData("digoxin", 0, 0, 1, -1)]
    [InlineData("metoprolol succinate", 0, 0, -1, -1)]
    [InlineData("carvedilol", 0, -1, -1, -1)]
    [InlineData("diltiazem", 0, -1, -1, -1)]
    [InlineData("spironolactone", -1, 0, 0, 0)]
    [InlineData("furosemide", -1, 0, 0, 0)]
    [InlineData("empagliflozin", -1, -1, 0, 0)]
    [InlineData("sacubitril/valsartan", -1, -1, 0, 0)]
    public void Haemodynamic_effects(string medicine, int preload, int afterload, int contractility, int rate)
    {
        var effect = HaemodynamicEffect.Of(medicine)!;

        Assert.Equal((preload, afterload, contractility, rate), (effect.Preload, effect.Afterload, effect.Contractility, effect.HeartRate));
    }

    [Fact]
    public void A_medicine_the_matrix_does_not_know_has_no_effect_shown() => Assert.Null(HaemodynamicEffect.Of("allopurinol"));

    /// <summary>Furosemide 40 mg, bumetanide 1 mg, torasemide 20 or 10 mg: US practice, or the ESC 2021 start doses (second-hand).</summary>
    [Theory]
    [InlineData("furosemide", 40, 2, 40)]
    [InlineData("bumetanide", 1, 2, 40)]
    [InlineData("torasemide", 20, 2, 40)]
    [InlineData("torsemide", 10, 4, 40)]
    public void Loop_diuretics_as_furosemide(string medicine, decimal milligrams, decimal factor, decimal furosemide) =>
        Assert.Equal(furosemide, LoopEquivalent.Furosemide(medicine, milligrams, factor));

    [Fact]
    public void Other_medicines_and_other_factors_have_no_equivalent()
    {
        Assert.Null(LoopEquivalent.Furosemide("metolazone", 5, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => LoopEquivalent.Furosemide("torasemide", 10, 3));
    }

    [Fact]
    public void A_faulty_limit_condition_check_or_schedule_is_refused()
    {
        Refused("no threshold 'nothing'", json => ClassLimit.Parse(json, Sources, Pictures.Defaults),
            """[{"key":"a","classes":["mra"],"measure":"potassium","thresholdKey":"nothing","effect":"hold","when":"always","profile":null,"rhythm":"any","medicines":[],"words":"x","sourceKeys":["clinic-default"],"standing":"confirmed"}]""");
        Refused("a figure names no source", json => ClassCondition.Parse(json, Sources),
            """[{"key":"a","condition":"asthma","classes":["beta-blocker"],"effect":"hold","when":"always","medicines":[],"words":"x","sourceKeys":[],"standing":"confirmed"}]""");
        Refused("nothing is needed", json => GapChecks.Parse(json, Sources),
            """[{"titration":"mra","needs":[],"sourceKeys":["clinic-default"],"standing":"confirmed"}]""");
        Refused("not sorted upwards", json => LabSchedule.Parse(json, Sources),
            """[{"key":"a","classes":["mra"],"dueDays":[28,7],"thenStable":true,"only":"each-step","sourceKeys":["clinic-default"],"standing":"confirmed"}]""");
    }

    [Fact]
    public void A_faulty_row_of_harm_interaction_or_effect_is_refused()
    {
        Refused("no guideline speaks of it", json => HarmList.Parse(json, Sources),
            """[{"key":"a","medicines":["x"],"scope":"all","flag":"review","raisedWith":[],"words":"x","esc":null,"aha":null}]""");
        Refused("one group alone needs a condition", json => HarmList.ParseTogether(json, Sources),
            """[{"key":"a","together":[["x"]],"condition":null,"withinHours":null,"flag":"review","text":"x","sourceKeys":["clinic-default"],"standing":"confirmed"}]""");
        Refused("the group goes by a percentage", json => DigoxinInteraction.Parse(json, Sources),
            """[{"key":"a","medicines":["x"],"direction":"up","group":"a","percentLow":null,"percentHigh":null,"measure":null,"text":"x","alsoWatch":null,"sourceKeys":["clinic-default"],"standing":"confirmed"}]""");
        Refused("an effect is not", json => HaemodynamicEffect.Parse(json, Sources),
            """[{"key":"a","words":"x","preload":2,"afterload":0,"contractility":0,"heartRate":0,"oxygenDemand":0,"note":null,"medicines":[],"sourceKeys":["clinic-default"],"standing":"confirmed"}]""");
    }

    private static void Refused<T>(string reason, Func<string, T> parse, string json)
    {
        var fault = Assert.Throws<TableFaultException>(() => _ = parse(json));

        Assert.Contains(", row 1: ", fault.Message);
        Assert.Contains(reason, fault.Message);
    }
}
