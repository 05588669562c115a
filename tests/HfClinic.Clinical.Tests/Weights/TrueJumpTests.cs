using CsCheck;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>A true jump of 4 kg must not vanish as an outlier, whoever is weighed and whenever it comes.</summary>
public class TrueJumpTests
{
    private const int JumpGrams = 4_000;
    private static readonly DateOnly First = new(2026, 1, 5);

    [Fact]
    public void AFourKilogramJumpIsInTheTrendWithinFiveWeights() => Gen.Select(
        SeriesGen.Reference.SelectMany(reference => SeriesGen.Around(reference, 20, 60).Select(grams => (Reference: reference, Grams: grams))),
        Gen.Int).Sample((given, seed) =>
    {
        var (reference, before) = given;
        var normal = new NormalScores(seed);
        var screen = new ReadingScreen(reference);
        var accepted = new List<DayWeight>();
        var held = new List<DayWeight>();
        for (int day = 0; day < before.Length; day++)
        {
            if (before[day] is int grams)
            {
                Take(day, grams);
            }
        }

        int heldBefore = held.Count;
        for (int after = 0; after < 5; after++)
        {
            Take(before.Length + after, reference.Grams + JumpGrams + (int)(0.004 * reference.Grams * Math.Clamp(normal.Next(), -1, 1)));
        }

        Assert.True(held.Count - heldBefore <= 1, "The second weight after the jump must count.");
        var through = First.AddDays(before.Length + 4);
        var today = WeightTrend.Of([.. accepted], [new(1, First, reference, "test")], [], through).On(through)!.Value;
        Assert.True(today.Excess > 2.5, $"Excess {today.Excess} kg.");

        void Take(int day, int grams)
        {
            var weight = new DayWeight(First.AddDays(day), grams);
            var outcome = screen.Take(weight.Day.ToDateTime(new TimeOnly(7, 0)), new Weight(grams), []);
            (outcome.Verdict == ScreenVerdict.Held ? held : accepted).Add(weight);
        }
    }, iter: 500);
}
