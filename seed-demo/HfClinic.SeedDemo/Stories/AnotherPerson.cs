using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Two people share a scale; yesterday her weight came in under his name.</summary>
internal static class AnotherPerson
{
    private const string Household = "quay cottage";

    public static Story Story { get; } = new()
    {
        FamilyName = "Quay",
        GivenName = "Martin",
        Sex = Sex.Male,
        Kilograms = 94,
        Household = Household,
        OthersOnScale = [Weight.FromKilograms(63.5m)],
        Entries = Entered.On(-1, 63.4m),
        Moments = [Then.Look(-1)],
    };

    /// <summary>She weighs herself as ever.</summary>
    public static Story OtherPerson { get; } = new()
    {
        FamilyName = "Quay",
        GivenName = "Greta",
        Sex = Sex.Female,
        Kilograms = 63.5,
        Household = Household,
        OthersOnScale = [Weight.FromKilograms(94)],
    };
}
