using System.Collections.Immutable;
using HfClinic.SeedDemo.History;
using HfClinic.SeedDemo.Persons;

namespace HfClinic.SeedDemo;

/// <summary>Everything invented about one patient, before it goes into the record. Days count back from the last morning.</summary>
internal sealed record DemoPatient
{
    public required Person Person { get; init; }

    public int EnrolledDay { get; init; } = -200;

    public int? DischargedDay { get; init; }

    public string? Household { get; init; }

    public string? Note { get; init; }

    public bool WeighsAtHome { get; init; } = true;

    public int? LeftDay { get; init; }

    public ImmutableArray<Measured> Readings { get; init; } = [];

    public ImmutableArray<Told> Symptoms { get; init; } = [];

    public ImmutableArray<Target> Targets { get; init; } = [];

    public ImmutableArray<Course> Courses { get; init; } = [];

    public ImmutableArray<Tested> Tests { get; init; } = [];

    public ImmutableArray<Fraction> Fractions { get; init; } = [];

    public ImmutableArray<Seen> Visits { get; init; } = [];

    public ImmutableArray<Called> Calls { get; init; } = [];
}
