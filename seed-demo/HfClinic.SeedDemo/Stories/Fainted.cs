using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Fainted: may be an emergency, whatever the weight does.</summary>
internal static class Fainted
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Squall",
        GivenName = "Ernest",
        Sex = Sex.Male,
        Kilograms = 82,
        Moments =
        [
            Then.Tells(-1, new(19, 20), Symptoms.Syncope, "Fainted in the garden; his wife called an ambulance, he was seen and sent home."),
        ],
    };
}
