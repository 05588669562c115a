using CsCheck;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>What must hold of any trend, whatever the weights. Follows from the equations of the model.</summary>
public class TrendPropertyTests
{
    private static readonly Gen<(Weight Reference, int?[] Grams)> Case =
        SeriesGen.Reference.SelectMany(reference => SeriesGen.Around(reference, 5, 120).Select(grams => (reference, grams)));

    [Fact]
    public void ReadingsMayArriveInAnyOrder() => Gen.Select(Case, Gen.Int).Sample((given, seed) =>
    {
        var model = TrendModel.For(given.Reference);
        var known = new int?[given.Grams.Length];
        var before = new TrendState[known.Length];
        var days = new TrendDay[known.Length];
        Replay(0);
        int[] arrival = [.. Enumerable.Range(0, known.Length)];
        new Random(seed).Shuffle(arrival);

        foreach (int day in arrival)
        {
            known[day] = given.Grams[day];
            Replay(day);
        }

        Assert.Equal(Run(model, given.Grams, 80), days);

        void Replay(int from)
        {
            var state = from == 0 ? TrendState.Start(model) : before[from];
            for (int day = from; day < known.Length; day++)
            {
                before[day] = state;
                days[day] = state.Advance(model, known[day], 80);
            }
        }
    }, iter: 200);

    [Fact]
    public void GoingOnFromACopyIsGoingOnFromTheStart() => Gen.Select(Case, Gen.Double.Unit).Sample((given, where) =>
    {
        var model = TrendModel.For(given.Reference);
        int cut = (int)(where * given.Grams.Length);
        var days = new TrendDay[given.Grams.Length];
        var state = TrendState.Start(model);
        TrendReplay.Run(model, ref state, given.Grams.AsSpan(0, cut), 80, days);
        var copy = state;
        TrendReplay.Run(model, ref copy, given.Grams.AsSpan(cut), 80, days.AsSpan(cut));

        Assert.Equal(Run(model, given.Grams, 80), days);
    });

    [Fact]
    public void ANewTargetMovesTheExcessAndWhatIsMadeOfItOnly() => Gen.Select(Case, Gen.Double[40, 150], Gen.Double[40, 150]).Sample((given, first, second) =>
    {
        var model = TrendModel.For(given.Reference);
        var one = Run(model, given.Grams, first);
        var other = Run(model, given.Grams, second);

        Assert.Equal(one, other.Select((day, index) => day with { Target = first, GainScore = one[index].GainScore }));
        Assert.All(one.Zip(other), pair => Assert.Equal(first - second, pair.Second.Excess!.Value - pair.First.Excess!.Value, 9));
    });

    [Fact]
    public void MovingWeightsBaselineAndTargetTogetherMovesBodyMassOnly() => Gen.Select(Case, Gen.Int[-20_000, 20_000]).Sample((given, shift) =>
    {
        var model = TrendModel.For(given.Reference);
        var one = RunFrom(model, given.Reference, given.Grams);
        var other = RunFrom(model, given.Reference + new Weight(shift), [.. given.Grams.Select(grams => grams + shift)]);

        Assert.All(one.Zip(other), pair =>
        {
            Assert.Equal(shift / 1000.0, pair.Second.State.Mass - pair.First.State.Mass, 7);
            Assert.Equal(pair.First.State.Fluid, pair.Second.State.Fluid, 7);
            Assert.Equal(pair.First.State.Drift, pair.Second.State.Drift, 7);
            Assert.Equal(pair.First.Trend.Slope, pair.Second.Trend.Slope, 7);
            Assert.Equal(pair.First.FluidScore, pair.Second.FluidScore, 7);
            Assert.Equal(pair.First.Excess!.Value, pair.Second.Excess!.Value, 7);
            Assert.Equal(pair.First.Cusum.Up, pair.Second.Cusum.Up, 7);
        });
    });

    [Fact]
    public void TwiceTheWeightGivesTwiceTheKilogramsAndTheSameScores() => Case.Sample(given =>
    {
        var half = new Weight(given.Reference.Grams / 2 * 2);
        var one = Run(TrendModel.For(half), given.Grams, half.Grams / 1000.0);
        var twice = Run(TrendModel.For(half + half), [.. given.Grams.Select(grams => 2 * grams)], half.Grams / 500.0);

        Assert.All(one.Zip(twice), pair =>
        {
            Assert.Equal(2 * pair.First.State.Mass, pair.Second.State.Mass, 7);
            Assert.Equal(2 * pair.First.State.Fluid, pair.Second.State.Fluid, 7);
            Assert.Equal(2 * pair.First.ExcessError, pair.Second.ExcessError, 7);
            Assert.Equal(4 * pair.First.State.MassFluid, pair.Second.State.MassFluid, 7);
            Assert.Equal(pair.First.Score ?? 0, pair.Second.Score ?? 0, 7);
            Assert.Equal(pair.First.FluidScore, pair.Second.FluidScore, 7);
            Assert.Equal(pair.First.Scale, pair.Second.Scale, 7);
        });
    });

    [Fact]
    public void ADayWithoutAReadingWidensAndMovesNoSum() => Case.Sample(given =>
    {
        var model = TrendModel.For(given.Reference) with { CusumRestarts = false };
        var days = Run(model, given.Grams, 80);
        for (int day = 1; day < days.Length; day++)
        {
            if (days[day].Use == DayUse.None)
            {
                Assert.Equal(days[day - 1].Cusum, days[day].Cusum);
                Assert.True(days[day].State.MassVariance > days[day - 1].State.MassVariance);
                Assert.True(days[day].Trend.SlopeVariance > days[day - 1].Trend.SlopeVariance);
            }
        }
    });

    [Fact]
    public void CovariancesStayCovariances() => Case.Sample(given =>
    {
        foreach (var day in Run(TrendModel.For(given.Reference), given.Grams, 80))
        {
            var state = day.State;
            Assert.True(state.MassVariance > 0 && state.DriftVariance > 0 && state.FluidVariance > 0);
            Assert.True(state.MassFluid * state.MassFluid <= state.MassVariance * state.FluidVariance);
            Assert.True(state.MassDrift * state.MassDrift <= state.MassVariance * state.DriftVariance);
            Assert.True(day.Trend.LevelSlope * day.Trend.LevelSlope <= day.Trend.LevelVariance * day.Trend.SlopeVariance);
        }
    });

    private static TrendDay[] Run(TrendModel model, int?[] grams, double? target)
    {
        var state = TrendState.Start(model);
        var days = new TrendDay[grams.Length];
        TrendReplay.Run(model, ref state, grams, target, days);
        return days;
    }

    private static TrendDay[] RunFrom(TrendModel model, Weight baseline, int?[] grams)
    {
        var state = TrendState.Start(model);
        state.Rebase(model, baseline);
        var days = new TrendDay[grams.Length];
        TrendReplay.Run(model, ref state, grams, baseline.Grams / 1000.0, days);
        return days;
    }
}
