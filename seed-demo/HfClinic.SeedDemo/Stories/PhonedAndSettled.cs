using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Gained, was spoken with three days ago, took what was agreed, and the weight comes down again.</summary>
internal static class PhonedAndSettled
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Ferry",
        GivenName = "Joan",
        Sex = Sex.Female,
        Kilograms = 80,
        Extra = day => day switch { -4 => 2.5, -3 => 2.4, -2 => 2.1, -1 => 1.5, 0 => 1.0, _ => 0 },
        Moments =
        [
            .. Then.LookDaily(-4, -3),
            Then.CallAndSettle(-3, new(10, 40), "Salty meal at a wedding; no breathlessness. Follows her own diuretic plan for two days and weighs on."),
            .. Then.LookDaily(-2, -1),
        ],
    };
}
