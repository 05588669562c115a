using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Breathless on the stairs and swollen ankles, no change of weight.</summary>
internal static class SymptomsOnExertion
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Drizzle",
        GivenName = "Albert",
        Sex = Sex.Male,
        Kilograms = 91,
        Moments =
        [
            Then.Tells(-1, new(16, 15), Symptoms.BreathlessOnExertion | Symptoms.AnkleSwelling, "Stops once on the stairs since the weekend."),
        ],
    };
}
