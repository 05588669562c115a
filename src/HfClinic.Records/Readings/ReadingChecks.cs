using HfClinic.Clinical.Values;

namespace HfClinic.Records.Readings;

/// <summary>The hard checks on readings: what is refused rather than set aside. One wording for forms and files.</summary>
public static class ReadingChecks
{
    public const string WeightRange = "weight outside 25 to 300 kg";
    public const string PressureOrder = "systolic not above diastolic";
    public const string InTheFuture = "measured in the future";

    /// <summary>Everything wrong with what was typed.</summary>
    /// <param name="now">The clinic's wall clock.</param>
    public static IReadOnlyList<Problem> Problems(TakenReadings taken, DateTime now)
    {
        var problems = new List<Problem>();
        if (taken.Weight is null && taken.SystolicPressure is null && taken.DiastolicPressure is null && taken.HeartRate is null
            && taken.OxygenSaturation is null && taken.Symptoms == Symptoms.None && !taken.AskedForSymptoms)
        {
            problems.Add(new("", "Nothing was given.", "Type a weight, a pressure, a pulse or a symptom."));
        }

        if (taken.Weight is { IsInEntryRange: false } weight)
        {
            problems.Add(new(nameof(taken.Weight), $"{weight} is outside 25 to 300 kg.", "Check the number and its unit, and ask again."));
        }

        Range(problems, nameof(taken.SystolicPressure), "systolic pressure", taken.SystolicPressure, 50, 260, "mmHg");
        Range(problems, nameof(taken.DiastolicPressure), "diastolic pressure", taken.DiastolicPressure, 20, 160, "mmHg");
        Range(problems, nameof(taken.HeartRate), "pulse", taken.HeartRate, 25, 220, "beats per minute");
        Range(problems, nameof(taken.OxygenSaturation), "oxygen saturation", taken.OxygenSaturation, 50, 100, "%");
        if (taken.SystolicPressure is { } systolic && taken.DiastolicPressure is { } diastolic && systolic <= diastolic)
        {
            problems.Add(new(nameof(taken.SystolicPressure),
                $"Systolic {systolic} is not above diastolic {diastolic}.", "Check whether the two were swapped."));
        }

        if ((taken.SystolicPressure is null) != (taken.DiastolicPressure is null))
        {
            problems.Add(new(nameof(taken.SystolicPressure), "Only one of the two pressures was given.", "Type both, as 118/72."));
        }

        if (taken.LocalTime > now.AddMinutes(5))
        {
            problems.Add(new(nameof(taken.LocalTime), "The time lies in the future.", "Give the time it was measured."));
        }
        else if (taken.LocalTime < now.AddYears(-20))
        {
            problems.Add(new(nameof(taken.LocalTime), "The time lies more than 20 years back.", "Check the year."));
        }

        return problems;
    }

    private static void Range(List<Problem> problems, string field, string name, int? value, int lowest, int highest, string unit)
    {
        if (value < lowest || value > highest)
        {
            problems.Add(new(field, $"A {name} of {value} is outside {lowest} to {highest} {unit}.", "Check the number, and ask again."));
        }
    }
}
