using CsCheck;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>The scale against its definition worked out plainly over the whole series.</summary>
public class PersonalScaleTests
{
    [Fact]
    public void AgreesWithTheDefinition() => Gen.Select(Gen.Int, Gen.Double[0.3, 3], Gen.Double[0, 0.7], Gen.Int[0, 8]).Sample((seed, spread, missing, decimals) =>
    {
        var normal = new NormalScores(seed);
        var random = new Random(seed);
        double[] scores = [.. Enumerable.Range(0, 200).Select(_ => random.NextDouble() < missing ? double.NaN : Math.Round(spread * normal.Next(), decimals))];
        var scale = new PersonalScale();
        double expected = 1;
        for (int day = 0; day < scores.Length; day++)
        {
            scale.EndDay(scores[day]);
            if (day % 7 == 0)
            {
                var window = Enumerable.Range(8, 53).Where(back => back <= day).Select(back => Math.Abs(scores[day - back])).Where(score => !double.IsNaN(score)).Order().ToArray();
                if (window.Length >= 14)
                {
                    double middle = (window[(window.Length - 1) / 2] + window[window.Length / 2]) / 2;
                    expected = Math.Min(2.0, Math.Max(0.6, middle / 0.6745));
                }
            }

            Assert.Equal(expected, scale.Value, 12);
        }
    });

    [Fact]
    public void NormalScoresGiveAboutOne()
    {
        // Median absolute deviation over 0.6745 estimates the standard deviation of a normal sample: Hampel,
        // J Am Stat Assoc 1974;69:383. Its standard error here is about 1.17/√53 = 0.16 for one window.
        var normal = new NormalScores(7);
        var scale = new PersonalScale();
        double sum = 0;
        for (int day = 0; day < 7 * 500; day++)
        {
            scale.EndDay(normal.Next());
            sum += scale.Value;
        }

        Assert.Equal(1, sum / (7 * 500), 0.05);
    }
}
