using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>The left ventricular mass index above which the ventricle counts as hypertrophied.</summary>
/// <param name="Men">g/m².</param>
/// <param name="Women">g/m².</param>
/// <param name="Words">As shown beside the result, because both pairs are in use.</param>
public sealed record MassLimit(double Men, double Women, string Words)
{
    /// <summary>ASE/EACVI 2015 (from memory).</summary>
    public static readonly MassLimit AseEacvi2015 = new(115, 95, "above 115 g/m² in men, 95 g/m² in women (ASE/EACVI 2015)");

    /// <summary>The older pair, still printed in many tables.</summary>
    public static readonly MassLimit Older = new(134, 110, "above 134 g/m² in men, 110 g/m² in women (older limits)");

    /// <summary>The limit for the sex, which must be recorded.</summary>
    public double GramsPerSquareMetre(Sex sex) => sex == Sex.Female ? Women : Men;
}
