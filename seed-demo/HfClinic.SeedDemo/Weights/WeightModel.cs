namespace HfClinic.SeedDemo.Weights;

/// <summary>
/// How a body weight moves from day to day, for a person of 80 kg; kilograms, scaled with the body mass. Body mass walks
/// and drifts, fluid comes and goes around it (each day keeps <see cref="FluidKept"/> of it), the scale adds its own error.
/// The figures of <see cref="Lifelike"/> give a one-day difference of 0.76 kg and a 14-day change of 1.2 kg (standard
/// deviations), near published home weights: 0.50 to 0.54 kg at 57 kg, and 1.1 kg in 14 days (Zhang 2009).
/// </summary>
internal sealed record WeightModel(
    double MassStep, double MassDrift, double FluidDeviation, double FluidSpread, double WeeklySwing,
    double ReadingDeviation, double ReadingSpread, double ClothingChance)
{
    /// <summary>Share of the fluid that is still there the next day.</summary>
    public const double FluidKept = 0.9;

    /// <summary>As patients are.</summary>
    public static WeightModel Lifelike { get; } = new(0.03, 0.010, 0.70, 0.30, 0.14, 0.40, 0.25, 0.02);

    /// <summary>A person with steady habits and a good scale.</summary>
    public static WeightModel Even { get; } = new(0.02, 0.004, 0.32, 0.20, 0.08, 0.18, 0.20, 0);

    /// <summary>So still that what a story adds is what is seen.</summary>
    public static WeightModel Still { get; } = new(0.008, 0, 0.14, 0, 0.04, 0.10, 0, 0);
}
