using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>ESC 2021, Table 37 counts the succinate only; both salts share their codes.</summary>
public class SaltNotRecordedTests
{
    private readonly SaltNotRecorded _rule = new();

    [Theory]
    [InlineData(40, "metoprolol", Outcome.Fires)]
    [InlineData(41, "metoprolol", Outcome.Clear)]
    [InlineData(40, "metoprolol succinate", Outcome.Clear)]
    [InlineData(40, "metoprolol tartrate", Outcome.Clear)]
    public void Below_at_and_above(int ejection, string medicine, Outcome expected) =>
        Assert.Equal(expected, _rule.About(Well(ejection).On(medicine, 100, 1, -100), TitrationClass.BetaBlocker).Outcome);

    [Fact]
    public void The_pillar_is_not_counted_and_no_percent_is_given()
    {
        var reading = Well(30).On("metoprolol", 200, 1, -100).Of(TitrationClass.BetaBlocker);

        Assert.Equal((TitrationState.CannotTell, null), (reading.State, reading.Percent));
        Assert.Equal("beta blocker: cannot tell: salt of metoprolol not recorded: succinate and tartrate differ", reading.Sentence);
    }

    [Fact]
    public void Perindopril_covers_the_pillar_whatever_its_salt() => Assert.Equal(
        ["salt-not-recorded"], Well(30).On("perindopril", 4, 1, -100).Firing(TitrationClass.RasInhibitor));
}
