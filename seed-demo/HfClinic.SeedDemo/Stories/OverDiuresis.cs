using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A diuretic raised nine days ago, and now too dry: the weight falls, the pressure is low, the patient is dizzy.</summary>
internal static class OverDiuresis
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Shoal",
        GivenName = "Winifred",
        Sex = Sex.Female,
        Kilograms = 68,
        Extra = day => -0.4 * Math.Max(0, day + 8),
        Systolic = 112,
        SystolicShift = day => day >= -4 ? -28 : 0,
        Moments =
        [
            Then.Dose(-9, new(11, 15), "furosemide", 80, 2, "Oedema to the knee at the visit"),
            .. Then.LookDaily(-2, -1),
            Then.Tells(-1, new(17, 40), Symptoms.Dizziness, "Dizzy when she gets up; had to sit down in the kitchen."),
        ],
    };
}
