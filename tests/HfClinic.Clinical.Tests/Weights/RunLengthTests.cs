using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// Average run lengths of the two charts on independent normal scores, by seeded simulation, against the R package spc
/// (xcusum.arl, xewma.arl). A cell passes within five Monte Carlo standard errors. Cells above 1,000 are left out:
/// they would take minutes and add nothing about the arithmetic.
/// </summary>
public class RunLengthTests
{
    private const int Runs = 2_000;
    private const double LongestTried = 1_000;

    [Fact]
    public void CumulativeSumsAlarmAsOftenAsSpcSays()
    {
        var golden = GoldenTable.Read("cusum_arl_golden.csv");
        var normal = new NormalScores(20260301);
        int tried = 0;
        for (int row = 0; row < golden.Count; row++)
        {
            double allowance = golden[row, "k"];
            double limit = golden[row, "h"];
            foreach (var (column, shift, sides) in new[] { ("arl0_one", 0.0, 1), ("arl0_two", 0.0, 2), ("arl_shift05", 0.5, 1), ("arl_shift1", 1.0, 1), ("arl_shift2", 2.0, 1) })
            {
                double expected = golden[row, column];
                if (expected <= LongestTried)
                {
                    tried++;
                    Check($"k {allowance}, h {limit}, {column}", expected, () => CusumRun(normal, shift, allowance, limit, sides));
                }
            }
        }

        Assert.True(tried > 100, $"Only {tried} cells were tried.");
    }

    [Fact]
    public void MovingAveragesAlarmAsOftenAsSpcSays()
    {
        var golden = GoldenTable.Read("ewma_arl_golden.csv");
        var normal = new NormalScores(20260302);
        for (int row = 0; row < golden.Count; row++)
        {
            double newest = golden[row, "lambda"];
            double limit = golden[row, "c"] * Math.Sqrt(newest / (2 - newest));
            foreach (var (column, shift) in new[] { ("arl0_two", 0.0), ("arl_shift05", 0.5), ("arl_shift1", 1.0), ("arl_shift2", 2.0) })
            {
                Check($"λ {newest}, row {row}, {column}", golden[row, column], () => EwmaRun(normal, shift, newest, limit));
            }
        }
    }

    private static void Check(string cell, double expected, Func<int> run)
    {
        double sum = 0;
        double squares = 0;
        for (int i = 0; i < Runs; i++)
        {
            double length = run();
            sum += length;
            squares += length * length;
        }

        double mean = sum / Runs;
        double error = Math.Sqrt(((squares / Runs) - (mean * mean)) / Runs);
        Assert.True(Math.Abs(mean - expected) < 5 * error, $"{cell}: spc {expected:0.0000}, simulated {mean:0.0000} ± {error:0.0000}.");
    }

    private static int CusumRun(NormalScores normal, double shift, double allowance, double limit, int sides)
    {
        var cusum = new Cusum();
        for (int length = 1; ; length++)
        {
            cusum = cusum.Add(normal.Next() + shift, allowance);
            if (cusum.Up > limit || (sides == 2 && cusum.Down > limit))
            {
                return length;
            }
        }
    }

    private static int EwmaRun(NormalScores normal, double shift, double newest, double limit)
    {
        var ewma = new Ewma();
        for (int length = 1; ; length++)
        {
            ewma = ewma.Add(normal.Next() + shift, newest);
            if (Math.Abs(ewma.Value) > limit)
            {
                return length;
            }
        }
    }
}
