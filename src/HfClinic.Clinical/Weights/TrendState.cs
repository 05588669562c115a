using System.Numerics;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// Everything the trend carries from one day to the next. A value: a copy taken on any day can be gone on from later,
/// and gives what a replay from the first day gives.
/// </summary>
public struct TrendState
{
    /// <summary>The days within which <see cref="LearningReadings"/> accepted readings end the learning.</summary>
    public const int LearningDays = 14;

    /// <summary>How many accepted readings within <see cref="LearningDays"/> end the learning.</summary>
    public const int LearningReadings = 7;

    private FluidFilter fluid;
    private SlopeFilter slope;
    private Cusum cusum;
    private PersonalScale scale;
    private uint daysWithReading;
    private bool learnt;
    private bool dayBegun;

    private TrendState(TrendModel model)
    {
        fluid = FluidFilter.Start(model);
        slope = SlopeFilter.Start(model.ReferenceKilograms);
        dayBegun = true;
    }

    /// <summary>Before the first day.</summary>
    public static TrendState Start(TrendModel model) => new(model);

    /// <summary>
    /// Begins the next day at a baseline set by a person (discharge, dialysis, drained ascites, another scale).
    /// The person's own scatter is kept; mass, drift, fluid, slope and cumulative sums start again.
    /// </summary>
    public void Rebase(TrendModel model, Weight baseline)
    {
        fluid = FluidFilter.Baseline(model, baseline.Grams / 1000.0);
        slope = SlopeFilter.Start(baseline.Grams / 1000.0);
        cusum = default;
        dayBegun = true;
    }

    /// <summary>Goes one day on.</summary>
    /// <param name="grams">The day's accepted weight in grams, or null.</param>
    /// <param name="target">The target weight in kg that holds that day, or null. It moves the excess and nothing else.</param>
    public TrendDay Advance(TrendModel model, int? grams, double? target)
    {
        if (!dayBegun)
        {
            fluid = fluid.NextDay(model);
            slope = slope.NextDay(model.Slope);
        }

        dayBegun = false;
        double expected = fluid.Expected;
        double variance = fluid.ExpectedVariance + model.ReadingVariance;
        double used = scale.Value;
        var (use, score) = grams is int weighed ? Take(model, weighed / 1000.0, used) : (DayUse.None, double.NaN);
        NoteReading(grams is not null);
        double fluidScore = fluid.Fluid / (used * model.UsualFluid(fluid.FluidVariance));
        var day = new TrendDay
        {
            Use = use,
            Expected = expected,
            ExpectedVariance = variance,
            Score = use == DayUse.Reading ? score : null,
            State = fluid,
            Trend = slope,
            Scale = used,
            FluidScore = fluidScore,
            GainScore = fluidScore + (0.3 * ClippedExcess(model, target)),
            Cusum = cusum,
            Target = target,
            Learning = !learnt,
        };
        if (model.CusumRestarts)
        {
            cusum = cusum.Restarted();
        }

        if (model.LearnsScale)
        {
            scale.EndDay(score);
        }

        return day;
    }

    private (DayUse Use, double Score) Take(TrendModel model, double kilograms, double used)
    {
        var innovation = fluid.Compare(model, kilograms);
        if (Math.Abs(innovation.Kilograms) > model.Gate(innovation.Variance))
        {
            fluid = fluid.TakeStep(model, kilograms);
            slope = slope.TakeStep(model.Slope, kilograms);
            return (DayUse.Step, double.NaN);
        }

        fluid = fluid.Take(model, innovation);
        slope = slope.Take(model.Slope, slope.Compare(model.Slope, kilograms));
        double score = innovation.Score;
        cusum = cusum.Add(Math.Clamp(score / used, -Cusum.LargestScore, Cusum.LargestScore));
        return (DayUse.Reading, score);
    }

    /// <summary>Excess over target in standard deviations of fluid, at most three either way.</summary>
    private readonly double? ClippedExcess(TrendModel model, double? target) => target is double kilograms
        ? Math.Clamp((fluid.Expected - kilograms) / Math.Sqrt(model.FluidVariance), -3, 3)
        : null;

    private void NoteReading(bool present)
    {
        daysWithReading = ((daysWithReading << 1) | (present ? 1u : 0u)) & ((1u << LearningDays) - 1);
        learnt |= BitOperations.PopCount(daysWithReading) >= LearningReadings;
    }
}
