using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;

namespace HfClinic.Web.DailyWeights;

/// <summary>What the quick line recorded, in words.</summary>
/// <param name="HeldReadingId">The weight that was set aside, if it was.</param>
public sealed record QuickRecorded(string Words, long? HeldReadingId = null)
{
    /// <summary>"Recorded for Elsmere, Oda (SM-1084): 164.5 lb = 74.6 kg, BP 118/72, pulse 88, ankles swollen."</summary>
    public static QuickRecorded Of(PatientRow person, TakenReadings taken, RecordedReadings recorded, WeightUnit unit)
    {
        var whom = $"{person.FullName} ({person.ClinicNumber})";
        var parts = Parts(taken, unit, recorded.Held is null).ToList();
        var accepted = parts.Count == 0 ? "" : $"Recorded for {whom}: {string.Join(", ", parts)}.";
        if (recorded.Held is not { } reason || taken.Weight is not { } weight)
        {
            return new(accepted);
        }

        var held = new WeightReading(0, taken.LocalTime, weight, new HeldReading(reason, taken.LocalTime));
        var mended = HeldWords.Mended(held) is { } right ? $", would then be {Wording.Weight(right, unit)}" : "";
        return new($"{accepted} Set aside for {whom}: {HeldWords.Describe(held, unit)}{mended}.".TrimStart(), recorded.ReadingIds[0]);
    }

    private static IEnumerable<string> Parts(TakenReadings taken, WeightUnit unit, bool weightCounts)
    {
        if (weightCounts && taken.Weight is { } weight)
        {
            yield return Wording.Weight(weight, unit);
        }

        if (taken is { SystolicPressure: { } systolic, DiastolicPressure: { } diastolic })
        {
            yield return $"BP {systolic}/{diastolic}";
        }

        if (taken.HeartRate is { } pulse)
        {
            yield return $"pulse {pulse}";
        }

        if (taken.Symptoms != Symptoms.None)
        {
            yield return SymptomWords.List(taken.Symptoms);
        }
        else if (taken.AskedForSymptoms)
        {
            yield return "asked, no symptoms told";
        }

        if (taken.Note is { } note)
        {
            yield return $"note “{note}”";
        }
    }
}
