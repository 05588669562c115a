using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// The local linear trend against R 4.2 stats::KalmanRun and Python statsmodels 0.13 UnobservedComponents 'lltrend'
/// (plain form) and against two independent codings in R and Python (robust form, day 11 held). W = 80 kg.
/// </summary>
public class SlopeFilterGoldenTests
{
    private static readonly SlopeModel Robust = SlopeModel.For(80);

    [Fact]
    public void PlainFormAgreesWithKalmanRunAndStatsmodels()
    {
        var golden = GoldenTable.Read("llt_daily_golden.csv");
        var model = Robust with { Robust = false };
        var filter = SlopeFilter.Start(80);
        for (int row = 0; row < golden.Count; row++)
        {
            filter = row == 0 ? filter : filter.NextDay(model);
            golden.Check(
                row,
                ("level_pred", filter.Level),
                ("slope_pred", filter.Slope),
                ("P11_pred", filter.LevelVariance),
                ("P12_pred", filter.LevelSlope),
                ("P22_pred", filter.SlopeVariance),
                ("F", filter.LevelVariance + model.ReadingVariance));
            Innovation? reading = golden.Find(row, "y") is double y ? filter.Compare(model, y) : null;
            golden.Check(row, ("innov", reading?.Kilograms), ("z", reading?.Score));
            filter = reading is Innovation taken ? filter.Take(model, taken) : filter;
            CheckState(golden, row, filter);
        }
    }

    [Fact]
    public void RobustFormAgreesWithTheTwoCodings()
    {
        var golden = GoldenTable.Read("robust_llt_golden.csv");
        var filter = SlopeFilter.Start(80);
        for (int row = 0; row < golden.Count; row++)
        {
            filter = row == 0 ? filter : filter.NextDay(Robust);
            golden.Check(row, ("level_pred", filter.Level), ("slope_pred", filter.Slope), ("F", filter.LevelVariance + Robust.ReadingVariance));
            Innovation? reading = golden.Find(row, "y") is double y ? filter.Compare(Robust, y) : null;
            golden.Check(row, ("innov", reading?.Kilograms), ("z", reading?.Score));
            if (reading is Innovation seen && golden[row, "held"] == 0)
            {
                golden.Check(row, ("weight", seen.Weight));
                filter = filter.Take(Robust, seen);
            }

            CheckState(golden, row, filter);
        }

        Assert.Equal(82.6048413550, filter.Level, 9);
        Assert.Equal(0.1768006524, filter.Slope, 9);
        Assert.Equal(0.0957921728, filter.LevelVariance, 9);
    }

    private static void CheckState(GoldenTable golden, int row, SlopeFilter filter) => golden.Check(
        row,
        ("level", filter.Level),
        ("slope", filter.Slope),
        ("P11", filter.LevelVariance),
        ("P12", filter.LevelSlope),
        ("P22", filter.SlopeVariance));
}
