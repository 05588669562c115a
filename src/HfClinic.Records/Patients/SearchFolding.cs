using System.Globalization;
using System.Text;

namespace HfClinic.Records.Patients;

/// <summary>
/// Folds text so that both databases find "María-José" by "maria jose": accents dropped, lower case, letters and digits only.
/// </summary>
public static class SearchFolding
{
    /// <summary>The folded form: words of letters and digits, separated by one space.</summary>
    public static string Fold(string text)
    {
        var folded = new StringBuilder(text.Length);
        var pendingSpace = false;
        foreach (var rune in text.Normalize(NormalizationForm.FormKD).EnumerateRunes())
        {
            var category = Rune.GetUnicodeCategory(rune);
            if (category is UnicodeCategory.NonSpacingMark or UnicodeCategory.Format)
            {
                continue;
            }

            if (!Rune.IsLetterOrDigit(rune))
            {
                pendingSpace = folded.Length > 0;
                continue;
            }

            if (pendingSpace)
            {
                folded.Append(' ');
                pendingSpace = false;
            }

            folded.Append(Rune.ToLowerInvariant(rune).ToString());
        }

        return folded.ToString();
    }

    /// <summary>What is stored for a patient: name in both orders, and the number with and without its separators.</summary>
    public static string ForPatient(string familyName, string givenName, string clinicNumber)
    {
        var number = Fold(clinicNumber);
        return $"{Fold(familyName)} {Fold(givenName)} {Fold(familyName)} {number} {number.Replace(" ", "", StringComparison.Ordinal)}";
    }
}
