using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>The nurse put the flag off with a reason: a visit is due in a few days.</summary>
internal static class PutOffUntilVisit
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Pier",
        GivenName = "Basil",
        Sex = Sex.Male,
        Kilograms = 83,
        TargetAbove = 1.8,
        Extra = day => 0.36 * Math.Clamp(day + 11, 0, 8),
        Moments =
        [
            .. Then.LookDaily(-3, -2),
            Then.PutOff(-2, new(9, 50), "volume.gain-7-days", 5, "No symptoms on the phone; seen at the clinic in a few days."),
            Then.PutOff(-2, new(9, 51), "volume.fluid-gain", 5, "No symptoms on the phone; seen at the clinic in a few days."),
            Then.Look(-1),
        ],
    };
}
