using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>
/// A serum urea. Laboratories that report "BUN" give the nitrogen of the urea (two atoms, 28.0134 g for each mole),
/// others the whole urea (60.056 g): the same number in mg/dL stands for 2.14 times as much urea in the first case.
/// </summary>
public readonly record struct Urea
{
    /// <summary>Grams of nitrogen in one mole of urea.</summary>
    public const decimal NitrogenPerMole = 28.0134m;

    /// <summary>Grams in one mole of urea.</summary>
    public const decimal MolarMass = 60.056m;

    private Urea(decimal mmolPerLitre) => MmolPerLitre = mmolPerLitre;

    public decimal MmolPerLitre { get; }

    /// <summary>Urea nitrogen ("BUN").</summary>
    public decimal NitrogenMgPerDl => MmolPerLitre * NitrogenPerMole / 10m;

    /// <summary>Whole urea.</summary>
    public decimal UreaMgPerDl => MmolPerLitre * MolarMass / 10m;

    public static Urea FromMmolPerLitre(decimal mmolPerLitre) => new(mmolPerLitre);

    public static Urea FromNitrogenMgPerDl(decimal nitrogenMgPerDl) => new(nitrogenMgPerDl * 10m / NitrogenPerMole);

    public static Urea FromUreaMgPerDl(decimal ureaMgPerDl) => new(ureaMgPerDl * 10m / MolarMass);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{MmolPerLitre:0.0} mmol/L");
}
