namespace HfClinic.Records.Exchange;

/// <summary>What a first look found in one column.</summary>
public sealed class ColumnLook(string heading)
{
    public string Heading => heading;

    /// <summary>Lines with something in this column.</summary>
    public int Filled { get; private set; }

    /// <summary>Dates that can only have the day first, such as 25/03/2026.</summary>
    public int DayFirst { get; private set; }

    /// <summary>Dates that can only have the month first, such as 03/25/2026.</summary>
    public int MonthFirst { get; private set; }

    /// <summary>Dates that can be read either way, such as 03/04/2026.</summary>
    public int EitherWay { get; private set; }

    /// <summary>The first date that can be read either way, as in the file.</summary>
    public string? EitherWayExample { get; private set; }

    /// <summary>The first date that can be read one way only, as in the file.</summary>
    public string? OneWayExample { get; private set; }

    /// <summary>Whether somebody has to say how the dates of this column are to be read.</summary>
    public bool NeedsOrder => EitherWay > 0;

    /// <summary>The order that the other dates of the column speak for; null when they say nothing or disagree. Never used without asking.</summary>
    public DateOrder? SuggestedOrder => (DayFirst > 0, MonthFirst > 0) switch
    {
        (true, false) => DateOrder.DayFirst,
        (false, true) => DateOrder.MonthFirst,
        _ => null,
    };

    /// <summary>An example date as it would be read by this order.</summary>
    public static DateOnly ReadExample(string text, DateOrder order) => DateText.Read(text, order).Day;

    internal void Take(string text)
    {
        if (text.Length == 0)
        {
            return;
        }

        Filled++;
        if (!StartsLikeTwoNumbers(text))
        {
            return;
        }

        switch (DateText.Read(text, order: null).Outcome, DateText.Read(text, DateOrder.DayFirst).Outcome)
        {
            case (DateOutcome.Ambiguous, _):
                EitherWay++;
                EitherWayExample ??= text;
                break;
            case (DateOutcome.Read, DateOutcome.NoSuchDate):
                MonthFirst++;
                OneWayExample ??= text;
                break;
            case (DateOutcome.Read, DateOutcome.Read) when DateText.Read(text, DateOrder.MonthFirst).Outcome == DateOutcome.NoSuchDate:
                DayFirst++;
                OneWayExample ??= text;
                break;
        }
    }

    /// <summary>A cheap look before the real one: digits, and a separator within the first three characters.</summary>
    private static bool StartsLikeTwoNumbers(string text) =>
        text.Length >= 8 && char.IsAsciiDigit(text[0])
        && (text[1] is '/' or '-' or '.' || (char.IsAsciiDigit(text[1]) && text[2] is '/' or '-' or '.'));
}
