namespace HfClinic.Benchmarks.Trend;

/// <summary>
/// How home weights come about in the simulation. Kilograms are for a person of 80 kg and scale with weight.
/// Fluid, error and missing days are shaped after published home-weighing studies; entry errors are an assumption.
/// </summary>
internal sealed record WeightDataModel(string Name)
{
    /// <summary>Share of fluid gain still there a day later.</summary>
    public double FluidMemory { get; init; } = 0.9;

    /// <summary>Standard deviation of fluid, kg; differs between people.</summary>
    public double FluidSpread { get; init; } = 0.70;

    /// <summary>Standard deviation of one weighing, kg; differs between people.</summary>
    public double ErrorSpread { get; init; } = 0.40;

    /// <summary>Height of the weekly wave, kg.</summary>
    public double WeeklyWave { get; init; } = 0.14;

    /// <summary>Daily step of body mass, kg.</summary>
    public double MassStep { get; init; } = 0.03;

    /// <summary>Spread of the lasting drift of body mass between people, kg/day.</summary>
    public double DriftSpread { get; init; } = 0.010;

    /// <summary>Drift of everybody's body mass, kg/day, whatever the weight.</summary>
    public double CommonDrift { get; init; }

    /// <summary>Probability that a day is missed after a day with a reading: beta distributed between people.</summary>
    public (double A, double B) MissAfterReading { get; init; } = (2, 14);

    /// <summary>Probability that a day is missed after a missed day.</summary>
    public double MissAfterMiss { get; init; } = 0.55;

    /// <summary>How many times the usual share of entry errors (0.8% of readings).</summary>
    public double EntryErrors { get; init; } = 1;

    /// <summary>The default and seven models that depart from it in one thing.</summary>
    public static IReadOnlyList<WeightDataModel> All { get; } =
    [
        new("default model"),
        new("fluid memory 0.80") { FluidMemory = 0.80 },
        new("fluid memory 0.95") { FluidMemory = 0.95 },
        new("weighing error x1.5") { ErrorSpread = 0.60 },
        new("fluid spread x1.4") { FluidSpread = 1.0 },
        new("half the days missing") { MissAfterReading = (4, 6), MissAfterMiss = 0.6 },
        new("body mass +0.5 kg/month") { CommonDrift = 0.5 / 30.4 },
        new("entry errors x3") { EntryErrors = 3 },
    ];
}

/// <summary>What happens to the simulated person.</summary>
internal enum WeightEvent
{
    /// <summary>Nothing: every alert is false.</summary>
    Stable,

    /// <summary>Worsening heart failure on the event day, three in five with a weight gain before it.</summary>
    Decompensation,

    /// <summary>Too much fluid lost over the ten days before the event day.</summary>
    OverDiuresis,
}
