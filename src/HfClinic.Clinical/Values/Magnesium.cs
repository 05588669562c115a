using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>
/// A serum magnesium. The ion carries two charges, so 1 mEq/L is only 0.5 mmol/L; 1 mg/dL is 0.4114 mmol/L, from the
/// standard atomic weight 24.305 (IUPAC).
/// </summary>
public readonly record struct Magnesium
{
    /// <summary>Grams in one mole of magnesium.</summary>
    public const decimal MolarMass = 24.305m;

    private const decimal ChargesPerIon = 2m;

    private Magnesium(decimal mmolPerLitre) => MmolPerLitre = mmolPerLitre;

    public decimal MmolPerLitre { get; }

    public decimal MEqPerLitre => MmolPerLitre * ChargesPerIon;

    public decimal MgPerDl => MmolPerLitre * MolarMass / 10m;

    public static Magnesium FromMmolPerLitre(decimal mmolPerLitre) => new(mmolPerLitre);

    public static Magnesium FromMEqPerLitre(decimal mEqPerLitre) => new(mEqPerLitre / ChargesPerIon);

    public static Magnesium FromMgPerDl(decimal mgPerDl) => new(mgPerDl * 10m / MolarMass);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{MmolPerLitre:0.00} mmol/L");
}
