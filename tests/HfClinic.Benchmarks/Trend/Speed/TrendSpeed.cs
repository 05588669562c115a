using System.Collections.Immutable;
using System.Diagnostics;
using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using MathNet.Numerics.Distributions;

namespace HfClinic.Benchmarks.Trend;

/// <summary>How fast the trend is, against the same filters on general matrices, in one run. Medians, with the fastest run beside them.</summary>
internal static class TrendSpeed
{
    private const int Repeats = 7;
    private const int Readings = 200_000;
    private const int PatientDays = 90;
    private const int Patients = 100_000;
    private static readonly Weight Reference = new(80_000);
    private static readonly TrendModel Model = TrendModel.For(Reference);

    /// <summary>Prints the measures. Takes no arguments.</summary>
    public static void Run(string[] args)
    {
        ArgumentOutOfRangeException.ThrowIfNotEqual(args.Length, 0);
        var grams = Series(Readings);
        Line($"largest difference between the two forms over {Readings:N0} readings: {LargestDifference(grams):0.0e+0}");
        List<double> own = [];
        List<double> matrices = [];
        for (int repeat = 0; repeat <= Repeats; repeat++)
        {
            double ownTime = Nanoseconds(() => OwnForm(grams)) / Readings;
            double matrixTime = Nanoseconds(() => MatrixForm(grams)) / Readings;
            if (repeat > 0)
            {
                own.Add(ownTime);
                matrices.Add(matrixTime);
            }
        }

        Line($"filter + slope + cumulative sums + personal scale: {Median(own):0} ns per reading (fastest {own.Min():0})");
        Line($"the same on MathNet.Numerics matrices: {Median(matrices):0} ns per reading (fastest {matrices.Min():0}), {Median(matrices) / Median(own):0.0} times as long");
        Line($"allocated per reading: {(double)Allocated(() => OwnForm(grams)) / Readings:0.000} bytes (matrices: {(double)Allocated(() => MatrixForm(grams)) / Readings:0})");
        TenYears();
        EveryPatient();
    }

    private static void TenYears()
    {
        var first = new DateOnly(2016, 1, 1);
        ImmutableArray<DayWeight> series = [.. Series(3_653).Select((grams, day) => new DayWeight(first.AddDays(day), grams!.Value))];
        ImmutableArray<TargetWeight> targets = [new(1, first, Reference, "speed")];
        var through = series[^1].Day;
        WeightTrend.Of(series, targets, [], through);
        var times = Enumerable.Range(0, Repeats).Select(_ => Nanoseconds(() => WeightTrend.Of(series, targets, [], through)) / 1e6).ToList();
        Line($"ten years of one patient (3,653 days, result kept): {Median(times):0.00} ms (fastest {times.Min():0.00})");
    }

    private static void EveryPatient()
    {
        var pool = Series(PatientDays + 1_000);
        var output = new TrendDay[PatientDays];
        double sum = 0;
        var times = Enumerable.Range(0, 3).Select(_ => Nanoseconds(() =>
        {
            for (int patient = 0; patient < Patients; patient++)
            {
                var model = TrendModel.For(Reference);
                var state = TrendState.Start(model);
                TrendReplay.Run(model, ref state, pool.AsSpan(patient % 1_000, PatientDays), 80, output);
                sum += output[^1].FluidScore;
            }
        }) / 1e9).ToList();
        Line($"{Patients:N0} patients x {PatientDays} days, one thread: {Median(times):0.00} s (fastest {times.Min():0.00}; check sum {sum / 3:0.000})");
    }

    private static double OwnForm(int?[] grams)
    {
        var state = TrendState.Start(Model);
        double last = 0;
        foreach (int? weighed in grams)
        {
            last = state.Advance(Model, weighed, 80).FluidScore;
        }

        return last;
    }

    private static double MatrixForm(int?[] grams)
    {
        var trend = new MatrixTrend(Model);
        double last = 0;
        foreach (int? weighed in grams)
        {
            last = trend.Advance(weighed!.Value / 1000.0, 80).FluidScore;
        }

        return last;
    }

    private static double LargestDifference(int?[] grams)
    {
        var state = TrendState.Start(Model);
        var matrices = new MatrixTrend(Model);
        double largest = 0;
        foreach (int? weighed in grams)
        {
            var day = state.Advance(Model, weighed, 80);
            var (score, excess, slope, up) = matrices.Advance(weighed!.Value / 1000.0, 80);
            largest = Math.Max(largest, Math.Abs(day.FluidScore - score));
            largest = Math.Max(largest, Math.Abs(day.Excess!.Value - excess));
            largest = Math.Max(largest, Math.Abs(day.Trend.Slope - slope));
            largest = Math.Max(largest, Math.Abs(day.Cusum.Up - up));
        }

        return largest;
    }

    /// <summary>A reading each day; none so far off that it would count as a step.</summary>
    private static int?[] Series(int days)
    {
        var random = new Random(20260301);
        double fluid = 0;
        return [.. Enumerable.Range(0, days).Select(_ =>
        {
            fluid = (0.85 * fluid) + Normal.Sample(random, 0, 0.35);
            return (int?)(80_000 + (int)(1000 * (fluid + Math.Clamp(Normal.Sample(random, 0, 0.4), -1, 1))));
        })];
    }

    private static double Nanoseconds(Action measured)
    {
        long start = Stopwatch.GetTimestamp();
        measured();
        return Stopwatch.GetElapsedTime(start).TotalNanoseconds;
    }

    private static long Allocated(Func<double> measured)
    {
        long before = GC.GetAllocatedBytesForCurrentThread();
        measured();
        return GC.GetAllocatedBytesForCurrentThread() - before;
    }

    private static double Median(List<double> values) => values.Order().ElementAt(values.Count / 2);

    private static void Line(FormattableString text) => Console.WriteLine(text.ToString(CultureInfo.InvariantCulture));
}
