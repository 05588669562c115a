namespace HfClinic.Clinical.Weights;

/// <summary>The noise of the local linear trend that gives the slope. Variances in kg² and (kg/day)².</summary>
/// <param name="ReadingVariance">Of one reading about the level.</param>
/// <param name="LevelStep">Of the level's own wandering in a day.</param>
/// <param name="SlopeStep">Of the slope's wandering in a day.</param>
/// <param name="Robust">Whether outliers count less.</param>
/// <remarks>The fractions are choices of this program, to be signed off by the clinic.</remarks>
public readonly record struct SlopeModel(double ReadingVariance, double LevelStep, double SlopeStep, bool Robust = true)
{
    /// <summary>The model for a person of the given weight.</summary>
    public static SlopeModel For(double kilograms) => new(
        Square(0.006 * kilograms),
        Square(0.0025 * kilograms),
        Square(0.00035 * kilograms));

    private static double Square(double value) => value * value;
}
