using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>HFrEF therapy is continued in HFimpEF: ESC 2021, AHA 2022.</summary>
public class StoppedAfterImprovementTests
{
    private readonly StoppedAfterImprovement _rule = new();

    [Theory]
    [InlineData("40", Outcome.Clear)]
    [InlineData("40.4", Outcome.Clear)]
    [InlineData("40.5", Outcome.Fires)]
    [InlineData("41", Outcome.Fires)]
    [InlineData("58", Outcome.Fires)]
    public void Below_at_and_above(string ejection, Outcome expected) =>
        Assert.Equal(expected, _rule.About(Stopped(ejection, -10), TitrationClass.Mra).Outcome);

    [Theory]
    [InlineData(-31, Outcome.Clear)]
    [InlineData(-30, Outcome.Fires)]
    [InlineData(-29, Outcome.Fires)]
    public void Only_when_stopped_after_the_improvement(int stopped, Outcome expected) =>
        Assert.Equal(expected, _rule.About(Stopped("30", stopped, "55", "58"), TitrationClass.Mra).Outcome);

    [Fact]
    public void It_says_when()
    {
        var picture = Stopped("58", -20);

        Assert.Equal("MRA stopped on 11 Feb 2026, after LVEF had risen above 40 % on 02 Jan 2026", _rule.About(picture, TitrationClass.Mra).Statement);
        Assert.DoesNotContain("pillar-not-covered", picture.Firing(TitrationClass.Mra));
    }

    private static PatientPicture Stopped(string ejection, int stopped) =>
        (Well(30) with { EnrolledOn = Today.AddDays(-300) }).Ejection("25", ejection, ejection, ejection)
            .On("spironolactone", 25, 1, -250, stopped);

    private static PatientPicture Stopped(string first, int stopped, params string[] later) =>
        (Well(30) with { EnrolledOn = Today.AddDays(-300) }).Ejection([first, .. later]).On("spironolactone", 25, 1, -250, stopped);
}
