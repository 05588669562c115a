using HfClinic.Records.DailyWeights;
using HfClinic.Web.DailyWeights;

namespace HfClinic.Web.Tests.DailyWeights;

public class CountsSentenceTests
{
    private static readonly DailyWeightsCounts Counts = new(OnList: 212, Today: 9, ThisWeek: 14, NextVisit: 3, Silent: 0, ToCheck: 1, NotYet: 41, Mine: 60, PutOff: 2);
    private static readonly ListAddress Everyone = ListAddress.Read(null, null, null);

    [Fact]
    public void It_reads_as_a_sentence() => Assert.Equal(
        "212 people weigh at home. 9 for today, 14 this week, 0 silent, 1 with a reading to check; 41 have not yet weighed today. 60 mine, 2 put off.",
        string.Concat(CountsSentence.Of(Counts, Everyone).Select(part => part.Text)));

    [Fact]
    public void A_count_of_nobody_is_said_but_leads_nowhere() =>
        Assert.Null(CountsSentence.Of(Counts, Everyone).Single(part => part.Text == "0 silent").Href);

    [Fact]
    public void The_chosen_count_leads_back_to_everyone_and_keeps_search_and_order()
    {
        var chosen = CountsSentence.Of(Counts, ListAddress.Read("today", "els", "name")).Single(part => part.Chosen);

        Assert.Equal(("9 for today", "daily-weights?q=els&sort=name"), (chosen.Text, chosen.Href));
    }
}
