using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Silent for three days only, but the diuretic was changed last week.</summary>
internal static class SilentUnderCloseWatch
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Lull",
        GivenName = "Prudence",
        Sex = Sex.Female,
        Kilograms = 75,
        Weighs = day => day <= -3,
        Moments = [Then.Dose(-8, new(12, 5), "furosemide", 40, 2, "Breathless on stairs, ankles swollen")],
    };
}
