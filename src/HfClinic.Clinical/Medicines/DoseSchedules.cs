using System.Collections.Frozen;

namespace HfClinic.Clinical.Medicines;

/// <summary>
/// How often, as people write it. Abbreviations that are easily misread are understood here and never written (common practice,
/// no source).
/// </summary>
internal static class DoseSchedules
{
    private static readonly FrozenDictionary<string, decimal> Takings = new Dictionary<string, decimal>
    {
        ["daily"] = 1, ["once daily"] = 1, ["once a day"] = 1, ["once per day"] = 1, ["every day"] = 1, ["each day"] = 1, ["a day"] = 1,
        ["per day"] = 1, ["/day"] = 1, ["/d"] = 1, ["1 times daily"] = 1, ["one time daily"] = 1, ["od"] = 1, ["o.d"] = 1, ["qd"] = 1, ["q.d"] = 1,
        ["mane"] = 1, ["nocte"] = 1, ["in the morning"] = 1, ["every morning"] = 1, ["each morning"] = 1, ["at night"] = 1,
        ["every night"] = 1, ["in the evening"] = 1, ["every evening"] = 1, ["at bedtime"] = 1, ["every 24 hours"] = 1, ["24-hourly"] = 1,
        ["twice daily"] = 2, ["twice a day"] = 2, ["twice per day"] = 2, ["two times daily"] = 2, ["two times a day"] = 2,
        ["2 times daily"] = 2, ["2 times a day"] = 2, ["2x daily"] = 2, ["2x/day"] = 2, ["bd"] = 2, ["b.d"] = 2, ["bid"] = 2, ["b.i.d"] = 2,
        ["morning and evening"] = 2, ["morning and night"] = 2, ["every 12 hours"] = 2, ["12-hourly"] = 2, ["12 hourly"] = 2,
        ["three times daily"] = 3, ["three times a day"] = 3, ["three times per day"] = 3, ["3 times daily"] = 3, ["3 times a day"] = 3,
        ["3x daily"] = 3, ["3x/day"] = 3, ["tid"] = 3, ["t.i.d"] = 3, ["tds"] = 3, ["t.d.s"] = 3, ["every 8 hours"] = 3, ["8-hourly"] = 3, ["8 hourly"] = 3,
        ["four times daily"] = 4, ["four times a day"] = 4, ["four times per day"] = 4, ["4 times daily"] = 4, ["4 times a day"] = 4,
        ["4x daily"] = 4, ["4x/day"] = 4, ["qid"] = 4, ["q.i.d"] = 4, ["qds"] = 4, ["q.d.s"] = 4, ["every 6 hours"] = 4, ["6-hourly"] = 4, ["6 hourly"] = 4,
        ["every other day"] = 0.5m, ["every second day"] = 0.5m, ["on alternate days"] = 0.5m, ["alternate days"] = 0.5m,
        ["every 2 days"] = 0.5m, ["every two days"] = 0.5m, ["every 48 hours"] = 0.5m, ["eod"] = 0.5m, ["e.o.d"] = 0.5m, ["qod"] = 0.5m, ["q.o.d"] = 0.5m,
    }.ToFrozenDictionary(StringComparer.Ordinal);

    /// <summary>Takings a day; null when the words are not known.</summary>
    public static decimal? Read(string words) => Takings.TryGetValue(words.TrimEnd('.'), out var times) ? times : null;
}
