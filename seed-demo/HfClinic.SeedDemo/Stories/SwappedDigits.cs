using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Two digits changed places.</summary>
internal static class SwappedDigits
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Buoy",
        GivenName = "Norbert",
        Sex = Sex.Male,
        Kilograms = 87.4,
        Entries = Entered.On(0, 78.4m),
    };
}
