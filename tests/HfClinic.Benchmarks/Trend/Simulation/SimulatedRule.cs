using HfClinic.Clinical.Weights;

namespace HfClinic.Benchmarks.Trend;

/// <summary>A rule under trial: whether it alerts on a day, given that day and those before it.</summary>
internal sealed record SimulatedRule(string Name, Func<SimulatedDay[], int, double, bool> Alerts)
{
    private const int TwoPounds = 907;
    private const int ThreePounds = 1_361;
    private const int FivePounds = 2_268;

    /// <summary>Plain thresholds, moving average and trend, for gains.</summary>
    public static IReadOnlyList<SimulatedRule> Gains { get; } =
    [
        new("raw: 3 lb/1 d or 5 lb/7 d", (days, day, _) => Gain(Raw, days, day, 1) >= ThreePounds || Gain(Raw, days, day, 7) >= FivePounds),
        new("raw: over 2 kg in 3 days", (days, day, _) => Gain(Raw, days, day, 3) > 2_000),
        new("screened: 3 lb/1 d or 5 lb/7 d", (days, day, _) => Gain(Screened, days, day, 1) >= ThreePounds || Gain(Screened, days, day, 7) >= FivePounds),
        new("screened: 2 lb/1 d or 5 lb/7 d", (days, day, _) => Gain(Screened, days, day, 1) >= TwoPounds || Gain(Screened, days, day, 7) >= FivePounds),
        new("screened: 5 lb in 7 days", (days, day, _) => Gain(Screened, days, day, 7) >= FivePounds),
        new(PlainGain, (days, day, _) => Gain(Screened, days, day, 3) > 2_000),
        new("moving average 3/30 d over 1.5%", (days, day, start) => Convergence(days, day, 3, 30) > 0.015 * start),
        new("fluid score > 1.75", (days, day, _) => Reads(days[day]) && days[day].Trend.FluidScore > 1.75),
        new("fluid score > 2.0", (days, day, _) => Fluid(days[day])),
        new("fluid score > 2.5", (days, day, _) => Reads(days[day]) && days[day].Trend.FluidScore > 2.5),
        new("cumulative sum k 0.5 h 5", (days, day, _) => days[day].Trend.RisingAlarm),
        new("above target", (days, day, start) => Excess(days[day], start)),
        new("slope", (days, day, start) => Slope(days[day].Trend, start)),
        new(GainScore, (days, day, _) => Reads(days[day]) && days[day].Trend.GainScore > 2.4),
        new(Detector, (days, day, start) => Fluid(days[day]) || Excess(days[day], start)),
    ];

    public const string PlainGain = "screened: over 2 kg in 3 days";

    public const string GainScore = "gain score > 2.4";

    public const string Detector = "detector: fluid score > 2.0 or above target";

    /// <summary>For fluid lost.</summary>
    public static SimulatedRule Loss { get; } = new("loss: fluid score < -2.0", (days, day, _) => Reads(days[day]) && days[day].Trend.FluidScore < -2);

    private static bool Reads(SimulatedDay day) => day.Trend.Use != DayUse.None;

    private static bool Fluid(SimulatedDay day) => Reads(day) && day.Trend.FluidScore > 2;

    private static bool Excess(SimulatedDay day, double start) =>
        Reads(day) && day.Trend.Excess > Math.Max(2, 0.025 * start) && (day.Trend.Excess - 1) / day.Trend.ExcessError > 1.645;

    private static bool Slope(TrendDay day, double start) =>
        day.Use != DayUse.None && day.Trend.Slope / day.Trend.SlopeError > 2.33 && 7 * day.Trend.Slope > start / 80;

    private static int? Raw(SimulatedDay day) => day.Raw;

    private static int? Screened(SimulatedDay day) => day.Screened;

    private static int? Gain(Func<SimulatedDay, int?> weight, SimulatedDay[] days, int day, int back)
    {
        int? lowest = null;
        for (int before = Math.Max(0, day - back); before < day; before++)
        {
            lowest = weight(days[before]) is int grams && !(lowest < grams) ? grams : lowest;
        }

        return weight(days[day]) - lowest;
    }

    private static double? Convergence(SimulatedDay[] days, int day, int shortDays, int longDays) =>
        day < 10 || days[day].Screened is null ? null : Mean(days, day, shortDays) - Mean(days, day, longDays);

    private static double Mean(SimulatedDay[] days, int day, int length)
    {
        double sum = 0;
        int count = 0;
        for (int at = Math.Max(0, day - length + 1); at <= day; at++)
        {
            if (days[at].Screened is int grams)
            {
                sum += grams / 1000.0;
                count++;
            }
        }

        return sum / count;
    }
}
