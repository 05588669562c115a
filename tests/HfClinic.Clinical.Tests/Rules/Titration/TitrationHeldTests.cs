using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Potassium above 5.0 mmol/L: ESC 2021 supplement, second-hand. All limits: HoldBoundaryTests.</summary>
public class TitrationHeldTests
{
    private readonly TitrationHeld _rule = new();

    [Theory]
    [InlineData(4.9, Outcome.Clear)]
    [InlineData(5.0, Outcome.Clear)]
    [InlineData(5.1, Outcome.Fires)]
    public void Below_at_and_above(decimal potassium, Outcome expected) =>
        Assert.Equal(expected, _rule.About(Short.Blood("potassium", -1, potassium), TitrationClass.RasInhibitor).Outcome);

    [Fact]
    public void It_says_what_holds_with_its_source()
    {
        var finding = _rule.About(Short.Blood("potassium", -1, 5.3m), TitrationClass.RasInhibitor);

        Assert.StartsWith("RAS inhibitor: held: potassium 5.3 mmol/L on 02 Mar 2026 (limit: above 5.0 mmol/L; caution to start or raise); below target", finding.Statement);
        Assert.Equal((Urgency.ForInformation, "above 5.0 mmol/L"), (finding.Urgency, finding.Limit));
        Assert.Contains("esc-2021-supplement", finding.SourceKeys);
        Assert.Equal("potassium 5.3 mmol/L on 02 Mar 2026", Assert.Single(finding.Evidence, evidence => evidence.RaisedIt).Value);
    }

    [Fact]
    public void At_target_nothing_is_held() =>
        Assert.Equal(Outcome.Clear, _rule.About(AtTarget.Blood("potassium", -1, 5.3m), TitrationClass.RasInhibitor).Outcome);
}
