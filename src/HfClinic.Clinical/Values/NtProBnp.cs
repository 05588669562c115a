using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>A plasma NT-proBNP (the amino-terminal part). 1 pg/mL is 1 ng/L; a picomole weighs 8.457 ng.</summary>
public readonly record struct NtProBnp
{
    /// <summary>Nanograms in one picomole.</summary>
    public const decimal NanogramsPerPicomole = 8.457m;

    private NtProBnp(decimal pgPerMl) => PgPerMl = pgPerMl;

    /// <summary>Picograms per millilitre, the same number as nanograms per litre.</summary>
    public decimal PgPerMl { get; }

    public decimal PmolPerLitre => PgPerMl / NanogramsPerPicomole;

    public static NtProBnp FromPgPerMl(decimal pgPerMl) => new(pgPerMl);

    public static NtProBnp FromPmolPerLitre(decimal pmolPerLitre) => new(pmolPerLitre * NanogramsPerPicomole);

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{PgPerMl:0} pg/mL");
}
