using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>ESC 2021, Table 37 (quality indicators).</summary>
public class BetaBlockerNotEvidenceBasedTests
{
    private readonly BetaBlockerNotEvidenceBased _rule = new();

    [Theory]
    [InlineData(39, Outcome.Fires)]
    [InlineData(40, Outcome.Fires)]
    [InlineData(41, Outcome.Clear)]
    public void Below_at_and_above(int ejection, Outcome expected) =>
        Assert.Equal(expected, _rule.About(Well(ejection).On("metoprolol tartrate", 100, 2, -100), TitrationClass.BetaBlocker).Outcome);

    [Theory]
    [InlineData("bisoprolol", Outcome.Clear)]
    [InlineData("carvedilol", Outcome.Clear)]
    [InlineData("nebivolol", Outcome.Clear)]
    [InlineData("metoprolol succinate", Outcome.Clear)]
    [InlineData("metoprolol", Outcome.Clear)]
    [InlineData("atenolol", Outcome.Fires)]
    [InlineData("propranolol", Outcome.Fires)]
    public void By_medicine(string medicine, Outcome expected) =>
        Assert.Equal(expected, _rule.About(Well(30).On(medicine, 50, 1, -100), TitrationClass.BetaBlocker).Outcome);

    [Fact]
    public void Once_reduced_it_still_counts_after_improvement() => Assert.Equal(
        Outcome.Fires, _rule.About(Well(30).Ejection("30", "55").On("atenolol", 50, 1, -100), TitrationClass.BetaBlocker).Outcome);
}
