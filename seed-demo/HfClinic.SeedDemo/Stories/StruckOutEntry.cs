using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A visitor's weight came in six days ago and was struck out.</summary>
internal static class StruckOutEntry
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Visitor-Holm",
        GivenName = "Ruben",
        Sex = Sex.Male,
        Kilograms = 99,
        Entries = Entered.On(-6, 71.3m),
        Moments =
        [
            Then.Look(-6),
            Then.StrikeOut(-6, new(11, 25), "His grandson stood on the scale."),
        ],
    };
}
