using System.Globalization;

namespace HfClinic.Records.Exchange;

/// <summary>Numbers as files write them: with a decimal point or a decimal comma, decided value by value; no thousands separators.</summary>
internal static class NumberText
{
    private const int LongestText = 20;

    /// <summary>The number, or null when the text is anything else: "72,7" and "72.7" are the same.</summary>
    public static decimal? Read(string text)
    {
        var plain = text.Trim();
        return plain.Length is > 0 and <= LongestText
            && decimal.TryParse(plain.Replace(',', '.'), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var number)
            ? number
            : null;
    }

    /// <summary>A whole number, also when written as "71.0"; null when the text is anything else.</summary>
    public static int? ReadWhole(string text) =>
        Read(text) is { } number && number == decimal.Truncate(number) && number <= int.MaxValue ? (int)number : null;
}
