using System.Collections.Frozen;
using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;

namespace HfClinic.Records.DailyWeights;

/// <summary>Symptoms as they are typed during a call: "ankles, dizzy".</summary>
/// <param name="AskedNone">The person was asked and told of none: "none", "no symptoms".</param>
/// <param name="Unknown">Words that stand for no listed symptom, as typed.</param>
/// <param name="Unclear">Words that could mean several symptoms, as typed: nothing is guessed.</param>
public sealed record CalledInSymptoms(Symptoms Symptoms, bool AskedNone, IReadOnlyList<string> Unknown, IReadOnlyList<string> Unclear)
{
    private static readonly FrozenDictionary<string, Symptoms> Known = new Dictionary<string, Symptoms>
    {
        ["angina"] = Symptoms.ChestPain,
        ["faint"] = Symptoms.Syncope,
        ["fainting"] = Symptoms.Syncope,
        ["passed out"] = Symptoms.Syncope,
        ["blackout"] = Symptoms.Syncope,
        ["syncope"] = Symptoms.Syncope,
        ["breathless resting"] = Symptoms.BreathlessAtRest,
        ["sob at rest"] = Symptoms.BreathlessAtRest,
        ["short of breath at rest"] = Symptoms.BreathlessAtRest,
        ["at rest"] = Symptoms.BreathlessAtRest,
        ["orthopnoea"] = Symptoms.Orthopnoea,
        ["orthopnea"] = Symptoms.Orthopnoea,
        ["sleeps in a chair"] = Symptoms.Orthopnoea,
        ["sleeps upright"] = Symptoms.Orthopnoea,
        ["more pillows"] = Symptoms.Orthopnoea,
        ["pillows"] = Symptoms.Orthopnoea,
        ["woken"] = Symptoms.NightBreathlessness,
        ["woken at night"] = Symptoms.NightBreathlessness,
        ["pnd"] = Symptoms.NightBreathlessness,
        ["breathless at night"] = Symptoms.NightBreathlessness,
        ["exertion"] = Symptoms.BreathlessOnExertion,
        ["stairs"] = Symptoms.BreathlessOnExertion,
        ["breathless on stairs"] = Symptoms.BreathlessOnExertion,
        ["breathless walking"] = Symptoms.BreathlessOnExertion,
        ["short of breath on exertion"] = Symptoms.BreathlessOnExertion,
        ["ankle"] = Symptoms.AnkleSwelling,
        ["ankles"] = Symptoms.AnkleSwelling,
        ["swollen ankles"] = Symptoms.AnkleSwelling,
        ["ankle swelling"] = Symptoms.AnkleSwelling,
        ["leg swelling"] = Symptoms.AnkleSwelling,
        ["legs swollen"] = Symptoms.AnkleSwelling,
        ["swollen legs"] = Symptoms.AnkleSwelling,
        ["swollen feet"] = Symptoms.AnkleSwelling,
        ["oedema"] = Symptoms.AnkleSwelling,
        ["edema"] = Symptoms.AnkleSwelling,
        ["belly swollen"] = Symptoms.AbdominalSwelling,
        ["swollen belly"] = Symptoms.AbdominalSwelling,
        ["bloated"] = Symptoms.AbdominalSwelling,
        ["dizziness"] = Symptoms.Dizziness,
        ["lightheaded"] = Symptoms.Dizziness,
        ["light headed"] = Symptoms.Dizziness,
        ["giddy"] = Symptoms.Dizziness,
        ["palpitation"] = Symptoms.Palpitations,
        ["racing heart"] = Symptoms.Palpitations,
        ["appetite"] = Symptoms.PoorAppetite,
        ["not eating"] = Symptoms.PoorAppetite,
        ["no appetite"] = Symptoms.PoorAppetite,
        ["feels sick"] = Symptoms.Nausea,
        ["nauseous"] = Symptoms.Nausea,
        ["vomiting"] = Symptoms.Nausea,
        ["fatigue"] = Symptoms.Fatigue,
        ["tiredness"] = Symptoms.Fatigue,
        ["exhausted"] = Symptoms.Fatigue,
        ["coughing"] = Symptoms.Cough,
    }.Concat(SymptomWords.All.Select(entry => KeyValuePair.Create(entry.Words, entry.Symptom))).ToFrozenDictionary(StringComparer.Ordinal);

    private static readonly FrozenSet<string> SeveralMeanings = new[] { "breathless", "breathlessness", "sob", "short of breath", "breath", "swelling", "swollen", "pain", "chest", "rest", "night", "legs", "feet", "belly", "abdomen" }
        .ToFrozenSet(StringComparer.Ordinal);

    private static readonly FrozenSet<string> NoneTold = new[] { "none", "no", "no symptoms", "nil", "well", "feels well" }.ToFrozenSet(StringComparer.Ordinal);

    /// <summary>Whether nothing was typed.</summary>
    public bool IsEmpty => Symptoms == Symptoms.None && !AskedNone && Unknown.Count == 0 && Unclear.Count == 0;

    /// <summary>Reads what was typed: words apart by commas, semicolons, "and" or "+".</summary>
    public static CalledInSymptoms Read(string typed)
    {
        var (symptoms, none) = (Symptoms.None, false);
        List<string> unknown = [], unclear = [];
        foreach (var part in typed.Replace(" and ", ",", StringComparison.OrdinalIgnoreCase).Split([',', ';', '+', '\n'], StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
        {
            var word = SearchFolding.Fold(part);
            if (Known.TryGetValue(word, out var symptom))
            {
                symptoms |= symptom;
            }
            else if (NoneTold.Contains(word))
            {
                none = true;
            }
            else
            {
                (SeveralMeanings.Contains(word) ? unclear : unknown).Add(part);
            }
        }

        return new(symptoms, none, unknown, unclear);
    }
}
