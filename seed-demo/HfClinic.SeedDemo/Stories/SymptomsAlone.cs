using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Breathless lying flat, at a weight that has not moved: the scale alone would not have shown it.</summary>
internal static class SymptomsAlone
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Mist",
        GivenName = "Leonora",
        Sex = Sex.Female,
        Kilograms = 66,
        Moments =
        [
            Then.Tells(-1, new(18, 50), Symptoms.Orthopnoea | Symptoms.NightBreathlessness, "Slept in the chair for two nights."),
        ],
    };
}
