using System.Globalization;

namespace HfClinic.Clinical.Calculations;

/// <summary>Numbers as written beside a calculation, whatever the server's language.</summary>
internal static class Figures
{
    /// <summary>A fixed number of decimals, halves away from zero: "62.8".</summary>
    public static string Fixed(double value, int decimals) => Signed(
        Math.Round(value, decimals, MidpointRounding.AwayFromZero), "F" + decimals.ToString(CultureInfo.InvariantCulture));

    /// <summary>At most three decimals, no trailing zero: "0.7", "1.818".</summary>
    public static string Short(double value) => Signed(value, "0.###");

    /// <summary>All decimals that matter, so that a value beside its limit can be told from it.</summary>
    public static string Plain(double value) => Signed(value, "0.#########");

    /// <summary>A space before the unit; a ratio has none.</summary>
    public static string WithUnit(string number, string unit) => unit.Length == 0 ? number : $"{number} {unit}";

    private static string Signed(double value, string format) => value.ToString(format, CultureInfo.InvariantCulture).Replace('-', '−');
}
