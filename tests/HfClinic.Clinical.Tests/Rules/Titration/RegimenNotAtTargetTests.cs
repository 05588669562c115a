using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>90 days: ACC 2024, within 3 months when feasible.</summary>
public class RegimenNotAtTargetTests
{
    private readonly RegimenNotAtTarget _rule = new();

    [Theory]
    [InlineData(-89, Outcome.Clear)]
    [InlineData(-90, Outcome.Fires)]
    [InlineData(-91, Outcome.Fires)]
    public void Below_at_and_above(int enrolled, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(Short with { EnrolledOn = Today.AddDays(enrolled) }).Outcome);

    [Fact]
    public void It_names_what_is_short() =>
        Assert.Equal("Not at target 100 days after the first visit: beta blocker, RAS inhibitor and MRA", _rule.Read(Short).Statement);

    [Fact]
    public void Target_recorded_limit_and_hold_do_not_count()
    {
        Assert.Equal(Outcome.Clear, _rule.Read(AtTarget).Outcome);
        Assert.Equal(Outcome.Clear, _rule.Read(AtTarget.Without("bisoprolol").On("bisoprolol", 5, 1, -100).Limit(TitrationClass.BetaBlocker, -10)).Outcome);
        Assert.Equal(Outcome.Clear, _rule.Read(AtTarget.Without("ramipril").On("ramipril", 2.5m, 2, -100).Blood("potassium", -1, 5.3m)).Outcome);
    }

    [Fact]
    public void It_does_not_apply_where_the_ejection_fraction_was_never_reduced() => Assert.Empty(_rule.Assess(Well(58), Esc));
}
