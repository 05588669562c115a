using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Entries that are not the person's weight.</summary>
internal static class Entered
{
    public static ImmutableDictionary<int, Weight> On(int day, decimal kilograms) =>
        ImmutableDictionary<int, Weight>.Empty.Add(day, Weight.FromKilograms(kilograms));
}
