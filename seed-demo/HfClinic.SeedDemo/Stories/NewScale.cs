using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A new scale: five kilograms more than the old one, and again the next morning. A true gain would look the same.</summary>
internal static class NewScale
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Kelp",
        GivenName = "Anders",
        Sex = Sex.Male,
        Kilograms = 88,
        Extra = day => day >= -1 ? 5.2 : 0,
        Moments =
        [
            Then.Look(-1),
            Then.Call(-1, new(16, 0), ContactOutcome.LeftMessage, "Five kilograms more overnight. Asked to weigh again in the morning and to call."),
        ],
    };
}
