namespace HfClinic.Clinical.Medicines;

/// <summary>
/// Oral loop diuretics counted as oral furosemide, for trends and displays only: furosemide 40 mg, bumetanide 1 mg and torasemide
/// 20 mg or 10 mg are about alike. The factor of torasemide is a setting (2 or 4 mg of furosemide a milligram: US practice from memory,
/// or the ratio of the start doses in the ESC 2021 supplement, second-hand) and is printed with the figure.
/// </summary>
public static class LoopEquivalent
{
    /// <summary>Milligrams of oral furosemide; null for a medicine that is no loop diuretic.</summary>
    /// <param name="medicine">Generic name.</param>
    /// <param name="milligrams">Over a day or of one taking.</param>
    /// <param name="perMilligramTorasemide">2 or 4.</param>
    /// <exception cref="ArgumentOutOfRangeException">The factor is neither 2 nor 4.</exception>
    public static decimal? Furosemide(string medicine, decimal milligrams, decimal perMilligramTorasemide)
    {
        if (perMilligramTorasemide is not (2 or 4))
        {
            throw new ArgumentOutOfRangeException(nameof(perMilligramTorasemide), perMilligramTorasemide, "The factor of torasemide is 2 or 4.");
        }

        return Formulary.BuiltIn.Read(medicine).Medicine?.Name switch
        {
            "furosemide" => milligrams,
            "bumetanide" => milligrams * 40,
            "torasemide" => milligrams * perMilligramTorasemide,
            _ => null,
        };
    }
}
