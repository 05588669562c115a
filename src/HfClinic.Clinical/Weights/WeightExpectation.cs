using System.Runtime.CompilerServices;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>The part of the trend that tells what the next weight should be, carried from weight to weight.</summary>
internal struct WeightExpectation(Weight? target)
{
    private const int LastCountsDays = 3;
    private FirstWeights first;
    private int count;
    private TrendModel? model;
    private FluidFilter filter;
    private DateOnly day;
    private double last;

    /// <summary>Takes in the weight of a day later than all before.</summary>
    public void Add(DayWeight weight)
    {
        if (count < FirstWeights.Length)
        {
            first[count++] = weight;
            if (target is null || count == 1)
            {
                Restart();
                return;
            }
        }

        Follow(weight);
    }

    /// <summary>The reading expected on a day not before the last weight, or null when there is nothing to go by.</summary>
    public readonly ExpectedReading? On(DateOnly wanted)
    {
        if (count > 0)
        {
            return Expect(model!, At(wanted), wanted.DayNumber - day.DayNumber <= LastCountsDays ? last : null);
        }

        return target is Weight set ? Expect(TrendModel.For(set), FluidFilter.Start(TrendModel.For(set)), last: null) : null;
    }

    private static ExpectedReading Expect(TrendModel model, in FluidFilter filter, double? last)
    {
        double variance = filter.ExpectedVariance + model.ReadingVariance;
        return new ExpectedReading(filter.Expected, variance, model.Gate(variance), last, model.SmallestGate);
    }

    /// <summary>The reference weight of a person without a target is known better with each of the first three weights.</summary>
    private void Restart()
    {
        ReadOnlySpan<DayWeight> known = first[..count];
        model = TrendModel.For(WeightTrend.Reference(known, target));
        filter = FluidFilter.Start(model);
        day = known[0].Day;
        foreach (var weight in known)
        {
            Follow(weight);
        }
    }

    private void Follow(DayWeight weight)
    {
        filter = At(weight.Day);
        day = weight.Day;
        double kilograms = weight.Grams / 1000.0;
        last = kilograms;
        var reading = filter.Compare(model!, kilograms);
        filter = Math.Abs(reading.Kilograms) > model!.Gate(reading.Variance)
            ? filter.TakeStep(model, kilograms)
            : filter.Take(model, reading);
    }

    private readonly FluidFilter At(DateOnly wanted)
    {
        var reached = filter;
        for (int behind = wanted.DayNumber - day.DayNumber; behind > 0; behind--)
        {
            reached = reached.NextDay(model!);
        }

        return reached;
    }

    [InlineArray(Length)]
    private struct FirstWeights
    {
        public const int Length = 3;
        private DayWeight element;
    }
}
