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

    /// <summary>What is stored for a patient: name in both orders, and the names and the number also without their separators ("obrien").</summary>
    public static string ForPatient(string familyName, string givenName, string clinicNumber)
    {
        var (family, given, number) = (Fold(familyName), Fold(givenName), Fold(clinicNumber));
        string[] words = [family, given, family, number, .. new[] { number, family, given }.Where(word => word.Contains(' ')).Select(Joined)];
        var text = string.Join(' ', words);
        return text.Length <= Patient.SearchTextLength ? text : text[..Patient.SearchTextLength];
    }

    private static string Joined(string words) => words.Replace(" ", "", StringComparison.Ordinal);
}
