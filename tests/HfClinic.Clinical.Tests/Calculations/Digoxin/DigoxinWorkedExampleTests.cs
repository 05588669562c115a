using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Calculations.Digoxin;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations.Digoxin;

/// <summary>Worked cases of labels, textbooks and papers; numbers follow the order in which they were collected.</summary>
public class DigoxinWorkedExampleTests
{
    private const HeartFailureGrade Failure = HeartFailureGrade.ModerateToSevere;

    /// <summary>1. Older US label: lean weight 70 kg, creatinine clearance 60: 250 micrograms a day, steady state in about 11 days.</summary>
    [Fact]
    public void Label_table()
    {
        var row = DigoxinLabelTable.Load().Single(line => line.ClearancePer70Kilograms == 60);

        Assert.Equal(250, row.MicrogramsDaily[DigoxinLabelTable.LeanKilograms.IndexOf(70)]);
        Assert.Equal(11, row.DaysToSteadyState);
    }

    /// <summary>2. Older US label: 26 % of 700 micrograms lost in a day is 182, as tablets with 0.8 absorbed 227.5; at a clearance of 19, 17.8 %.</summary>
    [Fact]
    public void Label_formula()
    {
        var absorbed = DigoxinLabelFormula.AbsorbedLostDaily(70, DigoxinLabelFormula.PercentLostDaily(60));

        In.Check(26, DigoxinLabelFormula.PercentLostDaily(60), 10);
        In.Check(182, absorbed, 10);
        Assert.Equal(227.5, In.Value(absorbed) / DigoxinForms.AbsorbedShare(DigoxinForm.Elixir), 10);
        In.Check(17.8, DigoxinLabelFormula.PercentLostDaily(19), 10);
    }

    /// <summary>
    /// 3. Bauer's textbook, from memory: man of 50 years, 70 kg, creatinine 0.9: clearance 97. He rounds 41 to 40: digoxin clearance
    /// 166.4, for 1.5 ng/mL 359.4 micrograms a day (361 from 167).
    /// </summary>
    [Fact]
    public void Bauer_without_heart_failure()
    {
        In.Check(97.2, Renal.CreatinineClearance(50, 70.0, In.MgPerDl(0.9m), Sex.Male), 1);
        In.Check(166.4 + 1, DigoxinClearance.KoupJusko(97, HeartFailureGrade.NoneOrMild), 1);
        In.Check(359.4, DigoxinIntake.Holding(In.NgPerMl(1.5m), DigoxinForm.Intravenous, 1.303 * 97 + 40), 1);
        In.Check(361, DigoxinIntake.Holding(In.NgPerMl(1.5m), DigoxinForm.Intravenous, 167.0), 0);
    }

    /// <summary>4. The same with creatinine 3.5, from memory: clearance 25, digoxin clearance 73, 158 micrograms a day.</summary>
    [Fact]
    public void Bauer_with_failing_kidneys()
    {
        In.Check(25, Renal.CreatinineClearance(50, 70.0, In.MgPerDl(3.5m), Sex.Male), 10);
        In.Check(73 + 1, DigoxinClearance.KoupJusko(25, HeartFailureGrade.NoneOrMild), 0);
        In.Check(158, DigoxinIntake.Holding(In.NgPerMl(1.5m), DigoxinForm.Intravenous, 73.0), 0);
    }

    /// <summary>5. The same as 3 with heart failure, from memory: clearance 146; for 0.8 ng/mL 168 absorbed, 241 as tablets (computed).</summary>
    [Fact]
    public void Bauer_with_heart_failure()
    {
        var clearance = DigoxinClearance.KoupJusko(97, Failure);

        In.Check(146.4, clearance, 1);
        In.Check(168, DigoxinIntake.Holding(In.NgPerMl(0.8m), DigoxinForm.Intravenous, 146.0), 0);
        In.Check(241, DigoxinIntake.Holding(In.NgPerMl(0.8m), DigoxinForm.Tablet, clearance), 0);
    }

    /// <summary>6. Sheiner and Reuning, 70 kg, clearance 60, 125 micrograms as tablets; computed in R.</summary>
    [Fact]
    public void Sheiner_with_Reuning()
    {
        var clearance = DigoxinClearance.Sheiner(70, 60, Failure);
        var volume = DigoxinVolume.Reuning(70, 60);
        var halfLife = DigoxinSteadyState.HalfLife(volume, clearance);

        In.Check(77.1, clearance, 10);
        In.Check(0.788, DigoxinSteadyState.Level(125, DigoxinForm.Tablet, clearance), 3);
        In.Check(452, volume, 10);
        In.Check(2.82, halfLife, 2);
        In.Check(14.1, DigoxinSteadyState.TimeToReach(halfLife), 1);
        In.Check(0.821, DigoxinSteadyState.ShareReached(7, volume, clearance), 3);
    }

    /// <summary>7. Koup and Jusko with heart failure; computed in R.</summary>
    [Theory]
    [InlineData(60, 125, 0.619)]
    [InlineData(60, 250, 1.238)]
    [InlineData(30, 125, 1.028)]
    [InlineData(20, 62.5, 0.660)]
    public void Koup_and_Jusko(double clearance, double micrograms, double expected) =>
        In.Check(expected, DigoxinSteadyState.Level(micrograms, DigoxinForm.Tablet, DigoxinClearance.KoupJusko(clearance, Failure)), 3);

    /// <summary>8. Nomura 1994, 125 micrograms a day: 1.36 − 0.008 × clearance.</summary>
    [Theory]
    [InlineData(60, 0.88)]
    [InlineData(30, 1.12)]
    public void Nomura(double clearance, double expected) => In.Check(expected, DigoxinRegressions.Nomura(125, clearance), 10);

    /// <summary>9. Wagner 1974: 0.2 × micrograms/kg × creatinine; 250 micrograms, 70 kg, 1.0 mg/dL.</summary>
    [Fact]
    public void Wagner() => In.Check(0.71, DigoxinRegressions.Wagner(250, 70, In.MgPerDl(1)), 2);

    /// <summary>10. Proportion: 1.6 ng/mL on 250 micrograms goes with 125 micrograms at 0.8; a textbook case ends there by the same rule.</summary>
    [Fact]
    public void Proportion() => In.Check(125, DigoxinIntake.InProportion(250, In.NgPerMl(1.6m), In.NgPerMl(0.8m), true), 10);

    /// <summary>11. Molar mass 780.95 g/mol (UCUM gives 2.5609834 nmol/L for 2.0 ng/mL).</summary>
    [Theory]
    [InlineData("0.9", 1.152)]
    [InlineData("2.0", 2.561)]
    [InlineData("1.0", 1.280)]
    public void Units(string ngPerMl, double nmolPerLitre) =>
        Assert.Equal(nmolPerLitre, (double)DigoxinLevel.FromNgPerMl(In.Number(ngPerMl)).NmolPerLitre, 3);

    /// <summary>Methods 7, 6 and 8 on the same patient: 70 kg, clearance 60, 125 micrograms. The spread is the result.</summary>
    [Fact]
    public void One_patient_by_three_methods()
    {
        var levels = DigoxinEstimate.Levels(125, DigoxinForm.Tablet, 70, 60, Failure);

        Assert.Equal("0.62 to 0.88 ng/mL (Koup and Jusko 0.62, Sheiner 0.79 and Nomura 0.88)", levels.Text);
        Assert.Equal(0.6189, levels.Lowest!.Value, 4);
        Assert.Equal(0.88, levels.Highest!.Value, 10);
    }
}
