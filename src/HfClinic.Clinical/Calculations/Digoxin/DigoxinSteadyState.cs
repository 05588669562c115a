namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>Level once intake and loss balance, and how long that takes. One compartment, linear kinetics.</summary>
public static class DigoxinSteadyState
{
    private const double HalfLivesToSteadyState = 5;

    private static readonly Formula AverageLevel = new(
        "average digoxin level at steady state",
        "ng/mL",
        2,
        "absorbed share × micrograms a day / (1.44 × digoxin clearance in mL/min)",
        ["digoxin-kinetics-texts"]);

    private static readonly Formula HalfLifeFormula = new(
        "digoxin half-life", "days", 1, "ln 2 × volume in L / (1.44 × digoxin clearance in mL/min)", ["digoxin-kinetics-texts"])
    {
        Caution = "Label: 1.5 to 2 days with normal kidneys, 4 to 5 days without kidney function.",
    };

    private static readonly Formula TimeFormula = new("time to steady state", "days", 0, "5 half-lives", ["digoxin-kinetics-texts"])
    {
        Caution = "Counts from the last change of dose, interacting medicine or kidney function. Older label table: 7 to 22 days.",
    };

    private static readonly Formula FractionFormula = new(
        "share of steady state reached", "", 2, "1 − e^(−1.44 × digoxin clearance × days / volume)", ["digoxin-kinetics-texts"]);

    private static readonly Quantity<double> HalfLifeDays = Quantity.Of("digoxin half-life", "days", 0.2, 30);
    private static readonly Quantity<double> DaysSince = Quantity.Of("time since the last change", "days", 0, 3650);

    /// <summary>Average level at steady state, ng/mL. Intake 20 to 1,000 micrograms a day, clearance 5 to 500 mL/min.</summary>
    /// <param name="clearance">From <see cref="DigoxinClearance"/>; its method is named in the result.</param>
    public static Computed<double> Level(Given<double> microgramsDaily, DigoxinForm form, Given<double> clearance)
    {
        var (dose, cl) = (DigoxinInputs.Daily.Take(microgramsDaily), DigoxinInputs.Clearance.Take(clearance));
        return AverageLevel.By(clearance).Compute(
            [dose, DigoxinForms.Share(form), cl],
            () => DigoxinForms.AbsorbedShare(form) * dose.Number / (DigoxinInputs.LitresPerDay * cl.Number));
    }

    /// <summary>Half-life, days. Volume 50 to 1,500 L.</summary>
    public static Computed<double> HalfLife(Given<double> volumeLitres, Given<double> clearance)
    {
        var (volume, cl) = (DigoxinInputs.Volume.Take(volumeLitres), DigoxinInputs.Clearance.Take(clearance));
        return HalfLifeFormula.By(clearance, volumeLitres).Compute(
            [volume, cl], () => Math.Log(2) * volume.Number / (DigoxinInputs.LitresPerDay * cl.Number));
    }

    /// <summary>Days until steady state is as good as reached: five half-lives (97 %).</summary>
    public static Computed<double> TimeToReach(Given<double> halfLifeDays)
    {
        var halfLife = HalfLifeDays.Take(halfLifeDays);
        return TimeFormula.By(halfLifeDays).Compute([halfLife], () => HalfLivesToSteadyState * halfLife.Number);
    }

    /// <summary>The share of the way to steady state, 0 to 1, some days after the last change.</summary>
    public static Computed<double> ShareReached(Given<double> days, Given<double> volumeLitres, Given<double> clearance)
    {
        var (since, volume, cl) = (DaysSince.Take(days), DigoxinInputs.Volume.Take(volumeLitres), DigoxinInputs.Clearance.Take(clearance));
        return FractionFormula.By(clearance, volumeLitres).Compute(
            [since, volume, cl], () => 1 - Math.Exp(-DigoxinInputs.LitresPerDay * cl.Number * since.Number / volume.Number));
    }

    /// <summary>The formula under the names and with the sources of the methods its inputs came from.</summary>
    private static Formula By(this Formula formula, params ReadOnlySpan<Given<double>> inputs)
    {
        foreach (var input in inputs)
        {
            if (input.From is { Formula: { Method.Length: > 0 } origin })
            {
                formula = formula with
                {
                    Method = formula.Method.Length == 0 ? origin.Method : $"{formula.Method} with {origin.Method}",
                    SourceKeys = [.. formula.SourceKeys.Union(origin.SourceKeys)],
                };
            }
        }

        return formula;
    }
}
