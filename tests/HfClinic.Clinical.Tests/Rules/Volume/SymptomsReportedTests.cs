using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>
/// Breathlessness goes before admission more than weight does: Howie-Esquivel 2019. How soon each symptom is looked at is a
/// default of this program, no published source.
/// </summary>
public class SymptomsReportedTests
{
    private readonly SymptomsReported _rule = new();

    [Theory]
    [InlineData(-2, true)]
    [InlineData(-3, true)]
    [InlineData(-4, false)]
    public void A_report_below_at_and_above_3_days_ago(int day, bool counts) =>
        Assert.Equal(counts, _rule.Assess(AtHome.Told(day, Symptoms.AnkleSwelling), Defaults).Any(finding => finding.Outcome == Outcome.Fires));

    [Theory]
    [InlineData(Symptoms.BreathlessAtRest, Urgency.Today)]
    [InlineData(Symptoms.Orthopnoea, Urgency.Today)]
    [InlineData(Symptoms.NightBreathlessness, Urgency.Today)]
    [InlineData(Symptoms.Syncope, Urgency.Today)]
    [InlineData(Symptoms.ChestPain, Urgency.Today)]
    [InlineData(Symptoms.BreathlessOnExertion, Urgency.ThisWeek)]
    [InlineData(Symptoms.AnkleSwelling, Urgency.ThisWeek)]
    [InlineData(Symptoms.AbdominalSwelling, Urgency.ThisWeek)]
    [InlineData(Symptoms.Dizziness, Urgency.ThisWeek)]
    [InlineData(Symptoms.Palpitations, Urgency.ThisWeek)]
    [InlineData(Symptoms.PoorAppetite, Urgency.NextVisit)]
    [InlineData(Symptoms.Nausea, Urgency.NextVisit)]
    [InlineData(Symptoms.Fatigue, Urgency.NextVisit)]
    [InlineData(Symptoms.Cough, Urgency.ForInformation)]
    public void Each_symptom_has_its_urgency(Symptoms symptom, Urgency expected) =>
        Assert.Equal(expected, Fired(symptom).Urgency);

    [Fact]
    public void Every_symptom_belongs_to_one_matter() =>
        Assert.All(SymptomWords.All, entry => Fired(entry.Symptom));

    [Fact]
    public void Symptoms_of_one_matter_are_one_finding_the_gravest_first()
    {
        var picture = AtHome.Told(-2, Symptoms.BreathlessOnExertion).Told(-1, Symptoms.Orthopnoea | Symptoms.AnkleSwelling);

        var findings = _rule.Assess(picture, Defaults).Where(finding => finding.Outcome == Outcome.Fires).ToList();

        Assert.Equal(["breathlessness", "swelling"], findings.Select(finding => finding.Subject));
        Assert.Equal("Breathless lying flat and breathless on exertion, reported 02 Mar", findings[0].Statement);
        Assert.Equal((Urgency.Today, 2m), (findings[0].Urgency, findings[0].Magnitude));
        Assert.Equal(
            [
                new Evidence("Reported", "breathless on exertion", Today.AddDays(-2)),
                new Evidence("Reported", "breathless lying flat", Today.AddDays(-1), RaisedIt: true),
            ],
            findings[0].Evidence);
    }

    [Fact]
    public void With_a_gain_of_weight_the_change_stands_beside_it()
    {
        var picture = AtHome.Weighed(-3, 71_900).Weighed(0, 74_500).Told(0, Symptoms.AnkleSwelling);

        var finding = _rule.Assess(picture, Defaults).Single(one => one.Outcome == Outcome.Fires);

        Assert.Equal("Ankles swollen", finding.Statement);
        Assert.Contains(new Evidence("Weight against the lowest of the 3 days before", "+2.6 kg", Today, 101), finding.Evidence);
    }

    [Theory]
    [InlineData(Symptoms.ChestPain, true)]
    [InlineData(Symptoms.Syncope, true)]
    [InlineData(Symptoms.BreathlessOnExertion, false)]
    public void Chest_pain_and_fainting_get_a_word_of_caution(Symptoms symptom, bool cautioned) =>
        Assert.Equal(cautioned, Fired(symptom).Caution.Contains("emergency services", StringComparison.Ordinal));

    [Fact]
    public void Asked_and_none_is_clear() =>
        Assert.All(_rule.Assess(AtHome.Told(0, Symptoms.None), Defaults), finding => Assert.Equal(Outcome.Clear, finding.Outcome));

    [Fact]
    public void Not_asked_it_cannot_tell() =>
        Assert.Equal("no symptom report in the last 3 days", _rule.Read(AtHome.Told(-4, Symptoms.Cough)).Missing);

    private Finding Fired(Symptoms symptom) =>
        _rule.Assess(AtHome.Told(0, symptom), Defaults).Single(finding => finding.Outcome == Outcome.Fires);
}
