using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Flagged two days ago and rung twice, but not reached.</summary>
internal static class NotReached
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Tide",
        GivenName = "Colm",
        Sex = Sex.Male,
        Kilograms = 86,
        Extra = day => day switch { -2 => 2.6, -1 => 2.4, 0 => 2.5, _ => 0 },
        Moments =
        [
            Then.Look(-2),
            Then.Call(-2, new(11, 0), ContactOutcome.NoAnswer, "Rang twice."),
            Then.Look(-1),
            Then.Call(-1, new(10, 20), ContactOutcome.LeftMessage, "Asked to call the clinic today."),
        ],
    };
}
