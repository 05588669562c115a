using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>
/// The same arithmetic read backwards: which intake goes with a level. It serves to compare with what textbooks and
/// pharmacists reckon by hand; it is not a dose advice and no screen may word it as one.
/// </summary>
public static class DigoxinIntake
{
    private static readonly Formula HoldingFormula = new(
        "intake that goes with the level", "micrograms a day", 0, "level in ng/mL × 1.44 × digoxin clearance in mL/min / absorbed share", ["digoxin-kinetics-texts"]);

    private static readonly Formula ProportionFormula = new(
        "intake in proportion", "micrograms a day", 0, "present micrograms a day × other level / measured level", ["digoxin-kinetics-texts"])
    {
        Caution = "Only for a level at steady state, timed at least 6 hours after the dose, with steady kidney function.",
    };

    private static readonly Quantity<DigoxinLevel> OtherLevel = DigoxinInputs.Level.Named("other level");

    /// <summary>Micrograms a day that hold an average level, at the given clearance (5 to 500 mL/min).</summary>
    public static Computed<double> Holding(Given<DigoxinLevel> level, DigoxinForm form, Given<double> clearance)
    {
        var (held, cl) = (DigoxinInputs.Level.Take(level), DigoxinInputs.Clearance.Take(clearance));
        return HoldingFormula.Compute(
            [held, DigoxinForms.Share(form), cl],
            () => held.Number * DigoxinInputs.LitresPerDay * cl.Number / DigoxinForms.AbsorbedShare(form));
    }

    /// <summary>Micrograms a day by simple proportion. Refused unless the measured level can be trusted.</summary>
    /// <param name="levelIsSound">At steady state, timed and with steady kidney function; a missing answer is not a yes.</param>
    public static Computed<double> InProportion(
        Given<double> microgramsDaily, Given<DigoxinLevel> measured, Given<DigoxinLevel> other, Given<bool> levelIsSound)
    {
        var (dose, now, then, sound) = (DigoxinInputs.Daily.Take(microgramsDaily), DigoxinInputs.Level.Take(measured),
            OtherLevel.Take(other), Quantity.Answer("level at steady state, timed, with steady kidney function", levelIsSound));
        return ProportionFormula.Compute(
            [dose, now, then, sound],
            () => dose.Number * then.Number / now.Number,
            () => sound.Value ? null : "the level was not at steady state, not timed, or the kidney function was changing");
    }
}
