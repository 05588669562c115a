using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>The nurse has asked the prescribers; nobody has answered yet.</summary>
internal static class OpenQuestion
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Jetty",
        GivenName = "Miriam",
        Sex = Sex.Female,
        Kilograms = 77,
        TargetAbove = 1.2,
        Extra = day => day switch { -1 => 2.5, 0 => 2.7, _ => 0 },
        Moments =
        [
            Then.Look(-1),
            Then.SeeFlags(-1, new(8, 50)),
            Then.Ask(-1, new(11, 5), "volume.gain-3-days",
                "Up 2.5 kg since the day before. No breathlessness, ankles a little swollen. Takes furosemide 40 mg daily. How do you want to go on?"),
        ],
    };
}
