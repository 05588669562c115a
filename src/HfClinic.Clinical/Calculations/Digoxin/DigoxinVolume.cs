namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>Volume in which digoxin distributes, L. It shrinks with failing kidneys.</summary>
public static class DigoxinVolume
{
    private static readonly Formula ReuningFormula = new(
        "volume of distribution", "L", 0, "3.8 × weight in kg + 3.1 × creatinine clearance", ["reuning-1973"])
    {
        Method = "Reuning",
    };

    private static readonly Formula JuskoFormula = new(
        "volume of distribution", "L", 0, "(226 + 298 × creatinine clearance / (29.1 + creatinine clearance)) × weight in kg / 70", ["jusko-volume"])
    {
        Method = "Jusko",
        Caution = "Texts differ in what is scaled to body size; here the whole is.",
    };

    /// <summary>By Reuning. Lean weight 25 to 250 kg, creatinine clearance 0 to 250 mL/min.</summary>
    public static Computed<double> Reuning(Given<double> weightKilograms, Given<double> creatinineClearance) =>
        By(ReuningFormula, weightKilograms, creatinineClearance, (weight, clearance) => 3.8 * weight + 3.1 * clearance);

    /// <summary>By Jusko, scaled to 70 kg. Ranges as for <see cref="Reuning"/>.</summary>
    public static Computed<double> Jusko(Given<double> weightKilograms, Given<double> creatinineClearance) =>
        By(JuskoFormula, weightKilograms, creatinineClearance, (weight, clearance) => (226 + 298 * clearance / (29.1 + clearance)) * weight / 70);

    private static Computed<double> By(
        Formula formula, Given<double> weightKilograms, Given<double> creatinineClearance, Func<double, double, double> compute)
    {
        var (weight, clearance) = (Accepted.DosingWeight.Take(weightKilograms), Accepted.CreatinineClearance.Take(creatinineClearance));
        return formula.Compute([weight, clearance], () => compute(weight.Number, clearance.Number));
    }
}
