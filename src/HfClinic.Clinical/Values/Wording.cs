using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>How values are written on every screen, print and flag, whatever the server's language.</summary>
public static class Wording
{
    /// <summary>Shown where there is nothing to show.</summary>
    public const string Nothing = "–";

    /// <summary>A weight to one decimal: "74.6 kg" or "164.5 lb".</summary>
    public static string Weight(Weight weight, WeightUnit unit) => $"{WeightNumber(weight, unit)} {Symbol(unit)}";

    /// <summary>A weight to one decimal without its unit, for a column whose heading names it: "74.6".</summary>
    public static string WeightNumber(Weight weight, WeightUnit unit) => Fixed(In(weight, unit), 1);

    /// <summary>A difference of two weights with its sign: "+0.4", "−0.5", "0.0".</summary>
    public static string Change(Weight difference, WeightUnit unit)
    {
        var rounded = decimal.Round(In(difference, unit), 1, MidpointRounding.AwayFromZero);
        var sign = rounded > 0 ? "+" : rounded < 0 ? "−" : "";
        return sign + Fixed(decimal.Abs(rounded), 1);
    }

    /// <summary>
    /// The size of a difference beside the limit it is compared with: "2.6 kg". Where one decimal would make both look
    /// alike ("2.0 kg" against "more than 2.0 kg") more decimals are written, so that the comparison can be followed.
    /// </summary>
    public static string SizeBeside(Weight size, Weight limit, WeightUnit unit)
    {
        var (measured, bound) = (In(size, unit), In(limit, unit));
        var decimals = Enumerable.Range(1, 3).FirstOrDefault(places => Fixed(measured, places) != Fixed(bound, places), 1);
        return $"{Fixed(measured, decimals)} {Symbol(unit)}";
    }

    /// <summary>A limit as it was set: "2.0 kg", "1.75 kg"; one of whole pounds names them too: "2.3 kg (5 lb)".</summary>
    public static string Limit(Weight limit, WeightUnit unit)
    {
        if (unit == WeightUnit.Pounds)
        {
            return Weight(limit, unit);
        }

        var pounds = decimal.Round(limit.Pounds);
        return Values.Weight.FromPounds(pounds) == limit
            ? string.Create(CultureInfo.InvariantCulture, $"{Weight(limit, unit)} ({pounds} lb)")
            : string.Create(CultureInfo.InvariantCulture, $"{limit.Kilograms:0.0##} kg");
    }

    /// <summary>"kg" or "lb".</summary>
    public static string Symbol(WeightUnit unit) => unit == WeightUnit.Pounds ? "lb" : "kg";

    /// <summary>A date: "03 Mar 2026".</summary>
    public static string Day(DateOnly day) => day.ToString("dd MMM yyyy", CultureInfo.InvariantCulture);

    /// <summary>A date with its day of the week, for headings: "Tuesday 03 Mar 2026".</summary>
    public static string LongDay(DateOnly day) => day.ToString("dddd dd MMM yyyy", CultureInfo.InvariantCulture);

    /// <summary>A time of day: "07:12".</summary>
    public static string Time(DateTime time) => time.ToString("HH:mm", CultureInfo.InvariantCulture);

    /// <summary>A date whose year is plain from where it stands: "03 Mar".</summary>
    public static string ShortDay(DateOnly day) => day.ToString("dd MMM", CultureInfo.InvariantCulture);

    /// <summary>A count with its noun: "1 day", "6 days".</summary>
    public static string Count(int number, string one, string many) =>
        string.Create(CultureInfo.InvariantCulture, $"{number} {(number == 1 ? one : many)}");

    /// <summary>A number of days: "1 day", "6 days".</summary>
    public static string Days(int number) => Count(number, "day", "days");

    /// <summary>Words joined as in a sentence: "a", "a and b", "a, b and c".</summary>
    public static string List(IReadOnlyList<string> words) => words.Count < 2
        ? string.Concat(words)
        : $"{string.Join(", ", words.Take(words.Count - 1))} and {words[^1]}";

    /// <summary>With a capital first letter.</summary>
    public static string Sentence(string text) => text.Length == 0 ? text : char.ToUpperInvariant(text[0]) + text[1..];

    private static decimal In(Weight weight, WeightUnit unit) => unit == WeightUnit.Pounds ? weight.Pounds : weight.Kilograms;

    private static string Fixed(decimal number, int decimals) => decimal
        .Round(number, decimals, MidpointRounding.AwayFromZero)
        .ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
