using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>Levels read off regressions on patients, without clearance and volume.</summary>
public static class DigoxinRegressions
{
    /// <summary>The only daily dose, micrograms, for which the regression of Nomura was made.</summary>
    public const double NomuraMicrogramsDaily = 125;

    private static readonly Formula NomuraFormula = new(
        "average digoxin level at steady state", "ng/mL", 2, "1.36 − 0.008 × creatinine clearance, for 125 micrograms a day", ["nomura-1994"])
    {
        Method = "Nomura",
        Caution = "A straight line through one group of patients on 125 micrograms a day; not for other doses.",
    };

    private static readonly Formula WagnerFormula = new(
        "digoxin level", "ng/mL", 2, "0.2 × micrograms a day for each kg × Scr in mg/dL", ["wagner-1974"])
    {
        Method = "Wagner",
        Caution = "Explains only 34 % of the variance of levels: for history, not part of the range.",
    };

    private static readonly Quantity<double> NomuraClearance = Quantity.Of("creatinine clearance", "mL/min", 0, 120);

    /// <summary>
    /// By the regression of Nomura (1994), ng/mL. Creatinine clearance 0 to 120 mL/min: the line reaches 0 at 170. Not computed
    /// for any dose but 125 micrograms a day.
    /// </summary>
    public static Computed<double> Nomura(Given<double> microgramsDaily, Given<double> creatinineClearance)
    {
        var (dose, clearance) = (DigoxinInputs.Daily.Take(microgramsDaily), NomuraClearance.Take(creatinineClearance));
        return NomuraFormula.Compute(
            [dose, clearance],
            () => 1.36 - 0.008 * clearance.Number,
            () => dose.Number == NomuraMicrogramsDaily ? null : $"the regression of Nomura holds for 125 micrograms a day, not for {dose.Shown}");
    }

    /// <summary>By Wagner (1974), ng/mL. Weight 25 to 250 kg, creatinine 0.2 to 20 mg/dL.</summary>
    public static Computed<double> Wagner(Given<double> microgramsDaily, Given<double> weightKilograms, Given<Creatinine> creatinine)
    {
        var (dose, weight, scr) = (DigoxinInputs.Daily.Take(microgramsDaily), Accepted.DosingWeight.Take(weightKilograms),
            Accepted.Creatinine.Take(creatinine));
        return WagnerFormula.Compute([dose, weight, scr], () => 0.2 * (dose.Number / weight.Number) * scr.Number);
    }
}
