using System.Globalization;
using System.Text.RegularExpressions;

namespace HfClinic.Records.DailyWeights;

/// <summary>A blood pressure as it is told on the phone: "118/72", "118 72", "118 over 72"; mmHg.</summary>
public sealed partial record CalledInPressure(int Systolic, int Diastolic)
{
    /// <summary>Reads what was typed.</summary>
    /// <param name="problem">Why it cannot be read and how to mend it; null when it can.</param>
    /// <returns>Null when nothing was typed or it cannot be read.</returns>
    public static CalledInPressure? Read(string typed, string field, out Problem? problem)
    {
        problem = null;
        var text = typed.Trim();
        if (text.Length == 0)
        {
            return null;
        }

        if (Two().Match(text) is { Success: true } two)
        {
            return new(Whole(two.Groups[1].Value), Whole(two.Groups[2].Value));
        }

        problem = new(field, $"“{text}” is not a blood pressure this line can read.", "Type both numbers as 118/72.");
        return null;
    }

    private static int Whole(string digits) => int.Parse(digits, NumberStyles.None, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^([0-9]{2,3})\s*(?:/|\\|-|,|\s|over)\s*([0-9]{2,3})$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Two();
}
