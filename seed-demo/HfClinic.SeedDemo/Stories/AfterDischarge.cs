using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Home from hospital for twelve days with a new target weight, and gaining again.</summary>
internal static class AfterDischarge
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Harbour",
        GivenName = "Stella",
        Sex = Sex.Female,
        Kilograms = 73,
        Weighs = day => day is < -17 or > -12,
        Extra = day => day switch { < -17 => 1.6, -1 => 1.1, 0 => 2.4, _ => 0 },
        Moments =
        [
            Then.DischargeNoted(-11, new(13, 0)),
            Then.TargetWeight(-11, new(13, 30), 73, "Weight at discharge, no oedema"),
            Then.Look(-1),
        ],
    };
}
