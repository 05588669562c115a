using System.Globalization;
using System.Text.RegularExpressions;

namespace HfClinic.Records.Exchange;

/// <summary>How a date of two numbers and a year is to be read.</summary>
public enum DateOrder
{
    /// <summary>03/04/2026 is 3 April.</summary>
    DayFirst = 1,

    /// <summary>03/04/2026 is 4 March.</summary>
    MonthFirst = 2,
}

/// <summary>What became of reading a date.</summary>
internal enum DateOutcome
{
    Read,
    NotADate,
    NoSuchDate,

    /// <summary>Two readings are possible and nobody said which.</summary>
    Ambiguous,
    TwoDigitYear,
    NoSuchTime,
}

/// <summary>
/// A date as files write it, with or without a time. Year first (ISO 8601) and month by name are read as they stand;
/// two numbers and a year only by the order the person gave, unless a number above 12 leaves one reading.
/// </summary>
/// <param name="Day">The date, when read.</param>
/// <param name="Time">The time of day, when the text holds one.</param>
/// <param name="Offset">The distance from UTC, when the text holds one.</param>
internal readonly partial record struct DateText(DateOutcome Outcome, DateOnly Day = default, TimeOnly? Time = null, TimeSpan? Offset = null)
{
    private static readonly string[] Months = CultureInfo.InvariantCulture.DateTimeFormat.MonthNames[..12];

    /// <summary>Reads the text.</summary>
    /// <param name="order">The order the person gave for this column, or null.</param>
    public static DateText Read(string text, DateOrder? order)
    {
        var trimmed = text.Trim();
        if (YearFirst().Match(trimmed) is { Success: true } iso)
        {
            return Whole(Number(iso, "y"), Number(iso, "m"), Number(iso, "d"), iso.Groups["rest"].Value);
        }

        if (TwoNumbers().Match(trimmed) is { Success: true } numbers)
        {
            return ByOrder(Number(numbers, "a"), Number(numbers, "b"), numbers.Groups["y"].Value, numbers.Groups["rest"].Value, order);
        }

        var named = DayMonthName().Match(trimmed) is { Success: true } dayFirst ? dayFirst : MonthNameDay().Match(trimmed);
        return named.Success && MonthOf(named.Groups["name"].Value) is { } month
            ? Whole(Number(named, "y"), month, Number(named, "d"), named.Groups["rest"].Value)
            : new(DateOutcome.NotADate);
    }

    /// <summary>Reads a time of day that stands alone; null when it is none.</summary>
    public static (TimeOnly Time, TimeSpan? Offset)? ReadTime(string text)
    {
        if (TimeOfDay().Match(text.Trim()) is not { Success: true } match)
        {
            return null;
        }

        var (hour, minute) = (Number(match, "h"), Number(match, "min"));
        var second = match.Groups["s"].Success ? Number(match, "s") : 0;
        var half = match.Groups["half"].Value.ToUpperInvariant();
        if (half.Length > 0)
        {
            if (hour is < 1 or > 12)
            {
                return null;
            }

            hour = (hour % 12) + (half[0] == 'P' ? 12 : 0);
        }

        return hour > 23 || minute > 59 || second > 59 ? null : (new TimeOnly(hour, minute, second), OffsetOf(match.Groups["offset"].Value));
    }

    private static DateText ByOrder(int first, int second, string year, string rest, DateOrder? order)
    {
        if (year.Length != 4)
        {
            return new(DateOutcome.TwoDigitYear);
        }

        var known = order ?? (first > 12 || first == second ? DateOrder.DayFirst : second > 12 ? DateOrder.MonthFirst : null);
        return known switch
        {
            DateOrder.DayFirst => Whole(int.Parse(year, CultureInfo.InvariantCulture), second, first, rest),
            DateOrder.MonthFirst => Whole(int.Parse(year, CultureInfo.InvariantCulture), first, second, rest),
            _ => new(DateOutcome.Ambiguous),
        };
    }

    private static DateText Whole(int year, int month, int day, string rest)
    {
        if (year < 1 || month is < 1 or > 12 || day < 1 || day > DateTime.DaysInMonth(year, month))
        {
            return new(DateOutcome.NoSuchDate);
        }

        var date = new DateOnly(year, month, day);
        if (string.IsNullOrWhiteSpace(rest))
        {
            return new(DateOutcome.Read, date);
        }

        return ReadTime(rest) is { } time ? new(DateOutcome.Read, date, time.Time, time.Offset) : new(DateOutcome.NoSuchTime);
    }

    private static TimeSpan? OffsetOf(string text)
    {
        if (text.Length == 0)
        {
            return null;
        }

        if (text is "Z" or "z")
        {
            return TimeSpan.Zero;
        }

        var digits = text[1..].Replace(":", "", StringComparison.Ordinal);
        var span = new TimeSpan(int.Parse(digits[..2], CultureInfo.InvariantCulture), int.Parse(digits[2..], CultureInfo.InvariantCulture), 0);
        return text[0] == '-' ? -span : span;
    }

    private static int? MonthOf(string name)
    {
        var at = Array.FindIndex(Months, month => month.StartsWith(name, StringComparison.OrdinalIgnoreCase));
        return at < 0 ? null : at + 1;
    }

    private static int Number(Match match, string group) => int.Parse(match.Groups[group].ValueSpan, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?<y>[0-9]{4})(?:(?<sep>[-/.])(?<m>[0-9]{1,2})\k<sep>(?<d>[0-9]{1,2})|(?<m>[0-9]{2})(?<d>[0-9]{2}))(?:[T\s]+(?<rest>\S.*))?$", RegexOptions.CultureInvariant)]
    private static partial Regex YearFirst();

    [GeneratedRegex(@"^(?<a>[0-9]{1,2})(?<sep>[-/.])(?<b>[0-9]{1,2})\k<sep>(?<y>[0-9]{4}|[0-9]{2})(?:[T,\s]+(?<rest>\S.*))?$", RegexOptions.CultureInvariant)]
    private static partial Regex TwoNumbers();

    [GeneratedRegex(@"^(?<d>[0-9]{1,2})[-.\s]*(?<name>[A-Za-z]{3,9})[-.,\s]*(?<y>[0-9]{4})(?:[T,\s]+(?<rest>\S.*))?$", RegexOptions.CultureInvariant)]
    private static partial Regex DayMonthName();

    [GeneratedRegex(@"^(?<name>[A-Za-z]{3,9})[-.\s]+(?<d>[0-9]{1,2})[-,\s]+(?<y>[0-9]{4})(?:[T,\s]+(?<rest>\S.*))?$", RegexOptions.CultureInvariant)]
    private static partial Regex MonthNameDay();

    [GeneratedRegex(@"^(?<h>[0-9]{1,2}):(?<min>[0-9]{2})(?::(?<s>[0-9]{2})(?:[.,][0-9]{1,9})?)?\s*(?<half>[AaPp]\.?[Mm]\.?)?\s*(?<offset>[Zz]|[+-][0-9]{2}:?[0-9]{2})?$", RegexOptions.CultureInvariant)]
    private static partial Regex TimeOfDay();
}
