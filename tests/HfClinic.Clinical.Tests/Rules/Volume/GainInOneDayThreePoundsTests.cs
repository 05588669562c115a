using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>US hospital leaflets; a rule of thumb tested by Zhang 2009. 3 lb is 1,361 g to the gram.</summary>
public class GainInOneDayThreePoundsTests
{
    private readonly GainInOneDayThreePounds _rule = new();

    private readonly ClinicProtocol _on = Defaults.With([new("weight.gain-1-day-3lb", IsOn: true)]);

    [Theory]
    [InlineData(1360, Outcome.Clear)]
    [InlineData(1361, Outcome.Fires)]
    [InlineData(1362, Outcome.Fires)]
    public void Below_at_and_above(int gain, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-2, 70_000).Weighed(-1, 80_000).Weighed(0, 80_000 + gain), _on).Outcome);

    [Fact]
    public void It_is_for_today()
    {
        var finding = _rule.Read(AtHome.Weighed(-1, 80_000).Weighed(0, 81_800), _on);

        Assert.Equal(("Gained 1.8 kg in 1 day", "1.4 kg (3 lb) or more in 1 day"), (finding.Statement, finding.Limit));
        Assert.Equal((Urgency.Today, "The day before"), (finding.Urgency, finding.Evidence[0].What));
    }

    [Fact]
    public void Without_a_weight_the_day_before_it_cannot_tell() =>
        Assert.Equal("no weight on the 1 day before 03 Mar 2026", _rule.Read(AtHome.Weighed(-2, 80_000).Weighed(0, 85_000), _on).Missing);

    [Fact]
    public void It_is_off_unless_switched_on() =>
        Assert.Empty(_rule.Assess(AtHome.Weighed(-1, 80_000).Weighed(0, 85_000), Defaults));
}
