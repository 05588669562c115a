namespace HfClinic.Clinical.Values;

/// <summary>Symptoms as told by the patient on one day. Several may be told at once.</summary>
[Flags]
public enum Symptoms
{
    None = 0,
    BreathlessAtRest = 1,
    BreathlessOnExertion = 2,

    /// <summary>Breathless lying flat: new orthopnoea, sleeping upright or in a chair.</summary>
    Orthopnoea = 4,

    /// <summary>Waking at night short of breath (paroxysmal nocturnal dyspnoea).</summary>
    NightBreathlessness = 8,
    AnkleSwelling = 16,
    AbdominalSwelling = 32,
    Dizziness = 64,
    Syncope = 128,
    Fatigue = 256,
    Palpitations = 512,
    ChestPain = 1024,
    PoorAppetite = 2048,
    Nausea = 4096,
    Cough = 8192,
}
