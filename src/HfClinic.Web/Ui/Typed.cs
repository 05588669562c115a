using System.Globalization;
using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Records.DailyWeights;

namespace HfClinic.Web.Ui;

/// <summary>Reads what was typed into a field. What cannot be read for sure is asked about, never guessed.</summary>
public static class Typed
{
    private static readonly string[] DayForms = ["d MMM yyyy", "d MMMM yyyy", "yyyy-M-d"];

    /// <summary>A day: "3 Mar 2026", "2026-03-03", "today" or "yesterday"; null when empty or not a day.</summary>
    public static DateOnly? Day(List<Problem> problems, string field, string text, DateOnly today)
    {
        var words = string.Join(' ', text.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)).ToLowerInvariant();
        switch (words)
        {
            case "":
                return null;
            case "today":
                return today;
            case "yesterday":
                return today.AddDays(-1);
        }

        if (DateOnly.TryParseExact(words, DayForms, CultureInfo.InvariantCulture, DateTimeStyles.None, out var day))
        {
            return day;
        }

        problems.Add(new(field, $"“{text.Trim()}” cannot be read as a day for sure.", $"Write it as {Wording.Day(today)}."));
        return null;
    }

    /// <summary>A day that must be given.</summary>
    public static DateOnly? RequiredDay(List<Problem> problems, string field, string text, DateOnly today)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            problems.Add(new(field, "The day is missing.", $"Write it as {Wording.Day(today)}."));
            return null;
        }

        return Day(problems, field, text, today);
    }

    /// <summary>A weight, "74.6", "74,6 kg" or "164.5 lb"; without a unit it is the clinic's.</summary>
    public static Weight? Weight(List<Problem> problems, string field, string text, WeightUnit unit)
    {
        var read = CalledInWeight.Read(text, unit, field, out var problem);
        if (read is null)
        {
            problems.Add(problem ?? new(field, "The weight is missing.", $"Write a number with its unit, as 74.6 {Wording.Symbol(unit)}."));
        }

        return read?.Weight;
    }

    /// <summary>A number with a decimal point or comma; null when it is none.</summary>
    public static decimal? Number(string text) =>
        decimal.TryParse(text.Trim().Replace(',', '.'), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var number) ? number : null;

    /// <summary>A whole number in a field that may stay empty.</summary>
    public static int? Whole(List<Problem> problems, string field, string text)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            return null;
        }

        if (int.TryParse(text.Trim(), NumberStyles.None, CultureInfo.InvariantCulture, out var number))
        {
            return number;
        }

        problems.Add(new(field, $"“{text.Trim()}” is not a whole number.", "Write digits only."));
        return null;
    }
}
