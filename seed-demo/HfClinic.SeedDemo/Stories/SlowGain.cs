using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A third of a kilogram a day for ten days: no single day stands out, the week does.</summary>
internal static class SlowGain
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Thrift",
        GivenName = "Edmund",
        Sex = Sex.Male,
        Kilograms = 84,
        Extra = day => 0.38 * Math.Max(0, day + 10),
        Moments = [.. Then.LookDaily(-4, -1), Then.SeeFlags(-1, new(9, 5))],
    };
}
