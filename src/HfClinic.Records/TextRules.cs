using System.Globalization;

namespace HfClinic.Records;

/// <summary>The checks every typed text goes through, in one wording.</summary>
public static class TextRules
{
    /// <summary>The text without surrounding blanks, or null when nothing is left.</summary>
    public static string? OrNull(string? text) => string.IsNullOrWhiteSpace(text) ? null : text.Trim();

    /// <summary>Adds a problem when the text is empty, too long or holds characters no database keeps.</summary>
    public static void Require(List<Problem> problems, string field, string name, string? text, int length)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            problems.Add(new(field, $"{name} is missing.", "Fill it in."));
            return;
        }

        Limit(problems, field, name, text, length);
    }

    /// <summary>Adds a problem when the text is too long or holds characters no database keeps.</summary>
    public static void Limit(List<Problem> problems, string field, string name, string? text, int length)
    {
        if (text is null)
        {
            return;
        }

        if (text.Trim().Length > length)
        {
            problems.Add(new(field, $"{name} has {text.Trim().Length} characters; {length} fit.", "Shorten it."));
        }

        if (text.Any(c => char.IsControl(c) && c is not ('\n' or '\r' or '\t')))
        {
            problems.Add(new(field, $"{name} holds a character that cannot be kept.", "Type it again rather than pasting it."));
        }
    }

    /// <summary>A required reason or answer: returns it trimmed.</summary>
    /// <exception cref="RefusedException">Missing or too long.</exception>
    public static string Required(string field, string name, string? text, int length)
    {
        var problems = new List<Problem>();
        Require(problems, field, name, text, length);
        return problems.Count == 0 ? text!.Trim() : throw new RefusedException(problems);
    }

    /// <summary>An optional text: returns it trimmed, or null.</summary>
    /// <exception cref="RefusedException">Too long.</exception>
    public static string? Optional(string field, string name, string? text, int length)
    {
        var problems = new List<Problem>();
        Limit(problems, field, name, text, length);
        return problems.Count == 0 ? OrNull(text) : throw new RefusedException(problems);
    }

    /// <summary>03 Mar 2026.</summary>
    public static string Day(DateOnly day) => day.ToString("dd MMM yyyy", CultureInfo.InvariantCulture);
}
