using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>How a patient's record becomes a trend. The rules are conventions of this program.</summary>
public class WeightTrendTests
{
    private static readonly DateOnly First = new(2026, 1, 5);
    private static readonly TargetWeight Eighty = new(1, First, new Weight(80_000), "test");

    [Fact]
    public void TheReferenceSeriesComesOutTheSameFromDatedWeights()
    {
        // R KalmanRun, robust coding: day 11 is held and so not in the series; the first five weeks have no personal scale
        // before day 29, so the state is that of the reference table throughout.
        var golden = GoldenTable.Read("threecomp_robust_golden.csv");
        var series = golden.Grams.Index().Where(day => day.Item is not null && day.Index != 10)
            .Select(day => new DayWeight(First.AddDays(day.Index), day.Item!.Value));

        var history = WeightTrend.Of([.. series], [Eighty], [], First.AddDays(34));

        Assert.Equal(First, history.FirstDay);
        Assert.Equal(35, history.Days.Length);
        for (int row = 0; row < 35; row++)
        {
            var day = history.On(First.AddDays(row))!.Value;
            golden.Check(row, ("M", day.State.Mass), ("Fluid", day.State.Fluid), ("excess", day.Excess), ("se_excess", day.ExcessError));
        }

        Assert.Null(history.On(First.AddDays(-1)));
        Assert.Null(history.On(First.AddDays(35)));
    }

    [Fact]
    public void NoWeightNoTrend()
    {
        Assert.Empty(WeightTrend.Of([], [Eighty], [], First).Days);
        Assert.Empty(WeightTrend.Of([new DayWeight(First.AddDays(1), 80_000)], [Eighty], [], First).Days);
    }

    [Fact]
    public void WithoutATargetTheMedianOfTheFirstThreeWeightsIsTheStartAndThereIsNoExcess()
    {
        var history = WeightTrend.Of(Daily(81_000, 79_500, 80_200, 99_000), [], [], First);

        Assert.Equal(80.2, history.Days[0].Expected, 12);
        Assert.Null(history.Days[0].Excess);
    }

    [Fact]
    public void ANewTargetCountsFromItsDay()
    {
        var lower = new TargetWeight(2, First.AddDays(2), new Weight(78_000), "test");

        var history = WeightTrend.Of(Daily(80_000, 80_000, 80_000, 80_000), [Eighty, lower], [], First.AddDays(3));

        Assert.Equal(0, history.Days[1].Excess!.Value, 9);
        Assert.Equal(2, history.Days[2].Excess!.Value, 9);
    }

    [Fact]
    public void ANewBaselineStartsFluidDriftAndSumsAgainAndKeepsTheScale()
    {
        int[] grams = [.. Enumerable.Range(0, 40).Select(day => 80_000 + (day % 2 == 0 ? 700 : -700))];
        var on = First.AddDays(35);

        var history = WeightTrend.Of(Daily(grams), [Eighty], [new BaselineReset(on, new Weight(76_000))], First.AddDays(39));

        var day = history.On(on)!.Value;
        Assert.Equal(76.0, day.Expected, 12);
        // 0.5² for body mass, (0.009 W)² for fluid, (0.0055 W)² for the weighing, W = 80 kg.
        Assert.Equal(0.25 + 0.5184 + 0.1936, day.ExpectedVariance, 12);
        Assert.Equal(history.On(on.AddDays(-1))!.Value.Scale, day.Scale);
        Assert.NotEqual(1, day.Scale);
    }

    [Fact]
    public void AnAcceptedWeightFarFromExpectationIsAllFluidUntilLaterWeightsTell()
    {
        int[] grams = [.. Enumerable.Repeat(80_000, 20), .. Enumerable.Repeat(86_000, 20)];

        var history = WeightTrend.Of(Daily(grams), [Eighty], [], First.AddDays(39));

        var jump = history.Days[20];
        Assert.Equal(DayUse.Step, jump.Use);
        Assert.Null(jump.Score);
        Assert.Equal(86, jump.State.Expected, 9);
        Assert.Equal(history.Days[19].State.Mass + history.Days[19].State.Drift, jump.State.Mass, 9);
        Assert.Equal(TrendModel.For(new Weight(80_000)).ReadingVariance, jump.State.FluidVariance, 12);
        Assert.True(history.Days[39].State.Fluid < jump.State.Fluid);
    }

    [Fact]
    public void TheGainScoreAddsThreeTenthsOfTheExcessCutOffAtThree()
    {
        // One standard deviation of fluid is 0.009 W = 0.72 kg.
        var lower = new TargetWeight(2, First.AddDays(10), new Weight(79_000), "test");
        var far = new TargetWeight(3, First.AddDays(11), new Weight(70_000), "test");

        var history = WeightTrend.Of(Daily([.. Enumerable.Repeat(80_000, 12)]), [Eighty, lower, far], [], First.AddDays(11));

        Assert.Equal(0, history.Days[9].GainScore!.Value, 9);
        Assert.Equal(0.3 * 1 / 0.72, history.Days[10].GainScore!.Value, 9);
        Assert.Equal(0.3 * 3, history.Days[11].GainScore!.Value, 9);
        Assert.Null(WeightTrend.Of(Daily(80_000), [], [], First).Days[0].GainScore);
    }

    [Fact]
    public void LearningEndsWithTheSeventhWeightInFourteenDays()
    {
        int[] days = [0, 4, 8, 12, 16, 18, 20, 22, 23, 24];
        var series = days.Select(day => new DayWeight(First.AddDays(day), 80_000));

        var history = WeightTrend.Of([.. series], [Eighty], [], First.AddDays(60));

        // Days 11 to 24 hold 12, 16, 18, 20, 22, 23, 24.
        Assert.True(history.On(First.AddDays(23))!.Value.Learning);
        Assert.False(history.On(First.AddDays(24))!.Value.Learning);
        Assert.False(history.On(First.AddDays(60))!.Value.Learning);
    }

    [Fact]
    public void SumsStartAgainAfterAnAlarm()
    {
        int[] grams = [.. Enumerable.Repeat(80_000, 20), .. Enumerable.Range(1, 30).Select(day => 80_000 + (day * 200))];

        var history = WeightTrend.Of(Daily(grams), [Eighty], [], First.AddDays(49));

        int alarm = history.Days.ToList().FindIndex(day => day.RisingAlarm);
        Assert.InRange(alarm, 21, 40);
        Assert.True(history.Days[alarm].Cusum.Up > 5);
        Assert.True(history.Days[alarm + 1].Cusum.Up <= 2.5);
        Assert.DoesNotContain(history.Days, day => day.FallingAlarm);
    }

    [Fact]
    public void WeeklySlopeHasItsInterval()
    {
        int[] grams = [.. Enumerable.Range(0, 60).Select(day => 80_000 + (day * 100))];

        var (perWeek, low, high) = WeightTrend.Of(Daily(grams), [Eighty], [], First.AddDays(59)).Days[59].WeeklySlope;

        Assert.Equal(0.7, perWeek, 0.1);
        Assert.InRange(0.7, low, high);
        Assert.Equal(perWeek - low, high - perWeek, 9);
    }

    private static System.Collections.Immutable.ImmutableArray<DayWeight> Daily(params int[] grams) =>
        [.. grams.Select((weight, day) => new DayWeight(First.AddDays(day), weight))];
}
