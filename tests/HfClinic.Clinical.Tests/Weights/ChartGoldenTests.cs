using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// Cumulative sums and moving average on the innovations of a local level filter: R 4.2 stats::KalmanRun for the filter
/// (statsmodels 'llevel' agrees) and the same R script for the two charts. Neither is restarted after an alarm.
/// </summary>
public class ChartGoldenTests
{
    [Fact]
    public void SumsAndAverageAgreeWithTheReferenceTable()
    {
        var golden = GoldenTable.Read("locallevel_cusum_ewma_golden.csv");
        // A slope that is 0 and cannot move leaves a local level.
        var model = new SlopeModel(Square(0.006 * 80), LevelStep: Square(0.00125 * 80), SlopeStep: 0, Robust: false);
        var filter = new SlopeFilter(80, 0, 1, 0, 0);
        var cusum = new Cusum();
        var ewma = new Ewma();
        for (int row = 0; row < golden.Count; row++)
        {
            filter = row == 0 ? filter : filter.NextDay(model);
            golden.Check(row, ("level_pred", filter.Level), ("P_pred", filter.LevelVariance), ("F", filter.LevelVariance + model.ReadingVariance));
            if (golden.Find(row, "y") is double y)
            {
                var reading = filter.Compare(model, y);
                golden.Check(row, ("innov", reading.Kilograms), ("z", reading.Score));
                filter = filter.Take(model, reading);
                double cut = Math.Clamp(reading.Score, -Cusum.LargestScore, Cusum.LargestScore);
                cusum = cusum.Add(cut);
                ewma = ewma.Add(cut);
            }

            golden.Check(
                row,
                ("level", filter.Level),
                ("P", filter.LevelVariance),
                ("cusum_up", cusum.Up),
                ("cusum_down", cusum.Down),
                ("ewma", ewma.Value),
                ("ewma_limit", ewma.Limit));
            Assert.Equal(golden[row, "alarm_up"] == 1, cusum.Up > Cusum.Limit);
            Assert.Equal(golden[row, "alarm_down"] == 1, cusum.Down > Cusum.Limit);
            Assert.Equal(golden[row, "ewma_alarm"] == 1, ewma.Value > ewma.Limit);
        }
    }

    [Fact]
    public void AlarmComesOnDay32()
    {
        var golden = GoldenTable.Read("locallevel_cusum_ewma_golden.csv");

        Assert.Equal(32, 1 + Enumerable.Range(0, golden.Count).First(row => golden[row, "cusum_up"] > Cusum.Limit));
        Assert.Equal(5.7462479618, golden[31, "cusum_up"], 10);
    }

    private static double Square(double value) => value * value;
}
