using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Gained one or two weeks ago, were spoken with on the same morning, and the weight came down again.</summary>
internal static class SettledTheSameDay
{
    public static ImmutableArray<Story> Stories { get; } =
    [
        Of("Dune", "Selma", Sex.Female, 68, -18, "Two salty meals; takes what the diuretic plan says for three days."),
        Of("Reed", "Oskar", Sex.Male, 91, -16, "Had left out the diuretic on a journey; takes it again."),
        Of("Strand", "Beatrix", Sex.Female, 74, -14, "Drank more in the heat; well otherwise. Weighs on daily."),
        Of("Cairn", "Duncan", Sex.Male, 84, -13, "A cold, and soup for days; no breathlessness. Weighs on daily."),
        Of("Marsh", "Ingrid", Sex.Female, 79, -11, "Tablets had run out at the weekend; has a new supply."),
        Of("Skerry", "Magnus", Sex.Male, 97, -9, "Birthday meals; ankles as ever. Follows the diuretic plan."),
    ];

    private static Story Of(string family, string given, Sex sex, double kilograms, int day, string note) => new()
    {
        FamilyName = family,
        GivenName = given,
        Sex = sex,
        Kilograms = kilograms,
        Extra = on => (on - day) switch { -1 => 1.2, 0 => 2.7, 1 => 1.9, 2 => 1.0, 3 => 0.4, _ => 0 },
        Moments = [Then.Look(day), Then.CallAndSettle(day, new(9, 50), note)],
    };
}
