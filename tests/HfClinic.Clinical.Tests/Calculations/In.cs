using System.Globalization;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>Short ways to offer inputs.</summary>
internal static class In
{
    public static Given<Weight> Kg(decimal kilograms) => Weight.FromKilograms(kilograms);

    public static Given<Length> Cm(decimal centimetres) => Length.FromCentimetres(centimetres);

    public static Given<Creatinine> MgPerDl(decimal creatinine) => Creatinine.FromMgPerDl(creatinine);

    public static Given<Creatinine> Micromol(decimal creatinine) => Creatinine.FromMicromolPerLitre(creatinine);

    public static Given<DigoxinLevel> NgPerMl(decimal level) => DigoxinLevel.FromNgPerMl(level);

    /// <summary>A decimal as written in a test case.</summary>
    public static decimal Number(string text) => decimal.Parse(text, CultureInfo.InvariantCulture);

    /// <summary>The value, which must have been computed.</summary>
    public static T Value<T>(Computed<T> computed)
        where T : struct
    {
        Assert.Null(computed.WhyNot);
        return Assert.NotNull(computed.Value);
    }

    /// <summary>The value agrees with one rounded to so many decimals.</summary>
    public static void Check(double expected, Computed<double> computed, int decimals) =>
        Assert.Equal(expected, Value(computed), 0.500001 * Math.Pow(10, -decimals));
}
