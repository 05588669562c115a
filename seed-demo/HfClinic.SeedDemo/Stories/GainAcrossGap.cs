using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>The scale was not used for four days, and over those days three kilograms came: the 3-day comparison cannot see it.</summary>
internal static class GainAcrossGap
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Ebb",
        GivenName = "Lorcan",
        Sex = Sex.Male,
        Kilograms = 92,
        Weighs = day => day is < -4 or 0,
        Extra = day => day == 0 ? 3.2 : 0,
    };
}
