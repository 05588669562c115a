using CsCheck;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>Day series as patients make them: a wandering weight, scatter, and days without.</summary>
internal static class SeriesGen
{
    public static readonly Gen<Weight> Reference = Gen.Int[50_000, 140_000].Select(grams => new Weight(grams));

    /// <summary>Grams about the reference, null on a day without; scatter is that of the model, so nothing is held.</summary>
    public static Gen<int?[]> Around(Weight reference, int shortest, int longest) =>
        Gen.Select(Gen.Int, Gen.Int[shortest, longest]).Select((seed, days) =>
        {
            var normal = new NormalScores(seed);
            var random = new Random(seed);
            var series = new int?[days];
            double fluid = 0;
            for (int day = 0; day < days; day++)
            {
                fluid = (0.85 * fluid) + (0.0045 * reference.Grams * normal.Next());
                double weight = reference.Grams + fluid + (0.0045 * reference.Grams * Math.Clamp(normal.Next(), -2, 2));
                series[day] = random.NextDouble() < 0.2 ? null : (int)Math.Round(weight);
            }

            return series;
        });
}
