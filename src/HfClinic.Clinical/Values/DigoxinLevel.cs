using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>
/// A serum digoxin. 1 ng/mL (the same as 1 microgram/L) is 1.2805 nmol/L, from a molar mass of 780.95 g/mol;
/// the customary 1.28 and 1.281 are roundings of it.
/// </summary>
public readonly record struct DigoxinLevel
{
    /// <summary>Grams in one mole of digoxin.</summary>
    public const decimal MolarMass = 780.95m;

    private DigoxinLevel(decimal ngPerMl) => NgPerMl = ngPerMl;

    public decimal NgPerMl { get; }

    public decimal NmolPerLitre => NgPerMl * 1000m / MolarMass;

    public static DigoxinLevel FromNgPerMl(decimal ngPerMl) => new(ngPerMl);

    public static DigoxinLevel FromNmolPerLitre(decimal nmolPerLitre) => new(nmolPerLitre * MolarMass / 1000m);

    /// <summary>In both units: "0.90 ng/mL (1.15 nmol/L)".</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{NgPerMl:0.00} ng/mL ({NmolPerLitre:0.00} nmol/L)");
}
