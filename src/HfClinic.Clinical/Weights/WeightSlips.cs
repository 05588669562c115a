using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// The slips that would turn an expected weight into the one entered. A slip is offered when undoing it gives a weight
/// within three standard deviations of the expectation. Digits are those of the weight in kilograms to one decimal.
/// </summary>
internal static class WeightSlips
{
    private static readonly decimal[] Steps = [1, -1, 10, -10, 100, -100];

    /// <summary>The slips in the order they are offered; at least one.</summary>
    public static ImmutableArray<LikelySlip> Of(Weight entered, ExpectedReading expected, IReadOnlyList<Weight> householdRecent)
    {
        decimal kilograms = entered.Kilograms;
        decimal kilogramsPerPound = Weight.GramsPerPound / 1000m;
        var found = ImmutableArray.CreateBuilder<LikelySlip>();
        Offer(HoldReason.PoundsTakenAsKilograms, [kilograms * kilogramsPerPound]);
        Offer(HoldReason.KilogramsTakenAsPounds, [kilograms / kilogramsPerPound]);
        Offer(HoldReason.TenfoldTooHigh, [kilograms / 10]);
        Offer(HoldReason.TenfoldTooLow, [kilograms * 10]);
        Offer(HoldReason.DroppedDigit, WithDigitPutIn(kilograms));
        Offer(HoldReason.SwappedDigits, WithNeighboursSwapped(kilograms));
        Offer(HoldReason.WrongDigit, Steps.Select(step => kilograms + step));
        if (found.Count == 0)
        {
            bool fitsAnother = householdRecent.Any(other => (expected with { Kilograms = (double)other.Kilograms }).IsNear((double)kilograms));
            found.Add(new LikelySlip(fitsAnother ? HoldReason.AnotherPerson : HoldReason.Unexplained, null));
        }

        return found.ToImmutable();

        void Offer(HoldReason reason, IEnumerable<decimal> meant)
        {
            decimal nearest = meant.DefaultIfEmpty(decimal.MinValue).MinBy(weight => Math.Abs((double)weight - expected.Kilograms));
            if (expected.IsNear((double)nearest))
            {
                found.Add(new LikelySlip(reason, Weight.FromKilograms(nearest)));
            }
        }
    }

    /// <summary>A digit put back anywhere before the decimal point.</summary>
    private static IEnumerable<decimal> WithDigitPutIn(decimal kilograms)
    {
        string digits = Digits(kilograms);
        for (int place = 0; place < digits.Length; place++)
        {
            for (char digit = '0'; digit <= '9'; digit++)
            {
                yield return FromDigits(digits.Insert(place, digit.ToString()));
            }
        }
    }

    private static IEnumerable<decimal> WithNeighboursSwapped(decimal kilograms)
    {
        string digits = Digits(kilograms);
        for (int place = 1; place < digits.Length; place++)
        {
            var swapped = digits.ToCharArray();
            (swapped[place - 1], swapped[place]) = (swapped[place], swapped[place - 1]);
            yield return FromDigits(swapped);
        }
    }

    /// <summary>The digits of the weight in tenths of a kilogram: "804" for 80.4 kg.</summary>
    private static string Digits(decimal kilograms) =>
        decimal.Round(kilograms * 10, MidpointRounding.AwayFromZero).ToString("0", CultureInfo.InvariantCulture);

    private static decimal FromDigits(ReadOnlySpan<char> digits) => int.Parse(digits, CultureInfo.InvariantCulture) / 10m;
}
