using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>A serum potassium. The ion carries one charge, so 1 mEq/L is 1 mmol/L.</summary>
public readonly record struct Potassium
{
    private Potassium(decimal mmolPerLitre) => MmolPerLitre = mmolPerLitre;

    public decimal MmolPerLitre { get; }

    public static Potassium FromMmolPerLitre(decimal mmolPerLitre) => new(mmolPerLitre);

    public static Potassium FromMEqPerLitre(decimal mEqPerLitre) => new(mEqPerLitre);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{MmolPerLitre:0.0} mmol/L");
}
