using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>42 days (MRA 84), counted anew when a hold has cleared: defaults of this program.</summary>
public class TitrationOverdueTests
{
    private readonly TitrationOverdue _rule = new();

    [Theory]
    [InlineData("bisoprolol", 2.5, TitrationClass.BetaBlocker, 42)]
    [InlineData("ramipril", 2.5, TitrationClass.RasInhibitor, 42)]
    [InlineData("spironolactone", 12.5, TitrationClass.Mra, 84)]
    public void Below_at_and_above(string medicine, decimal milligrams, TitrationClass titration, int days)
    {
        PatientPicture After(int count) => Well(30).On(medicine, milligrams, 1, -count);

        Assert.Equal(Outcome.Clear, _rule.About(After(days - 1), titration).Outcome);
        Assert.Equal(Outcome.Fires, _rule.About(After(days), titration).Outcome);
        Assert.Equal(Outcome.Fires, _rule.About(After(days + 1), titration).Outcome);
        Assert.Equal(Urgency.ThisWeek, _rule.About(After(days), titration).Urgency);
    }

    [Theory]
    [InlineData(-41, Outcome.Clear)]
    [InlineData(-42, Outcome.Fires)]
    public void An_absent_pillar(int enrolled, Outcome expected) => Assert.Equal(
        expected, _rule.About(Well(30) with { EnrolledOn = Today.AddDays(enrolled) }, TitrationClass.Sglt2Inhibitor).Outcome);

    /// <summary>Potassium above the limit on day −60, back within it on the given day.</summary>
    [Theory]
    [InlineData(-43, true)]
    [InlineData(-42, true)]
    [InlineData(-41, false)]
    public void The_clock_starts_anew_when_a_hold_clears(int cleared, bool overdue)
    {
        var reading = (Short with { BloodTests = [] }).Blood("creatinine", -80, 88).Blood("potassium", -60, 5.3m)
            .Blood("potassium", cleared, 4.8m).Of(TitrationClass.RasInhibitor);

        Assert.Equal((TitrationState.Due, overdue), (reading.State, reading.IsOverdue));
    }

    [Fact]
    public void It_is_stopped_while_held() => Assert.Equal(
        Outcome.Clear, _rule.About(Short.Blood("potassium", -1, 5.3m), TitrationClass.RasInhibitor).Outcome);
}
