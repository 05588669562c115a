using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Gained for a week and wakes at night short of breath.</summary>
internal static class NightBreathlessness
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Swell",
        GivenName = "Ottilie",
        Sex = Sex.Female,
        Kilograms = 85,
        Extra = day => 0.4 * Math.Max(0, day + 7),
        Moments =
        [
            Then.Look(-1),
            Then.Tells(-1, new(18, 5), Symptoms.NightBreathlessness | Symptoms.Fatigue, "Woke twice and sat at the window."),
        ],
    };
}
