using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Calculations.Digoxin;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>Every worked value of the reference table (double precision in R 4.2, ten decimals), each through the program's own functions.</summary>
public class IndicesGoldenTests
{
    private const double Tolerance = 1e-9;

    public static TheoryData<string, string> Rows => [.. GoldenIndex.Read().Select(row => (row.Name, row.Inputs))];

    [Theory]
    [MemberData(nameof(Rows))]
    public void Agrees_with_the_reference(string name, string inputs)
    {
        var row = GoldenIndex.Read().Single(row => row.Name == name && row.Inputs == inputs);

        double found = Compute(row);

        Assert.True(Math.Abs(row.Value - found) < Tolerance, $"{name} of {inputs}: expected {row.Value:0.0000000000}, found {found:0.0000000000}");
    }

    [Fact]
    public void The_table_is_whole() => Assert.Equal(76, GoldenIndex.Read().Count);

    private static double Compute(GoldenIndex row) => row.Name.StartsWith("digoxin_", StringComparison.Ordinal) ? Digoxin(row) : row.Name switch
    {
        "eGFR_CKD_EPI_2021" => In.Value(Renal.Egfr(In.MgPerDl(row["scr_mg_dl"]), (int)row["age"], SexOf(row))),
        "CrCl_Cockcroft_Gault" => In.Value(Renal.CreatinineClearance((int)row["age"], (double)row["kg"], In.MgPerDl(row["scr_mg_dl"]), SexOf(row))),
        "IBW_Devine" => In.Value(BodySize.IdealWeight(In.Cm(row["cm"]), SexOf(row))),
        "AdjBW_0.4" => In.Value(BodySize.AdjustedWeight(In.Kg(row["kg"]), BodySize.IdealWeight(In.Cm(row["cm"]), SexOf(row)))),
        "BSA_Mosteller" => In.Value(BodySize.SurfaceAreaMosteller(In.Kg(row["kg"]), In.Cm(row["cm"]))),
        "BSA_DuBois" => In.Value(BodySize.SurfaceAreaDuBois(In.Kg(row["kg"]), In.Cm(row["cm"]))),
        "CO" => In.Value(CardiacOutput.PerMinute((double)row["sv_ml"], (double)row["hr"])),
        "CI" => In.Value(CardiacOutput.PerSquareMetre((double)row["co"], BodySize.SurfaceAreaMosteller(In.Kg(row["kg"]), In.Cm(row["cm"])))),
        "MAP" => In.Value(Haemodynamics.MeanArterialPressure((double)row["sbp"], (double)row["dbp"])),
        "PP" => In.Value(Haemodynamics.PulsePressure((double)row["sbp"], (double)row["dbp"])),
        "PPP" => In.Value(Haemodynamics.ProportionalPulsePressure((double)row["sbp"], (double)row["dbp"])),
        "RPP" => In.Value(Haemodynamics.RatePressureProduct((double)row["hr"], (double)row["sbp"])),
        "SV_LVOT" => In.Value(CardiacOutput.StrokeVolume(In.Cm(row["d_cm"]), In.Cm(row["vti_cm"]))),
        "SVR" => In.Value(CardiacOutput.VascularResistance((double)row["map"], (double)row["cvp"], (double)row["co"])),
        "SVRI" => In.Value(CardiacOutput.VascularResistanceIndex(
            (double)row["map"], (double)row["cvp"], CardiacOutput.PerSquareMetre((double)row["co"], (double)row["bsa"]))),
        "WallStress_Laplace" => In.Value(WallStress.Laplace((double)row["p_mmhg"], In.Cm(row["r_cm"]), In.Cm(row["h_cm"]))),
        "MeridionalESS_0.334" => In.Value(WallStress.EndSystolicMeridional((double)row["p_mmhg"], In.Cm(row["lvids_cm"]), In.Cm(row["pwts_cm"]))),
        "LVMass_ASE" => In.Value(VentricularGeometry.Mass(In.Cm(row["ivsd"]), In.Cm(row["lvidd"]), In.Cm(row["pwtd"]))),
        "RWT" => In.Value(VentricularGeometry.RelativeWallThickness(In.Cm(row["pwtd"]), In.Cm(row["lvidd"]))),
        "bun_mg_dl_to_urea_mmol_l" => (double)Urea.FromNitrogenMgPerDl(row.First).MmolPerLitre,
        "NTproBNP_pg_ml_to_pmol_l" => (double)NtProBnp.FromPgPerMl(row.First).PmolPerLitre,
        "calcium_mg_dl_to_mmol_l" => (double)Calcium.FromMgPerDl(row.First).MmolPerLitre,
        "lb_to_kg" => (double)(Weight.GramsPerPound * row.First / 1000m),
        _ => throw new InvalidDataException($"Nothing computes {row.Name}."),
    };

    private static double Digoxin(GoldenIndex row) => row.Name switch
    {
        "digoxin_ng_ml_to_nmol_l" => (double)DigoxinLevel.FromNgPerMl(row.First).NmolPerLitre,
        "digoxin_nmol_l_to_ng_ml" => (double)DigoxinLevel.FromNmolPerLitre(row.First).NgPerMl,
        "digoxin_CL_KoupJusko" => In.Value(DigoxinClearance.KoupJusko((double)row["crcl"], GradeOf(row))),
        "digoxin_CL_Sheiner" => In.Value(DigoxinClearance.Sheiner((double)row["kg"], (double)row["crcl"], GradeOf(row))),
        "digoxin_V_Reuning" => In.Value(DigoxinVolume.Reuning((double)row["kg"], (double)row["crcl"])),
        "digoxin_V_Jusko_per70kg" => In.Value(DigoxinVolume.Jusko((double)row["kg"], (double)row["crcl"])),
        "digoxin_half_life_Reuning_Sheiner_HF" => In.Value(HalfLife(row)),
        "digoxin_5_half_lives" => In.Value(DigoxinSteadyState.TimeToReach(HalfLife(row))),
        "digoxin_Css" => In.Value(DigoxinSteadyState.Level((double)row["dose"], FormOf(row), row.Inputs.Contains("Koup HF", StringComparison.Ordinal)
            ? DigoxinClearance.KoupJusko((double)row["crcl"], HeartFailureGrade.ModerateToSevere)
            : DigoxinClearance.Sheiner(70, (double)row["crcl"], HeartFailureGrade.ModerateToSevere))),
        "digoxin_maintenance_rate" => In.Value(DigoxinIntake.Holding(
            In.NgPerMl(row["target"]), FormOf(row), DigoxinClearance.KoupJusko(97, HeartFailureGrade.ModerateToSevere))),
        "digoxin_label_percent_daily_loss" => In.Value(DigoxinLabelFormula.PercentLostDaily((double)row["crcl"])),
        "digoxin_label_formula_dose_absorbed" => In.Value(DigoxinLabelFormula.AbsorbedLostDaily(
            (double)row["lbw"], DigoxinLabelFormula.PercentLostDaily((double)row["crcl"]))),
        _ => throw new InvalidDataException($"Nothing computes {row.Name}."),
    };

    private static Computed<double> HalfLife(GoldenIndex row)
    {
        var (weight, clearance) = ((double)row["kg"], (double)row["crcl"]);
        return DigoxinSteadyState.HalfLife(
            DigoxinVolume.Reuning(weight, clearance), DigoxinClearance.Sheiner(weight, clearance, HeartFailureGrade.ModerateToSevere));
    }

    private static Sex SexOf(GoldenIndex row) => row.IsFemale ? Sex.Female : Sex.Male;

    private static HeartFailureGrade GradeOf(GoldenIndex row) =>
        row.HasHeartFailure ? HeartFailureGrade.ModerateToSevere : HeartFailureGrade.NoneOrMild;

    private static DigoxinForm FormOf(GoldenIndex row) => row["F"] == 1 ? DigoxinForm.Intravenous : DigoxinForm.Tablet;
}
