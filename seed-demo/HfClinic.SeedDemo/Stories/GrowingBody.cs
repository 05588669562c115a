using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Eats well and grows by half a kilogram a month while the target weight stays where it was set five months ago.</summary>
internal static class GrowingBody
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Mellow",
        GivenName = "Hugo",
        Sex = Sex.Male,
        Kilograms = 78,
        TargetDay = -150,
        TargetAbove = 0.4,
        Extra = day => 0.02 * (day + 179),
    };
}
