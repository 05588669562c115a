namespace HfClinic.Clinical.Weights;

/// <summary>Two one-sided cumulative sums of standardised innovations, for a lasting small shift.</summary>
/// <param name="Up">Gathers when readings keep coming in above expectation; never below 0.</param>
/// <param name="Down">Gathers when they keep coming in below; never below 0.</param>
/// <remarks>Page's scheme (Biometrika 1954;41:100). Allowance and limit are choices of this program.</remarks>
public readonly record struct Cusum(double Up, double Down)
{
    /// <summary>k: the shift, in standard deviations, given away at each reading.</summary>
    public const double Allowance = 0.5;

    /// <summary>h: a sum above it is an alarm.</summary>
    public const double Limit = 5;

    /// <summary>Scores are cut off here before they are summed, so that one reading alone cannot alarm.</summary>
    public const double LargestScore = 3;

    public Cusum Add(double score, double allowance = Allowance) =>
        new(Math.Max(0, Up + score - allowance), Math.Max(0, Down - score - allowance));

    /// <summary>The sums to go on with: those above the limit start again at 0.</summary>
    public Cusum Restarted() => new(Up > Limit ? 0 : Up, Down > Limit ? 0 : Down);
}
