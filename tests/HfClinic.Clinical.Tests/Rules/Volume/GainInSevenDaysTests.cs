using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>5 lb in 7 days: US and NHS patient leaflets; 5 lb is 2,268 g to the gram (NIST Handbook 44, Appendix C).</summary>
public class GainInSevenDaysTests
{
    private readonly GainInSevenDays _rule = new();

    [Theory]
    [InlineData(82_267, Outcome.Clear)]
    [InlineData(82_268, Outcome.Fires)]
    [InlineData(82_269, Outcome.Fires)]
    public void Below_at_and_above(int today, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-7, 80_000).Weighed(-3, 82_000).Weighed(0, today)).Outcome);

    [Fact]
    public void It_is_for_this_week()
    {
        var finding = _rule.Read(AtHome.Weighed(-7, 80_000).Weighed(0, 83_100));

        Assert.Equal(("Gained 3.1 kg in 7 days", "2.3 kg (5 lb) or more in 7 days"), (finding.Statement, finding.Limit));
        Assert.Equal(Urgency.ThisWeek, finding.Urgency);
    }

    [Fact]
    public void The_eighth_day_before_does_not_count() =>
        Assert.Equal(Outcome.CannotTell, _rule.Read(AtHome.Weighed(-8, 80_000).Weighed(0, 85_000)).Outcome);
}
