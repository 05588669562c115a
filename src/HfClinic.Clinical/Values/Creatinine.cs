using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>
/// A serum creatinine. 1 mg/dL is 88.4017 µmol/L, from a molar mass of 113.12 g/mol (UCUM conversion of NIST weights);
/// the customary 88.4 and 88.42 are roundings of it.
/// </summary>
public readonly record struct Creatinine
{
    /// <summary>Grams in one mole of creatinine.</summary>
    public const decimal MolarMass = 113.12m;

    private Creatinine(decimal micromolPerLitre) => MicromolPerLitre = micromolPerLitre;

    public decimal MicromolPerLitre { get; }

    /// <summary>Rounded to 12 decimals, so that 0.2 mg/dL typed is 0.2 mg/dL read and stands on the right side of a limit.</summary>
    public decimal MgPerDl => decimal.Round(MicromolPerLitre * MolarMass / 10_000m, 12);

    public static Creatinine FromMicromolPerLitre(decimal micromolPerLitre) => new(micromolPerLitre);

    /// <exception cref="OverflowException">The value is too large to convert.</exception>
    public static Creatinine FromMgPerDl(decimal mgPerDl) => new(mgPerDl * 10_000m / MolarMass);

    /// <summary>In both units: "106 µmol/L (1.20 mg/dL)".</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{MicromolPerLitre:0} µmol/L ({MgPerDl:0.00} mg/dL)");
}
