using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>From 14 days after the first visit: a default of this program. The pillars: ESC 2021 and 2023, AHA 2022.</summary>
public class PillarNotCoveredTests
{
    private readonly PillarNotCovered _rule = new();

    [Theory]
    [InlineData(-13, Outcome.Clear)]
    [InlineData(-14, Outcome.Fires)]
    [InlineData(-15, Outcome.Fires)]
    [InlineData(-41, Outcome.Fires)]
    [InlineData(-42, Outcome.Clear)]
    public void Below_at_and_above(int enrolled, Outcome expected) => Assert.All(TitrationClasses.Pillars, pillar =>
        Assert.Equal(expected, _rule.About(Well(30) with { EnrolledOn = Today.AddDays(enrolled) }, pillar).Outcome));

    [Fact]
    public void It_says_since_when_and_lets_the_prescriber_decide()
    {
        var finding = _rule.About(Well(30) with { EnrolledOn = Today.AddDays(-20) }, TitrationClass.Mra);

        Assert.Equal("MRA: none taken since 11 Feb 2026; due since 25 Feb 2026", finding.Statement);
        Assert.Equal((Urgency.NextVisit, "For the prescriber's decision."), (finding.Urgency, finding.Caution));
        Assert.Single(finding.Evidence, evidence => evidence.RaisedIt);
    }

    [Theory]
    [InlineData(45)]
    [InlineData(58)]
    public void Without_a_reduced_ejection_fraction_only_the_SGLT2_inhibitor_is_looked_for(int ejection)
    {
        var picture = Well(ejection) with { EnrolledOn = Today.AddDays(-20) };

        Assert.Equal(
            [Outcome.Clear, Outcome.Clear, Outcome.Clear, Outcome.Fires],
            TitrationClasses.Pillars.Select(pillar => _rule.About(picture, pillar).Outcome));
    }

    [Fact]
    public void An_intolerance_to_one_way_leaves_the_others_and_to_all_closes_it()
    {
        var picture = Well(30) with { EnrolledOn = Today.AddDays(-20) };
        PatientPicture NotGiven(params MedicineClass[] classes) => picture with
        {
            NotGiven = [new(1, NotGivenBecause.Intolerance, [.. classes], null, "cough", Today.AddDays(-5))],
        };

        Assert.Equal(Outcome.Fires, _rule.About(NotGiven(MedicineClass.AceInhibitor), TitrationClass.RasInhibitor).Outcome);
        var closed = NotGiven(MedicineClass.AceInhibitor, MedicineClass.Arb, MedicineClass.Arni);
        Assert.Equal(Outcome.Clear, _rule.About(closed, TitrationClass.RasInhibitor).Outcome);
        Assert.Equal("RAS inhibitor: not given: intolerance recorded on 26 Feb 2026 (cough)", closed.Of(TitrationClass.RasInhibitor).Sentence);
    }

    [Fact]
    public void Without_an_ejection_fraction_it_cannot_tell() => Assert.Equal(
        "ejection fraction", _rule.About(Well(30) with { EjectionFractions = [] }, TitrationClass.Mra).Missing);
}
