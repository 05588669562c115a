using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>The inputs shared by the digoxin formulas. Ranges are choices of this program.</summary>
internal static class DigoxinInputs
{
    /// <summary>1.44 = 1440 minutes a day / 1000 mL in a litre: clearance in mL/min to litres a day.</summary>
    public const double LitresPerDay = 1.44;

    public static readonly Quantity<double> Daily = Quantity.Of("digoxin a day", "micrograms", 20, 1000);
    public static readonly Quantity<double> Clearance = Quantity.Of("digoxin clearance", "mL/min", 5, 500);
    public static readonly Quantity<double> Volume = Quantity.Of("volume of distribution", "L", 50, 1500);

    public static readonly Quantity<DigoxinLevel> Level =
        new("digoxin level", "ng/mL", 0.1, 15, level => (double)level.NgPerMl, level => level.ToString());
}
