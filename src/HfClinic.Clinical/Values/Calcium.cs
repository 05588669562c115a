using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>
/// A serum calcium. The ion carries two charges, so 1 mEq/L is only 0.5 mmol/L; 1 mg/dL is 0.2495 mmol/L, from the
/// standard atomic weight 40.078 (IUPAC).
/// </summary>
public readonly record struct Calcium
{
    /// <summary>Grams in one mole of calcium.</summary>
    public const decimal MolarMass = 40.078m;

    private const decimal ChargesPerIon = 2m;

    private Calcium(decimal mmolPerLitre) => MmolPerLitre = mmolPerLitre;

    public decimal MmolPerLitre { get; }

    public decimal MEqPerLitre => MmolPerLitre * ChargesPerIon;

    public decimal MgPerDl => MmolPerLitre * MolarMass / 10m;

    public static Calcium FromMmolPerLitre(decimal mmolPerLitre) => new(mmolPerLitre);

    public static Calcium FromMEqPerLitre(decimal mEqPerLitre) => new(mEqPerLitre / ChargesPerIon);

    public static Calcium FromMgPerDl(decimal mgPerDl) => new(mgPerDl * 10m / MolarMass);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{MmolPerLitre:0.00} mmol/L");
}
