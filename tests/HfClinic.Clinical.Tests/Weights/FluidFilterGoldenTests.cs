using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// The three-state filter against R 4.2 stats::KalmanRun and Python statsmodels 0.13 MLEModel (the plain form, which agree
/// to 5e-11) and against two independent codings in R and Python (the robust form). Target 80 kg, personal scale 1,
/// cumulative sums not restarted.
/// </summary>
public class FluidFilterGoldenTests
{
    private static readonly TrendModel Plain = TrendModel.For(new Weight(80_000)) with
    {
        Robust = false,
        LearnsScale = false,
        CusumRestarts = false,
    };

    [Fact]
    public void PlainFormAgreesWithKalmanRunAndStatsmodels() => Check(Plain, GoldenTable.Read("threecomp_plain_golden.csv"), held: []);

    [Fact]
    public void RobustFormAgreesWithTheTwoCodings() =>
        Check(Plain with { Robust = true }, GoldenTable.Read("threecomp_robust_golden.csv"), held: [11]);

    [Fact]
    public void LastDayAgreesWithThePrintedSpotValues()
    {
        var golden = GoldenTable.Read("threecomp_plain_golden.csv");
        var last = Replay(Plain, golden.Grams)[34];

        Assert.Equal(81.0381930539, last.State.Mass, 9);
        Assert.Equal(1.4199050486, last.State.Fluid, 9);
        Assert.Equal(2.4580981025, last.Excess!.Value, 8);
        Assert.Equal(0.3266200929, last.ExcessError, 9);
        Assert.Equal(2.8282009108, last.FluidScore, 9);
        Assert.Equal(4.0917316134, last.Cusum.Up, 9);
    }

    [Fact]
    public void FluidScoreFirstPassesTwoOnDay33()
    {
        var days = Replay(Plain, GoldenTable.Read("threecomp_plain_golden.csv").Grams);

        Assert.Equal(33, 1 + Array.FindIndex(days, day => day.FluidScore > 2));
    }

    [Fact]
    public void TheInputIsTheSameSeries()
    {
        var input = GoldenTable.Read("weights_input.csv");
        var golden = GoldenTable.Read("threecomp_plain_golden.csv");

        Assert.Equal(35, input.Count);
        Assert.All(Enumerable.Range(0, 35), row => Assert.Equal(input.Find(row, "weight_kg"), golden.Find(row, "y")));
    }

    private static void Check(TrendModel model, GoldenTable golden, int[] held)
    {
        int?[] grams = golden.Grams;
        foreach (int day in held)
        {
            grams[day - 1] = null;
        }

        var days = Replay(model, grams);
        for (int row = 0; row < golden.Count; row++)
        {
            var day = days[row];
            var after = day.State;
            golden.Check(
                row,
                ("pred", day.Expected),
                ("F", day.ExpectedVariance),
                ("M", after.Mass),
                ("D", after.Drift),
                ("Fluid", after.Fluid),
                ("P_MM", after.MassVariance),
                ("P_DD", after.DriftVariance),
                ("P_FF", after.FluidVariance),
                ("P_MF", after.MassFluid),
                ("excess", day.Excess),
                ("se_excess", day.ExcessError),
                ("zF", day.FluidScore),
                ("cusum_up", day.Cusum.Up),
                ("cusum_down", day.Cusum.Down));

            bool isHeld = held.Contains(row + 1);
            Assert.Equal(isHeld ? 1 : 0, golden[row, "held"]);
            if (isHeld)
            {
                Assert.True(Math.Abs(golden[row, "innov"]) > model.Gate(day.ExpectedVariance));
            }
            else
            {
                golden.Check(
                    row,
                    ("z", day.Score),
                    ("innov", day.Score * Math.Sqrt(day.ExpectedVariance)),
                    ("weight", Counted(model, day)));
            }
        }
    }

    private static double? Counted(TrendModel model, TrendDay day) =>
        day.Score is double score ? Innovation.Of(score, 1, model.Robust).Weight : null;

    private static TrendDay[] Replay(TrendModel model, int?[] grams)
    {
        var state = TrendState.Start(model);
        var days = new TrendDay[grams.Length];
        TrendReplay.Run(model, ref state, grams, 80, days);
        return days;
    }
}
