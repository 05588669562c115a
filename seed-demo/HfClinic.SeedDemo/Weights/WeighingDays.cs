using HfClinic.SeedDemo.Days;

namespace HfClinic.SeedDemo.Weights;

/// <summary>On which days a person steps on the scale: after a missed day the next is more likely to be missed too.</summary>
internal static class WeighingDays
{
    private const double MissedAgain = 0.55;

    /// <param name="care">The second shape of the beta distribution (first 2) of the chance to miss a day after a weighing; 14 misses 20 % of all days.</param>
    /// <returns>True for days with a weight; the last entry is day 0.</returns>
    public static bool[] Draw(Chance chance, int care)
    {
        var toMiss = chance.Beta(2, care);
        var missed = chance.Happens(toMiss / (toMiss + 1 - MissedAgain));
        var weighed = new bool[DemoDays.History];
        for (var i = 0; i < weighed.Length; i++)
        {
            weighed[i] = !missed;
            missed = chance.Happens(missed ? MissedAgain : toMiss);
        }

        return weighed;
    }
}
