namespace HfClinic.Clinical.Weights;

/// <summary>What a reading told beyond what was expected.</summary>
/// <param name="Kilograms">Reading minus expectation.</param>
/// <param name="Variance">Its variance before any downweighting, kg².</param>
/// <param name="Weight">How much the reading counted: 1 fully, less for an outlier.</param>
public readonly record struct Innovation(double Kilograms, double Variance, double Weight)
{
    /// <summary>The innovation in standard deviations, before any downweighting.</summary>
    public double Score => Kilograms / Math.Sqrt(Variance);

    /// <summary>An innovation with the weight its distance earns it.</summary>
    public static Innovation Of(double kilograms, double variance, bool robust) =>
        new(kilograms, variance, robust ? StudentWeighting.Of(kilograms * kilograms / variance) : 1);
}
