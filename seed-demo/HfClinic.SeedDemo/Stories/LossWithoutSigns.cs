using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>
/// Loses weight without dizziness or low pressure. The name runs from right to left.
/// </summary>
internal static class LossWithoutSigns
{
    public static Story Story { get; } = new()
    {
        FamilyName = "נחשול",
        GivenName = "מירה",
        Sex = Sex.Female,
        Kilograms = 74,
        Systolic = 124,
        Extra = day => -0.42 * Math.Max(0, day + 7),
    };
}
