using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Tests.Rules;

public class UrgencyWordsTests
{
    [Fact]
    public void Every_urgency_has_its_own_word() =>
        Assert.Equal(4, Enum.GetValues<Urgency>().Select(UrgencyWords.Of).Distinct().Count());
}
