using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>NHS trust leaflets, 2 to 3 lb overnight. 2 lb is 907 g to the gram.</summary>
public class GainInOneDayTwoPoundsTests
{
    private readonly GainInOneDayTwoPounds _rule = new();

    private readonly ClinicProtocol _on = Defaults.With([new("weight.gain-1-day-2lb", IsOn: true)]);

    [Theory]
    [InlineData(906, Outcome.Clear)]
    [InlineData(907, Outcome.Fires)]
    [InlineData(908, Outcome.Fires)]
    public void Below_at_and_above(int gain, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-2, 70_000).Weighed(-1, 80_000).Weighed(0, 80_000 + gain), _on).Outcome);

    [Fact]
    public void It_is_for_today()
    {
        var finding = _rule.Read(AtHome.Weighed(-1, 80_000).Weighed(0, 81_800), _on);

        Assert.Equal(("Gained 1.8 kg in 1 day", "0.9 kg (2 lb) or more in 1 day"), (finding.Statement, finding.Limit));
        Assert.Equal((Urgency.Today, "The day before"), (finding.Urgency, finding.Evidence[0].What));
    }

    [Fact]
    public void Without_a_weight_the_day_before_it_cannot_tell() =>
        Assert.Equal("no weight on the 1 day before 03 Mar 2026", _rule.Read(AtHome.Weighed(-2, 80_000).Weighed(0, 85_000), _on).Missing);

    [Fact]
    public void It_is_off_unless_switched_on() =>
        Assert.Empty(_rule.Assess(AtHome.Weighed(-1, 80_000).Weighed(0, 85_000), Defaults));
}
