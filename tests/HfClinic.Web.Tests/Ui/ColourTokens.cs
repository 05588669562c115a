using System.Globalization;
using System.Text.RegularExpressions;

namespace HfClinic.Web.Tests.Ui;

/// <summary>The colour tokens as the style sheet ships them, and the WCAG contrast of two of them.</summary>
public static partial class ColourTokens
{
    /// <summary>Token name to light and dark colour, read from the first rule block that defines them.</summary>
    public static IReadOnlyDictionary<string, (string Light, string Dark)> Read()
    {
        var css = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Files", "clinic.css"));
        return Token().Matches(css).ToDictionary(m => m.Groups[1].Value, m => (m.Groups[2].Value, m.Groups[3].Value));
    }

    /// <summary>Contrast ratio, 1 to 21 (WCAG 2.2, W3C Recommendation 12 December 2024, definitions "contrast ratio" and "relative luminance").</summary>
    public static double Contrast(string one, string other)
    {
        var (a, b) = (Luminance(one), Luminance(other));
        return (Math.Max(a, b) + 0.05) / (Math.Min(a, b) + 0.05);
    }

    private static double Luminance(string hex) =>
        (0.2126 * Linear(hex, 1)) + (0.7152 * Linear(hex, 3)) + (0.0722 * Linear(hex, 5));

    private static double Linear(string hex, int at)
    {
        var channel = int.Parse(hex.AsSpan(at, 2), NumberStyles.HexNumber, CultureInfo.InvariantCulture) / 255.0;
        return channel <= 0.04045 ? channel / 12.92 : Math.Pow((channel + 0.055) / 1.055, 2.4);
    }

    [GeneratedRegex(@"--([a-z-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)")]
    private static partial Regex Token();
}
