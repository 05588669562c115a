using CsCheck;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Calculations.Digoxin;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations.Digoxin;

public class DigoxinEstimateTests
{
    private const HeartFailureGrade Failure = HeartFailureGrade.ModerateToSevere;

    private static readonly Gen<(double Weight, double Clearance)> Patient = Gen.Select(Gen.Double[30, 120], Gen.Double[0, 119]);

    [Fact]
    public void Each_method_is_named_with_its_own_sources()
    {
        var levels = DigoxinEstimate.Levels(125, DigoxinForm.Tablet, 70, 60, Failure);

        Assert.Equal(["Koup and Jusko", "Sheiner", "Nomura"], levels.Methods.Select(method => method.Formula.Method));
        Assert.Equal(["digoxin-kinetics-texts", "koup-jusko-1975"], levels.Methods[0].Formula.SourceKeys);
        Assert.Equal("digoxin clearance", levels.Methods[0].Inputs[2].From!.Formula.Name);
        Assert.Equal("0.7 (tablets, published 60 to 80 %)", levels.Methods[0].Inputs[1].Shown);
    }

    [Fact]
    public void A_method_that_does_not_apply_says_so_and_the_others_stand()
    {
        var levels = DigoxinEstimate.Levels(250, DigoxinForm.Tablet, 70, 60, Failure);

        Assert.Equal("1.24 to 1.58 ng/mL (Koup and Jusko 1.24 and Sheiner 1.58)", levels.Text);
        Assert.Equal("the regression of Nomura holds for 125 micrograms a day, not for 250 micrograms", levels.Methods[2].WhyNot);
    }

    /// <summary>Half-life about 1.5 to 2 days with normal kidneys, longer without them (US label).</summary>
    [Fact]
    public void Half_lives_are_told_for_each_clearance_with_each_volume()
    {
        var halfLives = DigoxinEstimate.HalfLives(70, 60, Failure);

        Assert.Equal(
            ["Koup and Jusko with Reuning", "Koup and Jusko with Jusko", "Sheiner with Reuning", "Sheiner with Jusko"],
            halfLives.Methods.Select(method => method.Formula.Method));
        In.Check(2.82, halfLives.Methods[2], 2);
    }

    [Fact]
    public void An_obese_patient_gets_the_adjusted_weight_beside_the_ideal_one()
    {
        var estimate = Estimate(In.Kg(120), In.Cm(178), In.MgPerDl(1.2m), Sex.Male);

        Assert.Equal("73.2 kg (ideal)", estimate.Weight.Kilograms.Text);
        // By hand: (140 − 70) × 73.1 / (72 × 1.2) and the same with 91.9 kg.
        In.Check(59, estimate.CreatinineClearance, 0);
        In.Check(74, estimate.ByAdjustedWeight!, 0);
        Assert.Equal(3, estimate.Level.Methods.Length);
        Assert.Equal(estimate.HalfLife.Highest * 5, estimate.TimeToSteadyState.Highest);
    }

    [Fact]
    public void What_is_missing_is_named_for_the_whole_range()
    {
        var estimate = Estimate(In.Kg(70), default, In.MgPerDl(1.2m), Sex.Male);

        Assert.Null(estimate.Level.Lowest);
        Assert.Equal("not computed: no height", estimate.Level.Text);
        Assert.Equal("not computed: no height", estimate.TimeToSteadyState.Text);
        Assert.Null(estimate.ByAdjustedWeight);
        Assert.Equal("not computed: sex not recorded", Estimate(In.Kg(70), In.Cm(170), In.MgPerDl(1), Sex.NotRecorded).Level.Text);
    }

    [Fact]
    public void The_range_holds_every_method() => Patient.Sample((weight, clearance) =>
    {
        var levels = DigoxinEstimate.Levels(125, DigoxinForm.Tablet, weight, clearance, Failure);
        Assert.All(levels.Methods, method => Assert.InRange(In.Value(method), levels.Lowest!.Value, levels.Highest!.Value));
    });

    [Fact]
    public void Levels_fall_as_the_kidneys_clear_more() => Patient.Sample((weight, clearance) =>
        DigoxinEstimate.Levels(125, DigoxinForm.Tablet, weight, clearance, Failure).Methods
            .Zip(DigoxinEstimate.Levels(125, DigoxinForm.Tablet, weight, clearance + 1, Failure).Methods)
            .All(pair => In.Value(pair.First) > In.Value(pair.Second)));

    [Fact]
    public void Heart_failure_raises_the_expected_level() => Patient.Sample((weight, clearance) =>
        DigoxinEstimate.Levels(125, DigoxinForm.Tablet, weight, clearance, Failure).Methods
            .Zip(DigoxinEstimate.Levels(125, DigoxinForm.Tablet, weight, clearance, HeartFailureGrade.NoneOrMild).Methods)
            .Take(2)
            .All(pair => In.Value(pair.First) > In.Value(pair.Second)));

    /// <summary>After one half-life half, after five 97 % of the way (follows from first-order loss).</summary>
    [Fact]
    public void The_share_reached_follows_the_half_life() => Patient.Sample((weight, clearance) =>
    {
        var (volume, cl) = (DigoxinVolume.Reuning(weight, clearance), DigoxinClearance.KoupJusko(clearance, Failure));
        double halfLife = In.Value(DigoxinSteadyState.HalfLife(volume, cl));

        In.Check(0.5, DigoxinSteadyState.ShareReached(halfLife, volume, cl), 9);
        In.Check(0.96875, DigoxinSteadyState.ShareReached(5 * halfLife, volume, cl), 9);
        In.Check(0, DigoxinSteadyState.ShareReached(0, volume, cl), 12);
    });

    [Fact]
    public void Intake_and_level_are_each_others_inverse() => Gen.Select(Patient, Gen.Int[25, 500]).Sample((patient, micrograms) =>
    {
        var clearance = DigoxinClearance.Sheiner(patient.Weight, patient.Clearance, Failure);
        double level = In.Value(DigoxinSteadyState.Level(micrograms, DigoxinForm.Tablet, clearance));
        if (level is > 0.1 and < 15)
        {
            In.Check(micrograms, DigoxinIntake.Holding(DigoxinLevel.FromNgPerMl((decimal)level), DigoxinForm.Tablet, clearance), 6);
        }
    });

    [Theory]
    [InlineData(false, "the level was not at steady state, not timed, or the kidney function was changing")]
    [InlineData(null, "no answer on level at steady state, timed, with steady kidney function")]
    public void Proportion_needs_a_sound_level(bool? sound, string whyNot) =>
        Assert.Equal(whyNot, DigoxinIntake.InProportion(250, In.NgPerMl(1.6m), In.NgPerMl(0.8m), sound).WhyNot);

    [Theory]
    [InlineData(DigoxinForm.Tablet, 0.7)]
    [InlineData(DigoxinForm.Elixir, 0.8)]
    [InlineData(DigoxinForm.Capsule, 1)]
    [InlineData(DigoxinForm.Intravenous, 1)]
    public void Absorbed_shares_of_pharmacokinetics_texts(DigoxinForm form, double share) => Assert.Equal(share, DigoxinForms.AbsorbedShare(form));

    [Theory]
    [InlineData(0.125)]
    [InlineData(19.9)]
    [InlineData(1000.1)]
    public void Milligrams_taken_for_micrograms_are_refused(double micrograms) => Assert.Contains(
        "is outside 20 to 1000 micrograms", DigoxinSteadyState.Level(micrograms, DigoxinForm.Tablet, DigoxinClearance.KoupJusko(60, Failure)).WhyNot);

    private static DigoxinEstimate Estimate(Given<Weight> weight, Given<Length> height, Given<Creatinine> creatinine, Sex sex) =>
        DigoxinEstimate.For(125, DigoxinForm.Tablet, weight, height, 70, creatinine, sex, Failure);
}
