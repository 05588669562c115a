using System.Globalization;
using System.Text.RegularExpressions;
using HfClinic.Clinical.Values;

namespace HfClinic.Records.DailyWeights;

/// <summary>A weight as it is told on the phone: "74.6", "74,6 kg", "164.5 lb", "11 st 10 lb".</summary>
/// <param name="Typed">The number as typed with its unit, for the record: "164.5 lb".</param>
/// <param name="TypedIn">The unit it was read in; stones and pounds are pounds.</param>
public sealed partial record CalledInWeight(Weight Weight, string Typed, WeightUnit TypedIn)
{
    private const decimal PoundsPerStone = 14;

    /// <summary>What was typed beside the other unit, so that a slip of the unit is seen: "164.5 lb = 74.6 kg".</summary>
    public string Words => $"{Typed} = {Wording.Weight(Weight, TypedIn == WeightUnit.Pounds ? WeightUnit.Kilograms : WeightUnit.Pounds)}";

    /// <summary>Reads what was typed; a number without a unit is in the clinic's unit.</summary>
    /// <param name="problem">Why it cannot be read and how to mend it; null when it can.</param>
    /// <returns>Null when nothing was typed or it cannot be read.</returns>
    public static CalledInWeight? Read(string typed, WeightUnit usual, string field, out Problem? problem)
    {
        problem = null;
        var text = typed.Trim();
        if (text.Length == 0)
        {
            return null;
        }

        if (Stones().Match(text) is { Success: true } stones)
        {
            var rest = stones.Groups["rest"].Success ? Number(stones.Groups["rest"].Value) : 0;
            if (rest < PoundsPerStone)
            {
                var pounds = (Number(stones.Groups["stone"].Value) * PoundsPerStone) + rest;
                return new(Weight.FromPounds(pounds), text, WeightUnit.Pounds);
            }
        }

        if (Plain().Match(text) is { Success: true } plain)
        {
            var number = Number(plain.Groups["number"].Value);
            var unit = plain.Groups["pounds"].Success ? WeightUnit.Pounds : plain.Groups["kilograms"].Success ? WeightUnit.Kilograms : usual;
            return new(
                unit == WeightUnit.Pounds ? Weight.FromPounds(number) : Weight.FromKilograms(number),
                $"{plain.Groups["number"].Value} {Wording.Symbol(unit)}",
                unit);
        }

        problem = new(field, $"“{text}” is not a weight this line can read.", "Type it as 74.6, 74,6 kg, 164.5 lb or 11 st 10 lb.");
        return null;
    }

    private static decimal Number(string digits) => decimal.Parse(digits.Replace(',', '.'), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?<number>[0-9]{1,4}(?:\.[0-9]{1,3}|,[0-9]{1,2})?)\s*(?:(?<kilograms>kgs?|kilos?|kilograms?)|(?<pounds>lbs?|pounds?))?\.?$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Plain();

    [GeneratedRegex(@"^(?<stone>[0-9]{1,2})\s*(?:st|stones?)\.?(?:\s*(?<rest>[0-9]{1,2}(?:[.,][0-9]{1,2})?)\s*(?:lbs?|pounds?)?\.?)?$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Stones();
}
