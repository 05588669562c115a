using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>A serum sodium. The ion carries one charge, so 1 mEq/L is 1 mmol/L.</summary>
public readonly record struct Sodium
{
    private Sodium(decimal mmolPerLitre) => MmolPerLitre = mmolPerLitre;

    public decimal MmolPerLitre { get; }

    public static Sodium FromMmolPerLitre(decimal mmolPerLitre) => new(mmolPerLitre);

    public static Sodium FromMEqPerLitre(decimal mEqPerLitre) => new(mEqPerLitre);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{MmolPerLitre:0.0} mmol/L");
}
