using System.Diagnostics;

namespace HfClinic.Benchmarks.Harness;

/// <summary>How long one piece of work took over all rounds, in milliseconds.</summary>
/// <param name="Fastest">Least disturbed by whatever else the machine does.</param>
internal sealed record Taken(double Median, double Fastest)
{
    public static Taken operator /(Taken taken, double pieces) => new(taken.Median / pieces, taken.Fastest / pieces);
}

/// <summary>Times pieces of work in turn, so that what disturbs one disturbs all.</summary>
internal static class Rounds
{
    /// <summary>Runs every work once a round; the warm-up rounds are not counted.</summary>
    /// <returns>One entry for each work, in the same order.</returns>
    public static async Task<Taken[]> RunAsync(int warmUp, int rounds, params Func<Task>[] works)
    {
        var times = works.Select(_ => new List<double>(rounds)).ToArray();
        for (var round = -warmUp; round < rounds; round++)
        {
            for (var at = 0; at < works.Length; at++)
            {
                var watch = Stopwatch.StartNew();
                await works[at]();
                if (round >= 0)
                {
                    times[at].Add(watch.Elapsed.TotalMilliseconds);
                }
            }
        }

        return [.. times.Select(of => new Taken(of.Order().ElementAt(of.Count / 2), of.Min()))];
    }
}
