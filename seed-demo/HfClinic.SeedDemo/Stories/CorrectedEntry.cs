using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A number in pounds came in as kilograms ten days ago; the nurse corrected it, and the mistake stays visible.</summary>
internal static class CorrectedEntry
{
    private const decimal Typed = 187.4m;

    public static Story Story { get; } = new()
    {
        FamilyName = "Mender",
        GivenName = "Agatha",
        Sex = Sex.Female,
        Kilograms = 85,
        Entries = Entered.On(-10, Typed),
        Moments =
        [
            Then.Look(-10),
            Then.Correct(-10, new(9, 40), Weight.FromPounds(Typed), "187.4 lb", "She read the scale in pounds."),
        ],
    };
}
