using System.Globalization;
using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;

namespace HfClinic.Records.DailyWeights;

/// <summary>What is typed for one called-in reading; each field as typed.</summary>
public sealed record CalledInLine
{
    public string Weight { get; init; } = "";

    public string Pressure { get; init; } = "";

    public string Pulse { get; init; } = "";

    public string Symptoms { get; init; } = "";

    /// <summary>The words that stand for no listed symptom are to be kept as a note.</summary>
    public bool KeepsUnknownWords { get; init; }

    /// <summary>Reads the line.</summary>
    /// <param name="usual">The unit of a weight typed without one.</param>
    /// <param name="localTime">The clinic's wall clock.</param>
    /// <exception cref="RefusedException">A field cannot be read; every problem names its field.</exception>
    public TakenReadings Read(WeightUnit usual, DateTime localTime)
    {
        var weight = CalledInWeight.Read(Weight, usual, nameof(Weight), out var weightProblem);
        var pressure = CalledInPressure.Read(Pressure, nameof(Pressure), out var pressureProblem);
        var pulse = ReadPulse(out var pulseProblem);
        var told = CalledInSymptoms.Read(Symptoms);
        List<Problem> problems = [.. new[] { weightProblem, pressureProblem, pulseProblem }.OfType<Problem>(), .. SymptomProblems(told)];
        return problems.Count > 0 ? throw new RefusedException(problems) : new TakenReadings
        {
            LocalTime = localTime,
            Weight = weight?.Weight,
            WeightAsTyped = weight?.Typed,
            SystolicPressure = pressure?.Systolic,
            DiastolicPressure = pressure?.Diastolic,
            HeartRate = pulse,
            Symptoms = told.Symptoms,
            AskedForSymptoms = told.AskedNone,
            Note = told.Unknown.Count == 0 ? null : string.Join(", ", told.Unknown),
        };
    }

    private int? ReadPulse(out Problem? problem)
    {
        var text = Pulse.Trim();
        problem = null;
        if (text.Length == 0)
        {
            return null;
        }

        if (text.Length <= 3 && int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var beats))
        {
            return beats;
        }

        problem = new(nameof(Pulse), $"“{text}” is not a pulse this line can read.", "Type beats per minute as a whole number, such as 88.");
        return null;
    }

    private IEnumerable<Problem> SymptomProblems(CalledInSymptoms told)
    {
        if (told.AskedNone && told.Symptoms != Clinical.Values.Symptoms.None)
        {
            yield return new(nameof(Symptoms), "Both no symptoms and a symptom were typed.", "Leave one of them out.");
        }

        foreach (var word in told.Unclear)
        {
            yield return new(nameof(Symptoms), $"“{word}” could mean several symptoms.", "Say which: breathless at rest, breathless on exertion, breathless lying flat, ankles swollen, abdomen swollen, chest pain.");
        }

        if (told.Unknown.Count == 0)
        {
            yield break;
        }

        var words = string.Join(", ", told.Unknown.Select(word => $"“{word}”"));
        if (told.Symptoms == Clinical.Values.Symptoms.None)
        {
            yield return new(nameof(Symptoms), $"{words} is not in the list of symptoms, so it cannot stand alone.",
                $"Type a listed one beside it ({string.Join(", ", SymptomWords.All.Select(entry => entry.Words))}), or write it down as a call.");
        }
        else if (!KeepsUnknownWords)
        {
            yield return new(nameof(Symptoms), $"{words} is not in the list of symptoms.", "Keep it as a note, or type a listed word.");
        }
    }
}
