using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>A plasma BNP (the hormone itself). 1 pg/mL is 1 ng/L; a picomole weighs 3.464 ng.</summary>
public readonly record struct Bnp
{
    /// <summary>Nanograms in one picomole.</summary>
    public const decimal NanogramsPerPicomole = 3.464m;

    private Bnp(decimal pgPerMl) => PgPerMl = pgPerMl;

    /// <summary>Picograms per millilitre, the same number as nanograms per litre.</summary>
    public decimal PgPerMl { get; }

    public decimal PmolPerLitre => PgPerMl / NanogramsPerPicomole;

    public static Bnp FromPgPerMl(decimal pgPerMl) => new(pgPerMl);

    public static Bnp FromPmolPerLitre(decimal pmolPerLitre) => new(pmolPerLitre * NanogramsPerPicomole);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{PgPerMl:0} pg/mL");
}
