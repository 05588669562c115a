using System.Globalization;
using HfClinic.Clinical.Rules;

namespace HfClinic.Web.Ui;

/// <summary>How values are written for people, the same everywhere.</summary>
public static class Wording
{
    /// <summary>"03 Mar 2026".</summary>
    public static string Day(DateOnly day) => day.ToString("dd MMM yyyy", CultureInfo.InvariantCulture);

    /// <summary>"Tuesday 03 Mar 2026", for headings.</summary>
    public static string LongDay(DateOnly day) => day.ToString("dddd dd MMM yyyy", CultureInfo.InvariantCulture);

    /// <summary>Grams as kilograms with one decimal and no unit, halves away from zero: "74.6".</summary>
    public static string Kilograms(int grams) => Tenths(grams).ToString("0.0", CultureInfo.InvariantCulture);

    /// <summary>A difference in grams as signed kilograms: "+3.1", "−0.4" with a minus sign, "0.0" when it rounds to nothing.</summary>
    public static string Change(int grams) => Tenths(grams).ToString("+0.0;−0.0;0.0", CultureInfo.InvariantCulture);

    public static string Name(Urgency urgency) => urgency switch
    {
        Urgency.Today => "Today",
        Urgency.ThisWeek => "This week",
        Urgency.NextVisit => "Next visit",
        _ => "For information",
    };

    /// <summary>"1 reading", "3 readings".</summary>
    public static string Count(int number, string one, string many) =>
        string.Create(CultureInfo.InvariantCulture, $"{number} {(number == 1 ? one : many)}");

    private static decimal Tenths(int grams) => decimal.Round(grams / 1000m, 1, MidpointRounding.AwayFromZero);
}
