using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A patient with something to find. Days count back from the last morning.</summary>
internal sealed record Story
{
    /// <summary>From this day on the story alone says when the person weighs.</summary>
    public const int Begins = -21;

    public required string FamilyName { get; init; }

    public required string GivenName { get; init; }

    public required Sex Sex { get; init; }

    /// <summary>Body mass without what the story adds.</summary>
    public required double Kilograms { get; init; }

    /// <summary>Kilograms the story adds to the weight of a day.</summary>
    public Func<int, double> Extra { get; init; } = _ => 0;

    /// <summary>Whether the person weighs on a day of the story.</summary>
    public Func<int, bool> Weighs { get; init; } = _ => true;

    /// <summary>Entries that are not the person's weight as the scale showed it, by day.</summary>
    public ImmutableDictionary<int, Weight> Entries { get; init; } = ImmutableDictionary<int, Weight>.Empty;

    /// <summary>People who share a scale carry the same word.</summary>
    public string? Household { get; init; }

    /// <summary>Weights of the others who use the same scale.</summary>
    public ImmutableArray<Weight> OthersOnScale { get; init; } = [];

    /// <summary>The day the target weight was set.</summary>
    public int TargetDay { get; init; } = -60;

    /// <summary>Kilograms of the target weight above <see cref="Kilograms"/>.</summary>
    public double TargetAbove { get; init; }

    public bool ScaleInPounds { get; init; }

    /// <summary>Usual systolic pressure, mmHg; drawn when null.</summary>
    public int? Systolic { get; init; }

    /// <summary>mmHg added to the systolic pressure of a day.</summary>
    public Func<int, int> SystolicShift { get; init; } = _ => 0;

    /// <summary>What people did, in order of time; from <see cref="Begins"/> on.</summary>
    public ImmutableArray<Moment> Moments { get; init; } = [];
}
