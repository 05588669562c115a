namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>
/// Digoxin clearance, mL/min, from creatinine clearance in mL/min (Cockcroft and Gault). An eGFR per 1.73 m² is not a
/// substitute.
/// </summary>
public static class DigoxinClearance
{
    private static readonly Formula Koup = new(
        "digoxin clearance",
        "mL/min",
        0,
        "1.303 × creatinine clearance + 41 (no or mild heart failure) or + 20 (moderate to severe)",
        ["koup-jusko-1975"])
    {
        Method = "Koup and Jusko",
    };

    private static readonly Formula SheinerFormula = new(
        "digoxin clearance",
        "mL/min",
        0,
        "0.8 × weight in kg + creatinine clearance; with heart failure 0.33 × weight in kg + 0.9 × creatinine clearance",
        ["sheiner-1977"])
    {
        Method = "Sheiner",
    };

    /// <summary>By Koup and Jusko (from memory; one textbook rounds 41 to 40). Creatinine clearance 0 to 250 mL/min.</summary>
    public static Computed<double> KoupJusko(Given<double> creatinineClearance, HeartFailureGrade grade)
    {
        var clearance = Accepted.CreatinineClearance.Take(creatinineClearance);
        return Koup.Compute(
            [clearance, Shown(grade)],
            () => 1.303 * clearance.Number + (grade == HeartFailureGrade.NoneOrMild ? 41 : 20));
    }

    /// <summary>By Sheiner, as taught by Winter (from memory).</summary>
    /// <param name="weightKilograms">Lean weight, 25 to 250 kg; see <see cref="LeanWeight"/>.</param>
    /// <param name="creatinineClearance">0 to 250 mL/min.</param>
    public static Computed<double> Sheiner(Given<double> weightKilograms, Given<double> creatinineClearance, HeartFailureGrade grade)
    {
        var (weight, clearance) = (Accepted.DosingWeight.Take(weightKilograms), Accepted.CreatinineClearance.Take(creatinineClearance));
        return SheinerFormula.Compute(
            [weight, clearance, Shown(grade)],
            () => grade == HeartFailureGrade.NoneOrMild
                ? 0.8 * weight.Number + clearance.Number
                : 0.33 * weight.Number + 0.9 * clearance.Number);
    }

    private static Input Shown(HeartFailureGrade grade) => Input.Choice("heart failure", HeartFailureGrades.Words(grade));
}
