using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>
/// A body weight in whole grams, so that 82.1 kg minus 80.1 kg is exactly 2,000 g.
/// </summary>
/// <remarks>
/// One pound is 453.59237 g (international avoirdupois pound, exact by definition: NIST Handbook 44, Appendix C);
/// a weight typed in pounds is rounded to the nearest gram, halves away from zero.
/// </remarks>
/// <param name="Grams">Mass in grams. Any integer: a difference of two weights may be negative.</param>
public readonly record struct Weight(int Grams) : IComparable<Weight>
{
    /// <summary>Grams in one international avoirdupois pound, exact by definition.</summary>
    public const decimal GramsPerPound = 453.59237m;

    /// <summary>The lightest weight accepted as a person's: 25 kg.</summary>
    public static readonly Weight Lightest = new(25_000);

    /// <summary>The heaviest weight accepted as a person's: 300 kg.</summary>
    public static readonly Weight Heaviest = new(300_000);

    /// <summary>Kilograms, exact.</summary>
    public decimal Kilograms => Grams / 1000m;

    /// <summary>Pounds, unrounded.</summary>
    public decimal Pounds => Grams / GramsPerPound;

    /// <summary>Whether the value lies in the hard entry range, both ends included (25 to 300 kg).</summary>
    public bool IsInEntryRange => this >= Lightest && this <= Heaviest;

    /// <summary>Converts kilograms to whole grams, halves away from zero.</summary>
    /// <exception cref="OverflowException">The value does not fit a whole number of grams.</exception>
    public static Weight FromKilograms(decimal kilograms) => new(ToWholeGrams(kilograms * 1000m));

    /// <summary>Converts pounds to whole grams, halves away from zero.</summary>
    /// <exception cref="OverflowException">The value does not fit a whole number of grams.</exception>
    public static Weight FromPounds(decimal pounds) => new(ToWholeGrams(pounds * GramsPerPound));

    public static Weight operator -(Weight left, Weight right) => new(left.Grams - right.Grams);

    public static Weight operator +(Weight left, Weight right) => new(left.Grams + right.Grams);

    public static bool operator <(Weight left, Weight right) => left.Grams < right.Grams;

    public static bool operator >(Weight left, Weight right) => left.Grams > right.Grams;

    public static bool operator <=(Weight left, Weight right) => left.Grams <= right.Grams;

    public static bool operator >=(Weight left, Weight right) => left.Grams >= right.Grams;

    public static Weight Subtract(Weight left, Weight right) => left - right;

    public static Weight Add(Weight left, Weight right) => left + right;

    public int CompareTo(Weight other) => Grams.CompareTo(other.Grams);

    /// <summary>Kilograms to one decimal, as scales show them: "74.6 kg".</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{Kilograms:0.0} kg");

    private static int ToWholeGrams(decimal grams) => decimal.ToInt32(decimal.Round(grams, 0, MidpointRounding.AwayFromZero));
}
