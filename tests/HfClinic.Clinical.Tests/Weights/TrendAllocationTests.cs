using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>The nightly replay of a large clinic must not allocate for each reading.</summary>
public class TrendAllocationTests
{
    [Fact]
    public void ReplayAllocatesNothing()
    {
        var model = TrendModel.For(new Weight(80_000));
        int?[] grams = [.. Enumerable.Range(0, 1_000).Select(day => day % 9 == 0 ? (int?)null : 80_000 + (day % 7 * 100))];
        var days = new TrendDay[grams.Length];
        Replay();
        long before = GC.GetAllocatedBytesForCurrentThread();

        Replay();

        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);

        void Replay()
        {
            var state = TrendState.Start(model);
            TrendReplay.Run(model, ref state, grams, 80, days);
        }
    }

    [Fact]
    public void ATooShortOutputIsRefusedBeforeAnythingIsComputed()
    {
        var model = TrendModel.For(new Weight(80_000));
        var state = TrendState.Start(model);
        var days = new TrendDay[1];

        Assert.Throws<ArgumentException>(() => TrendReplay.Run(model, ref state, [80_000, 80_100], 80, days));

        Assert.Equal(default, days[0]);
    }

    [Theory]
    [InlineData(24_999)]
    [InlineData(300_001)]
    public void AReferenceOutsideTheEntryRangeIsRefused(int grams) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => TrendModel.For(new Weight(grams)));
}
