using HfClinic.Clinical.Values;
using HfClinic.Records.DailyWeights;
using HfClinic.Web.Ui;

namespace HfClinic.Web.DailyWeights;

/// <summary>The counts above the list as one sentence whose counts are the filters.</summary>
public static class CountsSentence
{
    /// <summary>A count of nobody is said too, as plain words: it is no promise that all is well.</summary>
    public static IReadOnlyList<SentencePart> Of(DailyWeightsCounts counts, ListAddress at)
    {
        var people = Wording.Count(counts.OnList, "person weighs", "people weigh");
        List<SentencePart> parts =
        [
            new(people, at.View == DailyWeightsView.All ? null : (at with { View = DailyWeightsView.All }).Href),
            new(" at home. "),
            Count(counts.Today, "for today", DailyWeightsView.Today, at),
            new(", "),
            Count(counts.ThisWeek, "this week", DailyWeightsView.ThisWeek, at),
            new(", "),
            Count(counts.Silent, "silent", DailyWeightsView.Silent, at),
            new(", "),
            Count(counts.ToCheck, counts.ToCheck == 1 ? "with a reading to check" : "with readings to check", DailyWeightsView.ToCheck, at),
            new("; "),
            Count(counts.NotYet, counts.NotYet == 1 ? "has not yet weighed today" : "have not yet weighed today", DailyWeightsView.NotYet, at),
            new(". "),
            Count(counts.Mine, "mine", DailyWeightsView.Mine, at),
        ];
        if (counts.PutOff > 0 || at.View == DailyWeightsView.PutOff)
        {
            parts.AddRange([new(", "), Count(counts.PutOff, "put off", DailyWeightsView.PutOff, at)]);
        }

        parts.Add(new("."));
        return parts;
    }

    private static SentencePart Count(int count, string words, DailyWeightsView view, ListAddress at)
    {
        var text = $"{count} {words}";
        var chosen = at.View == view;
        return count == 0 && !chosen
            ? new(text)
            : new(text, (at with { View = chosen ? DailyWeightsView.All : view }).Href, chosen);
    }
}
