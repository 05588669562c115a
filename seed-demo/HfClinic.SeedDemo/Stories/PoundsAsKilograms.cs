using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>The scale was switched to pounds; the number came in as kilograms.</summary>
internal static class PoundsAsKilograms
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Rill",
        GivenName = "Noreen",
        Sex = Sex.Female,
        Kilograms = 79,
        Entries = Entered.On(0, 174.4m),
    };
}
