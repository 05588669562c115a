using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>No weight for days; nobody knows why yet.</summary>
internal static class Silent
{
    public static ImmutableArray<Story> Stories { get; } =
    [
        Since(5, "Hush", "Ivor", Sex.Male, 81),
        Since(5, "Calm", "Beatrice", Sex.Female, 69),
        Since(6, "Quell", "Desmond", Sex.Male, 97),
        Since(7, "Whist", "Adela", Sex.Female, 58),
        Since(7, "Dormer", "Sigrid", Sex.Female, 77),
        Since(8, "Mute", "Clement", Sex.Male, 88),
        Since(9, "Still", "Marie", Sex.Female, 72, Then.Call(-2, new(14, 10), ContactOutcome.LeftMessage, "No weights for a week. Asked to call back.")),
        Since(13, "Latch", "Roderick", Sex.Male, 103, Then.Call(-6, new(10, 30), ContactOutcome.NoAnswer, "Rang at two times of day.")),
    ];

    private static Story Since(int days, string family, string given, Sex sex, double kilograms, params ImmutableArray<Moment> then) => new()
    {
        FamilyName = family,
        GivenName = given,
        Sex = sex,
        Kilograms = kilograms,
        Weighs = day => day <= -days,
        Moments = days == 5 ? then : [Then.Look(5 - days), .. then],
    };
}
