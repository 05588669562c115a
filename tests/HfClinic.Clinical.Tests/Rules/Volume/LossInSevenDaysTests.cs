using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>
/// A loss of 5 lb in 7 days: US clinic leaflets ask for a report of it. Dizziness, fainting and a systolic pressure below 90
/// as reasons for haste: common practice, no source.
/// </summary>
public class LossInSevenDaysTests
{
    private readonly LossInSevenDays _rule = new();

    [Theory]
    [InlineData(2_267, Outcome.Clear)]
    [InlineData(2_268, Outcome.Fires)]
    [InlineData(2_269, Outcome.Fires)]
    public void Below_at_and_above(int loss, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-7, 80_000).Weighed(-1, 79_000).Weighed(0, 80_000 - loss)).Outcome);

    [Fact]
    public void Alone_it_is_for_this_week()
    {
        var finding = _rule.Read(AtHome.Weighed(-7, 58_500).Weighed(0, 56_100));

        Assert.Equal(("Lost 2.4 kg in 7 days", "2.3 kg (5 lb) or more in 7 days"), (finding.Statement, finding.Limit));
        Assert.Equal((Urgency.ThisWeek, 2_400m), (finding.Urgency, finding.Magnitude));
        Assert.Equal(new Evidence("Highest of the 7 days before", "58.5 kg", Today.AddDays(-7), 100), finding.Evidence[0]);
    }

    [Fact]
    public void Dizzy_and_with_a_low_pressure_it_is_for_today()
    {
        var finding = _rule.Read(AtHome.Weighed(-7, 58_500).Weighed(0, 56_100).Told(-1, Symptoms.Dizziness | Symptoms.Cough).Systolic(0, 88));

        Assert.Equal(("Lost 2.4 kg in 7 days; dizzy; systolic 88", Urgency.Today), (finding.Statement, finding.Urgency));
        Assert.Equal(
            [new Evidence("Reported", "dizzy", Today.AddDays(-1)), new Evidence("Systolic pressure", "88 mmHg", Today, 300)],
            finding.Evidence.Skip(2));
    }

    [Theory]
    [InlineData(0, 89, Urgency.Today)]
    [InlineData(0, 90, Urgency.ThisWeek)]
    [InlineData(-3, 89, Urgency.Today)]
    [InlineData(-4, 89, Urgency.ThisWeek)]
    public void A_systolic_pressure_below_90_of_the_last_3_days_makes_it_for_today(int day, int systolic, Urgency expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-7, 80_000).Weighed(0, 77_000).Systolic(day, systolic)).Urgency);

    [Theory]
    [InlineData(-3, Symptoms.Syncope, Urgency.Today)]
    [InlineData(-4, Symptoms.Syncope, Urgency.ThisWeek)]
    [InlineData(0, Symptoms.AnkleSwelling, Urgency.ThisWeek)]
    public void So_does_fainting_or_dizziness_of_the_last_3_days(int day, Symptoms symptoms, Urgency expected) =>
        Assert.Equal(expected, _rule.Read(AtHome.Weighed(-7, 80_000).Weighed(0, 77_000).Told(day, symptoms)).Urgency);

    [Fact]
    public void Without_a_day_to_compare_with_it_cannot_tell() =>
        Assert.Equal(Outcome.CannotTell, _rule.Read(AtHome.Weighed(-8, 90_000).Weighed(0, 80_000)).Outcome);
}
