namespace HfClinic.Clinical.Weights;

/// <summary>How the day's weight was taken in.</summary>
public enum DayUse
{
    /// <summary>No accepted weight: the trend was only carried on.</summary>
    None = 0,

    /// <summary>An ordinary reading.</summary>
    Reading = 1,

    /// <summary>An accepted weight far from the expectation: the whole step counts as fluid.</summary>
    Step = 2,
}

/// <summary>The trend at the end of one clinic day.</summary>
public readonly record struct TrendDay
{
    /// <summary>Two-sided 95% point of the normal distribution.</summary>
    private const double Wide = 1.959963984540054;

    public required DayUse Use { get; init; }

    /// <summary>The reading expected before the day's weight was seen, kg.</summary>
    public required double Expected { get; init; }

    /// <summary>Variance of the expected reading, weighing noise included, kg².</summary>
    public required double ExpectedVariance { get; init; }

    /// <summary>z: the reading's distance from expectation in standard deviations; null unless there was an ordinary reading.</summary>
    public required double? Score { get; init; }

    /// <summary>Body mass, drift and fluid.</summary>
    public required FluidFilter State { get; init; }

    public required SlopeFilter Trend { get; init; }

    /// <summary>c: the person's own scatter against the model, as used this day.</summary>
    public required double Scale { get; init; }

    /// <summary>zF: fluid against the person's own baseline in standard deviations of its usual coming and going.</summary>
    public required double FluidScore { get; init; }

    /// <summary>
    /// zG: the fluid score plus three tenths of the excess over target, the excess counted in standard deviations of fluid
    /// and no further than three either way; null without a target.
    /// </summary>
    /// <remarks>
    /// Two views of one gain: the fluid score forgets a slow gain, which the body mass takes up; the excess over target keeps
    /// it. Added, they tell a gain from scatter better than either with a limit of its own. The excess is cut off so that a
    /// target long out of date cannot alarm by itself. A choice of this program, found by simulation.
    /// </remarks>
    public required double? GainScore { get; init; }

    /// <summary>The cumulative sums as reached this day, before any restart.</summary>
    public required Cusum Cusum { get; init; }

    /// <summary>The target weight that holds this day, kg; null when none.</summary>
    public required double? Target { get; init; }

    /// <summary>Too few readings yet for the trend to be used; the plain thresholds stand alone.</summary>
    public required bool Learning { get; init; }

    /// <summary>E: weight without weighing noise minus target, kg; null without a target.</summary>
    public double? Excess => State.Expected - Target;

    /// <summary>Standard error of <see cref="Excess"/>, kg.</summary>
    public double ExcessError => Math.Sqrt(State.ExpectedVariance);

    /// <summary>Half the width of the 95% interval of the weight without weighing noise, and so of the excess, kg.</summary>
    public double Band => Wide * ExcessError;

    /// <summary>Standard error of the fluid part, kg.</summary>
    public double FluidError => Math.Sqrt(State.FluidVariance);

    /// <summary>Half the width of the 95% interval of the fluid part, kg.</summary>
    public double FluidBand => Wide * FluidError;

    /// <summary>Slope in kg per week with its 95% interval.</summary>
    public (double PerWeek, double Low, double High) WeeklySlope => (
        7 * Trend.Slope,
        7 * (Trend.Slope - (Wide * Trend.SlopeError)),
        7 * (Trend.Slope + (Wide * Trend.SlopeError)));

    /// <summary>Readings have kept coming in above expectation.</summary>
    public bool RisingAlarm => Use == DayUse.Reading && Cusum.Up > Cusum.Limit;

    /// <summary>Readings have kept coming in below expectation.</summary>
    public bool FallingAlarm => Use == DayUse.Reading && Cusum.Down > Cusum.Limit;
}
