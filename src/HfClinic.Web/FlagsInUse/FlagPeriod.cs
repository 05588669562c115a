using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Web.Ui;

namespace HfClinic.Web.FlagsInUse;

/// <summary>The period whose flags are counted, as it stands in the address: <c>flag-behaviour?from=02 Sep 2026&amp;to=01 Dec 2026</c>.</summary>
/// <param name="From">First day, included.</param>
/// <param name="Until">Last day, included.</param>
public sealed record FlagPeriod(DateOnly From, DateOnly Until)
{
    public const string Page = "flag-behaviour";

    /// <summary>How many days are counted when no period is asked for.</summary>
    public const int UsualDays = 91;

    private static readonly (int Days, string Words)[] Usual = [(28, "last 4 weeks"), (UsualDays, "last 13 weeks"), (182, "last 26 weeks"), (364, "last 52 weeks")];

    /// <summary>Reads what was asked for; a day left out means today, or <see cref="UsualDays"/> days up to the last.</summary>
    /// <returns>Null with problems noted when a day cannot be read or the period is upside down.</returns>
    public static FlagPeriod? Read(List<Problem> problems, string from, string until, DateOnly today)
    {
        var last = Typed.Day(problems, "Until", until, today);
        var first = Typed.Day(problems, "From", from, today);
        if (problems.Count > 0)
        {
            return null;
        }

        var end = last ?? today;
        var period = new FlagPeriod(first ?? end.AddDays(1 - UsualDays), end);
        if (period.From > period.Until)
        {
            problems.Add(new("Until", "This day lies before the first.", "Swap the two days."));
            return null;
        }

        return period;
    }

    /// <summary>The usual periods up to today, with the one shown marked.</summary>
    public IReadOnlyList<SentencePart> Choices(DateOnly today)
    {
        List<SentencePart> parts = [];
        foreach (var (days, words) in Usual)
        {
            var choice = new FlagPeriod(today.AddDays(1 - days), today);
            parts.Add(new(parts.Count == 0 ? "Show the " : ", "));
            parts.Add(new(words, choice.Href, choice == this));
        }

        parts.Add(new("."));
        return parts;
    }

    private string Href => $"{Page}?from={Uri.EscapeDataString(Wording.Day(From))}&to={Uri.EscapeDataString(Wording.Day(Until))}";
}
