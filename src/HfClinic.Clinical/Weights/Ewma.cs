namespace HfClinic.Clinical.Weights;

/// <summary>An exponentially weighted moving average of standardised innovations: the alternative to <see cref="Cusum"/>.</summary>
/// <param name="Value">The average, in standard deviations.</param>
/// <param name="Readings">How many scores it holds.</param>
/// <remarks>Roberts's chart (Technometrics 1959;1:239) with limits that widen over the first readings.</remarks>
public readonly record struct Ewma(double Value, int Readings)
{
    /// <summary>λ: the weight of the newest score.</summary>
    public const double Newest = 0.2;

    /// <summary>L: the limit in standard deviations of the average.</summary>
    public const double Width = 3;

    /// <summary>An average beyond this, either way, is an alarm; 0 before any reading.</summary>
    public double Limit => Width * Math.Sqrt(Newest / (2 - Newest) * (1 - Math.Pow(1 - Newest, 2 * Readings)));

    public Ewma Add(double score, double newest = Newest) => new(((1 - newest) * Value) + (newest * score), Readings + 1);
}
