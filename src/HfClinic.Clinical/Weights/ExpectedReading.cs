namespace HfClinic.Clinical.Weights;

/// <summary>What the next weight of a person should be.</summary>
/// <param name="Kilograms">p: the expected reading.</param>
/// <param name="Variance">S: its variance, weighing noise included, kg².</param>
/// <param name="Gate">How far from it a reading may lie before it is set aside, kg.</param>
/// <param name="Last">The last accepted weight if it is at most three days old, kg.</param>
/// <param name="StepGate">How near to <paramref name="Last"/> a weight need be to be taken although far from expectation, kg.</param>
/// <remarks>
/// A person who gains two kilograms in two days runs ahead of the expectation just when it matters; such weights are near
/// the last one and are not held.
/// </remarks>
public readonly record struct ExpectedReading(double Kilograms, double Variance, double Gate, double? Last, double StepGate)
{
    /// <summary>Whether a weight is too far off, from expectation and from the last weight, to be taken without asking.</summary>
    public bool IsFarFrom(double kilograms) =>
        Math.Abs(kilograms - Kilograms) > Gate
        && !(Last is double last && Math.Abs(kilograms - last) <= StepGate);

    /// <summary>Whether a weight would be quite ordinary: within three standard deviations.</summary>
    public bool IsNear(double kilograms) => Math.Abs(kilograms - Kilograms) <= 3 * Math.Sqrt(Variance);
}
