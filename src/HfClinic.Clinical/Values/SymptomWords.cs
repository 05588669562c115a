using System.Collections.Immutable;

namespace HfClinic.Clinical.Values;

/// <summary>Symptoms in the words of the clinic, gravest first.</summary>
public static class SymptomWords
{
    /// <summary>Each symptom with its words, in the order in which a list of them is written.</summary>
    public static readonly ImmutableArray<(Symptoms Symptom, string Words)> All =
    [
        (Symptoms.ChestPain, "chest pain"),
        (Symptoms.Syncope, "fainted"),
        (Symptoms.BreathlessAtRest, "breathless at rest"),
        (Symptoms.Orthopnoea, "breathless lying flat"),
        (Symptoms.NightBreathlessness, "woken at night short of breath"),
        (Symptoms.BreathlessOnExertion, "breathless on exertion"),
        (Symptoms.AnkleSwelling, "ankles swollen"),
        (Symptoms.AbdominalSwelling, "abdomen swollen"),
        (Symptoms.Dizziness, "dizzy"),
        (Symptoms.Palpitations, "palpitations"),
        (Symptoms.PoorAppetite, "poor appetite"),
        (Symptoms.Nausea, "nausea"),
        (Symptoms.Fatigue, "tired"),
        (Symptoms.Cough, "cough"),
    ];

    /// <summary>The symptoms contained, one by one.</summary>
    public static IEnumerable<Symptoms> Each(Symptoms symptoms) =>
        All.Select(entry => entry.Symptom).Where(symptom => symptoms.HasFlag(symptom));

    /// <summary>As in a sentence: "breathless at rest, ankles swollen and dizzy"; empty for none.</summary>
    public static string List(Symptoms symptoms) =>
        Wording.List([.. All.Where(entry => symptoms.HasFlag(entry.Symptom)).Select(entry => entry.Words)]);
}
