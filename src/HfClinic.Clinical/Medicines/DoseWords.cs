using System.Globalization;

namespace HfClinic.Clinical.Medicines;

/// <summary>A dose in words, by safe-writing practice: no trailing zero, a leading zero, micrograms spelled out, the schedule in words.</summary>
public static class DoseWords
{
    /// <summary>"furosemide 40 mg twice daily"; a combination by its strengths: "sacubitril/valsartan 49/51 mg twice daily".</summary>
    public static string Of(string medicine, decimal milligrams, decimal timesDaily) =>
        $"{medicine} {Amount(medicine, milligrams)} {Schedule(timesDaily)}";

    /// <summary>"49/51 mg" where the strength of that medicine is written so, else as <see cref="Amount(decimal)"/>.</summary>
    public static string Amount(string medicine, decimal milligrams) =>
        Formulary.BuiltIn.Read(medicine).Medicine?.Ladder?.Rungs.FirstOrDefault(rung => rung.Amount == milligrams)?.Words ?? Amount(milligrams);

    /// <summary>"40 mg", "0.5 mg", "62.5 micrograms" (below 0.25 mg).</summary>
    public static string Amount(decimal milligrams) => milligrams < 0.25m
        ? $"{Number(milligrams * 1000m)} micrograms"
        : $"{Number(milligrams)} mg";

    /// <summary>"daily", "twice daily", "every other day".</summary>
    public static string Schedule(decimal timesDaily) => timesDaily switch
    {
        0.5m => "every other day",
        1m => "daily",
        2m => "twice daily",
        3m => "three times daily",
        4m => "four times daily",
        _ => $"{Number(timesDaily)} times daily",
    };

    private static string Number(decimal value) => value.ToString("0.####", CultureInfo.InvariantCulture);
}
