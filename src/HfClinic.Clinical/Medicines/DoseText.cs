using System.Globalization;
using System.Text.RegularExpressions;

namespace HfClinic.Clinical.Medicines;

/// <summary>One taking and how often.</summary>
/// <param name="Milligrams">Of one taking; the sum of both parts for a combination.</param>
/// <param name="TimesDaily">Takings a day, 0.5 for every other day; null when it was not written.</param>
public sealed record WrittenDose(decimal Milligrams, decimal? TimesDaily)
{
    /// <summary>The one way this program writes it: "2.5 mg twice daily".</summary>
    /// <param name="medicine">The medicine's name, so that a combination is written by its strengths.</param>
    public string InWords(string medicine = "") =>
        DoseWords.Amount(medicine, Milligrams) + (TimesDaily is { } times ? $" {DoseWords.Schedule(times)}" : "");
}

/// <summary>A dose as understood, or what was not understood and how to mend it.</summary>
public sealed record DoseReading(WrittenDose? Dose, string NotUnderstood);

/// <summary>Reads doses as people write them. Nothing is guessed: what is not plain is answered with a question.</summary>
public static partial class DoseText
{
    /// <summary>Reads the amount of one taking and how often it is taken.</summary>
    /// <param name="text">"2.5 mg twice daily", "1/2 tablet of 5 mg daily", "125 micrograms", "49/51 bid", "25 mg every other day".</param>
    /// <param name="medicine">The medicine, where known, so that the strengths of a combination can be told from a fraction.</param>
    public static DoseReading Read(string text, Medicine? medicine = null)
    {
        var written = Spaces().Replace(text.Trim().TrimEnd('.').ToLowerInvariant(), " ");
        if (written.Length == 0)
        {
            return No("Nothing is written: give the amount and how often, for example 5 mg twice daily.");
        }

        if (Thousands().Match(written) is { Success: true } thousands)
        {
            return No($"\"{thousands.Value}\" can be read in two ways: write it without the comma.");
        }

        return Combination().Match(written) is { Success: true } pair ? ReadPair(pair, medicine)
            : Tablets().Match(written) is { Success: true } tablets && Count(tablets.Groups["count"].Value) is { } count ? ReadTablets(tablets, count)
            : Plain().Match(written) is { Success: true } plain ? ReadAmount(plain, 1)
            : No($"\"{text.Trim()}\" does not begin with an amount: write for example 5 mg twice daily.");
    }

    private static DoseReading ReadPair(Match match, Medicine? medicine)
    {
        var (first, second) = (Number(match.Groups["first"].Value), Number(match.Groups["second"].Value));
        var strength = $"{match.Groups["first"].Value}/{match.Groups["second"].Value}";
        if (medicine is null)
        {
            return No($"\"{strength}\" is a strength of a combination or part of a tablet: choose the medicine first, or write the tablet's strength.");
        }

        var known = medicine.Ladder?.Rungs.Any(rung => rung.Amount == first + second && rung.Words == $"{strength} mg") ?? false;
        return known
            ? WithSchedule(first + second, match.Groups["rest"].Value)
            : No($"\"{strength}\" is not a strength of {medicine.FullName}: for part of a tablet write its strength, for example 1/2 tablet of 5 mg daily.");
    }

    private static DoseReading ReadTablets(Match match, decimal count)
    {
        var inner = Plain().Match(match.Groups["rest"].Value);
        return count <= 0 ? No("The number of tablets is not above zero.")
            : !inner.Success ? No("The strength of the tablet is missing: write for example 1/2 tablet of 5 mg daily.")
            : ReadAmount(inner, count);
    }

    private static DoseReading ReadAmount(Match match, decimal count)
    {
        var unit = match.Groups["unit"].Value;
        var amount = match.Groups["amount"].Value;
        decimal? perUnit = unit switch
        {
            "mg" or "mgs" or "milligram" or "milligrams" => 1,
            "mcg" or "mcgs" or "ug" or "µg" or "μg" or "microgram" or "micrograms" => 0.001m,
            "g" or "gram" or "grams" => 1000,
            _ => null,
        };
        return perUnit is null
                ? No(unit.Length == 0 || SchedulesHas(unit)
                    ? $"The unit is missing after {amount}: write mg or micrograms."
                    : $"\"{unit}\" is not a unit of dose known here: write mg or micrograms.")
            : Number(amount) <= 0 ? No("The amount is not above zero.")
            : WithSchedule(Number(amount) * perUnit.Value * count, match.Groups["rest"].Value);
    }

    private static DoseReading WithSchedule(decimal milligrams, string rest)
    {
        var schedule = Fillers().Replace(rest, " ").Trim(' ', ',', '.', ';');
        return schedule.Length == 0 ? new(new WrittenDose(milligrams, null), "")
            : DoseSchedules.Read(schedule) is { } times ? new(new WrittenDose(milligrams, times), "")
            : No($"\"{schedule}\" is not understood: write how often as daily, twice daily, three times daily, four times daily or every other day.");
    }

    private static bool SchedulesHas(string word) => DoseSchedules.Read(word) is not null || word is "once" or "twice" or "three" or "four" or "every";

    private static decimal? Count(string text) => text.Trim() switch
    {
        "half" or "half a" or "a half" or "½" => 0.5m,
        "quarter" or "a quarter" or "¼" => 0.25m,
        "¾" => 0.75m,
        "a" or "one" => 1,
        "two" => 2,
        "three" => 3,
        "1½" or "1 ½" or "one and a half" => 1.5m,
        "2½" or "2 ½" or "two and a half" => 2.5m,
        var other when Fraction().Match(other) is { Success: true } fraction => OfFraction(fraction),
        var other when decimal.TryParse(other.Replace(',', '.'), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var number) => number,
        _ => null,
    };

    private static decimal? OfFraction(Match match)
    {
        var under = Number(match.Groups["under"].Value);
        var whole = match.Groups["whole"].Success ? Number(match.Groups["whole"].Value) : 0;
        return under == 0 ? null : whole + (Number(match.Groups["over"].Value) / under);
    }

    private static decimal Number(string text) => decimal.Parse(text.Replace(',', '.'), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture);

    private static DoseReading No(string why) => new(null, why);

    [GeneratedRegex(@"\s+")]
    private static partial Regex Spaces();

    [GeneratedRegex(@"(?<![\d.])[1-9]\d{0,2}(,\d{3})+(?!\d)")]
    private static partial Regex Thousands();

    [GeneratedRegex(@"^(?<first>\d{1,4}(\.\d{1,4})?)\s?/\s?(?<second>\d{1,4}(\.\d{1,4})?)(\s?mg)?(?!\s?(tab|cap|of\b|\d|/))\b(?<rest>.*)$")]
    private static partial Regex Combination();

    [GeneratedRegex(@"^(?<count>.*?)\s?(?:tablets?|tabs?|capsules?|caps?|[x×](?=\s?\d))\b?\s?(?:of|a|at)?\s?(?<rest>.*)$")]
    private static partial Regex Tablets();

    [GeneratedRegex(@"^(?<amount>\d{0,5}(?:[.,]\d{1,5})|\d{1,5})\s?(?<unit>[a-zµμ]*)(?<rest>.*)$")]
    private static partial Regex Plain();

    [GeneratedRegex(@"\b(by mouth|orally|oral|po|p\.o\.|tablets?|tabs?|with food|taken)\b")]
    private static partial Regex Fillers();

    [GeneratedRegex(@"^((?<whole>\d{1,2}) )?(?<over>\d{1,2})\s?/\s?(?<under>\d{1,2})$")]
    private static partial Regex Fraction();
}
