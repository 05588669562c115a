using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Persons;

/// <summary>An invented person: what does not change from day to day.</summary>
internal sealed record Person
{
    public required string FamilyName { get; init; }

    public required string GivenName { get; init; }

    public required Sex Sex { get; init; }

    /// <summary>Days before the last morning at which the person was born.</summary>
    public required int BornDaysAgo { get; init; }

    public required int HeightCentimetres { get; init; }

    /// <summary>Body mass at the beginning of the weights from home.</summary>
    public required double Kilograms { get; init; }

    /// <summary>The scale at home shows pounds.</summary>
    public bool ScaleInPounds { get; init; }

    public bool HasOximeter { get; init; }

    public bool MeasuresInTheEvening { get; init; }

    /// <summary>Usual minute of the day at which the person weighs.</summary>
    public required int WeighsAtMinute { get; init; }

    public required int Systolic { get; init; }

    public required int Pulse { get; init; }

    public required bool HasAtrialFibrillation { get; init; }

    public required decimal EjectionFraction { get; init; }
}
