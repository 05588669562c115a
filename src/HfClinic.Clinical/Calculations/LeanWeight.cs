using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>
/// The weight used for digoxin and for the clearance that goes with it: ideal weight, or the measured one when that is less;
/// for an obese person the adjusted weight is shown beside it.
/// </summary>
/// <remarks>
/// Dosing by lean weight: US digoxin label. Adjusted weight for the obese: pharmacokinetics texts, seen second-hand.
/// Obese means a BMI of 30 kg/m² or more (World Health Organization; common practice).
/// </remarks>
/// <param name="Kilograms">The weight to use, kg.</param>
/// <param name="Adjusted">The adjusted weight, kg, to be shown beside it; null when the person is not known to be obese.</param>
public sealed record LeanWeight(Computed<double> Kilograms, Computed<double>? Adjusted)
{
    /// <summary>kg/m² from which the adjusted weight is shown.</summary>
    public const double ObeseFrom = 30;

    private static readonly Formula Formula = new(
        "lean weight", "kg", 1, "ideal weight, or the measured weight when that is less", ["digoxin-label-older", "devine-1974"]);

    private static readonly Quantity<double> IdealKilograms = Quantity.Of("ideal weight", "kg", 20, 120);

    /// <summary>Chooses from measured weight (30 to 250 kg), height (140 to 220 cm) and sex.</summary>
    public static LeanWeight Choose(Given<Weight> weight, Given<Length> height, Sex sex)
    {
        var ideal = BodySize.IdealWeight(height, sex);
        var (measured, reference) = (Accepted.Weight.Take(weight), IdealKilograms.Take(ideal));
        var chosen = Formula.Compute(
            [measured, reference],
            () => Math.Min(measured.Number, reference.Number),
            kilograms => $"{Figures.Fixed(kilograms, 1)} kg ({(measured.Number < reference.Number ? "measured, below ideal" : "ideal")})");
        return new LeanWeight(chosen, IsObese(weight, height) ? BodySize.AdjustedWeight(weight, ideal) : null);
    }

    private static bool IsObese(Given<Weight> weight, Given<Length> height) => BodySize.BodyMassIndex(weight, height).Value >= ObeseFrom;
}
