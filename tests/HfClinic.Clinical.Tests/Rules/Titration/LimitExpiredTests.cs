using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>More than 180 days: follow-up at most 6 months apart, ESC 2021, 9.5.1.</summary>
public class LimitExpiredTests
{
    private readonly LimitExpired _rule = new();

    [Theory]
    [InlineData(-179, Outcome.Clear)]
    [InlineData(-180, Outcome.Clear)]
    [InlineData(-181, Outcome.Fires)]
    public void Below_at_and_above(int recorded, Outcome expected) => Assert.Equal(
        expected, _rule.About(Short.Limit(TitrationClass.BetaBlocker, recorded), TitrationClass.BetaBlocker).Outcome);

    [Theory]
    [InlineData(0, Outcome.Clear)]
    [InlineData(-1, Outcome.Fires)]
    public void Its_own_last_day_goes_before(int expires, Outcome expected) => Assert.Equal(
        expected, _rule.About(Short.Limit(TitrationClass.BetaBlocker, -20, expires), TitrationClass.BetaBlocker).Outcome);

    [Fact]
    public void It_names_the_reason() => Assert.Equal(
        "beta blocker: limit recorded by Dr Invented on 22 Aug 2025 (dizzy at the next step) stood until 18 Feb 2026",
        _rule.About(Short.Limit(TitrationClass.BetaBlocker, -193), TitrationClass.BetaBlocker).Statement);

    [Fact]
    public void At_target_or_with_a_newer_one_it_is_past()
    {
        Assert.Equal(Outcome.Clear, _rule.About(AtTarget.Limit(TitrationClass.BetaBlocker, -190), TitrationClass.BetaBlocker).Outcome);
        Assert.Equal(Outcome.Clear, _rule.About(
            Short.Limit(TitrationClass.BetaBlocker, -190).Limit(TitrationClass.BetaBlocker, -5), TitrationClass.BetaBlocker).Outcome);
    }
}
