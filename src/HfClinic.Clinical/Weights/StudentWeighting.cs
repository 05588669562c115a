namespace HfClinic.Clinical.Weights;

/// <summary>How much a reading counts when its noise is taken as Student t with four degrees of freedom.</summary>
/// <remarks>
/// One reweighting step of the EM algorithm for the t distribution (Lange, Little and Taylor, J Am Stat Assoc 1989;84:881,
/// from memory). The degrees of freedom are a choice of this program.
/// </remarks>
internal static class StudentWeighting
{
    private const double Freedom = 4;

    /// <summary>1 for an ordinary reading, less the further off it is.</summary>
    /// <param name="squaredScore">The square of the standardised innovation.</param>
    public static double Of(double squaredScore) => Math.Min(1, (Freedom + 1) / (Freedom + squaredScore));
}
