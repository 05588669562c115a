using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A small person for whom the cardiologist set a lower limit of her own.</summary>
internal static class OwnLimit
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Wren",
        GivenName = "Tilda",
        Sex = Sex.Female,
        Kilograms = 49,
        Extra = day => day switch { -1 => 0.8, 0 => 1.7, _ => 0 },
        Moments =
        [
            Then.OwnThreshold(-20, new(14, 45), "weight.gain-3-days", 1200, "Weighs under 50 kg: 2 kg in 3 days would be late for her"),
        ],
    };
}
