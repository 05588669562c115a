using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>
/// Kidney function from serum creatinine. The two results are not interchangeable: eGFR is per 1.73 m² and is never fed into
/// the formulas that were made with creatinine clearance in mL/min, such as those of digoxin.
/// </summary>
public static class Renal
{
    private static readonly Formula CkdEpi = new(
        "eGFR",
        "mL/min/1.73 m²",
        0,
        "142 × min(Scr/k, 1)^a × max(Scr/k, 1)^−1.2 × 0.9938^age (× 1.012 for women); k 0.7 and a −0.241 for women, 0.9 and −0.302 for men; Scr in mg/dL",
        ["ckd-epi-2021"])
    {
        Method = "CKD-EPI 2021",
        Caution = "Needs a steady creatinine; misleading with very little or very much muscle.",
    };

    private static readonly Formula CockcroftAndGault = new(
        "creatinine clearance", "mL/min", 0, "(140 − age) × weight in kg / (72 × Scr in mg/dL) (× 0.85 for women)", ["cockcroft-gault-1976"])
    {
        Method = "Cockcroft and Gault",
        Caution = "Needs a steady creatinine; depends on the weight that is put in.",
    };

    private static readonly Formula Per70Kilograms = new(
        "creatinine clearance per 70 kg", "mL/min per 70 kg", 0, "(140 − age) / Scr in mg/dL (× 0.85 for women)", ["digoxin-label-older"]);

    /// <summary>
    /// Estimated glomerular filtration rate, mL/min/1.73 m², by the CKD-EPI creatinine equation of 2021 (Inker, N Engl J Med
    /// 2021;385:1737; formula as printed by the US National Kidney Foundation). Adults; creatinine 0.2 to 20 mg/dL.
    /// </summary>
    public static Computed<double> Egfr(Given<Creatinine> creatinine, Given<int> ageYears, Sex sex)
    {
        var (scr, age, who) = (Accepted.Creatinine.Take(creatinine), Accepted.AdultAge.Take(ageYears), Quantity.Sex(sex));
        return CkdEpi.Compute([scr, age, who], () =>
        {
            var (k, a, bySex) = sex == Sex.Female ? (0.7, -0.241, 1.012) : (0.9, -0.302, 1.0);
            double ratio = scr.Number / k;
            return 142 * Math.Pow(Math.Min(ratio, 1), a) * Math.Pow(Math.Max(ratio, 1), -1.2) * Math.Pow(0.9938, age.Number) * bySex;
        });
    }

    /// <summary>An eGFR as it is reported and compared: a whole number, halves up.</summary>
    public static int Whole(double egfr) => (int)Math.Round(egfr, MidpointRounding.AwayFromZero);

    /// <summary>Creatinine clearance, mL/min, by Cockcroft and Gault (Nephron 1976;16:31).</summary>
    /// <param name="ageYears">18 to 110.</param>
    /// <param name="weightKilograms">The weight to use, 25 to 250 kg: measured, ideal or adjusted. See <see cref="LeanWeight"/>.</param>
    public static Computed<double> CreatinineClearance(
        Given<int> ageYears, Given<double> weightKilograms, Given<Creatinine> creatinine, Sex sex)
    {
        var (age, weight, scr, who) = (Accepted.AdultAge.Take(ageYears), Accepted.DosingWeight.Take(weightKilograms),
            Accepted.Creatinine.Take(creatinine), Quantity.Sex(sex));
        return CockcroftAndGault.Compute(
            [age, weight, scr, who], () => (140 - age.Number) * weight.Number / (72 * scr.Number) * ForSex(sex));
    }

    /// <summary>The clearance that the older digoxin label reads its table by: scaled to 70 kg, whatever the person weighs.</summary>
    public static Computed<double> CreatinineClearancePer70Kilograms(Given<int> ageYears, Given<Creatinine> creatinine, Sex sex)
    {
        var (age, scr, who) = (Accepted.AdultAge.Take(ageYears), Accepted.Creatinine.Take(creatinine), Quantity.Sex(sex));
        return Per70Kilograms.Compute([age, scr, who], () => (140 - age.Number) / scr.Number * ForSex(sex));
    }

    private static double ForSex(Sex sex) => sex == Sex.Female ? 0.85 : 1;
}
