using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Nearly three kilograms in two days, with swollen ankles.</summary>
internal static class SuddenGain
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Samphire",
        GivenName = "Rhoda",
        Sex = Sex.Female,
        Kilograms = 71,
        Extra = day => day switch { -1 => 1.4, 0 => 2.9, _ => 0 },
        Moments = [Then.Tells(-1, new(18, 30), Symptoms.AnkleSwelling, "Shoes do not fit since the morning.")],
    };
}
