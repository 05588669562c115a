using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>The cardiologist answered yesterday; nobody has read the answer yet.</summary>
internal static class UnreadAnswer
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Sandbar",
        GivenName = "Cyril",
        Sex = Sex.Male,
        Kilograms = 90,
        TargetAbove = 1.6,
        Extra = day => 0.37 * Math.Clamp(day + 12, 0, 9),
        Moments =
        [
            .. Then.LookDaily(-4, -3),
            Then.Ask(-3, new(9, 30), "volume.gain-7-days", "Up 3 kg within ten days, sleeps flat, walks as before. Is the target weight still right?"),
            Then.Look(-2),
            Then.Answer(-1, new(15, 30), "I think some of it is fluid. I will see him this week; please ask for potassium and creatinine before."),
        ],
    };
}
