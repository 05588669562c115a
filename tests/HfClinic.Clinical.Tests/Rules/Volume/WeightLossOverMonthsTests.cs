using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>5 % of body weight in 6 months: an article for patients. The days back are a default of this program.</summary>
public class WeightLossOverMonthsTests
{
    private readonly WeightLossOverMonths _rule = new();

    [Theory]
    [InlineData(76_001, Outcome.Clear)]
    [InlineData(76_000, Outcome.Fires)]
    [InlineData(75_999, Outcome.Fires)]
    public void Below_at_and_above(int now, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(From80To(now).Told(-20, Symptoms.PoorAppetite)).Outcome);

    [Fact]
    public void It_asks_another_question_than_a_loss_of_fluid()
    {
        var finding = _rule.Read(From80To(75_000).Told(-20, Symptoms.PoorAppetite));

        Assert.Equal("Lost 5.0 kg (6.3 %) over 6 months, poor appetite reported 11 Feb: a question of wasting, apart from fluid", finding.Statement);
        Assert.Equal("5 % or more over 6 months, with poor appetite", finding.Limit);
        Assert.Equal(Urgency.NextVisit, finding.Urgency);
    }

    [Theory]
    [InlineData(-60, Symptoms.PoorAppetite, Outcome.Fires)]
    [InlineData(-61, Symptoms.PoorAppetite, Outcome.Clear)]
    [InlineData(-1, Symptoms.Nausea, Outcome.Clear)]
    public void Poor_appetite_must_have_been_told_in_the_last_60_days(int day, Symptoms told, Outcome expected) =>
        Assert.Equal(expected, _rule.Read(From80To(75_000).Told(day, told)).Outcome);

    [Fact]
    public void A_loss_with_signs_of_over_diuresis_is_asked_about_first()
    {
        var falling = AtHome.Target(-190, 80_000).WeighedDaily(-170, About(80_000, 20))
            .WeighedDaily(0, [.. About(75_000, 40), 74_000, 73_000, 72_000, 71_000]).Told(-1, Symptoms.PoorAppetite);

        Assert.Equal(Outcome.Fires, _rule.Read(falling).Outcome);
        Assert.Equal(Outcome.Clear, _rule.Read(falling.Told(0, Symptoms.Dizziness)).Outcome);
    }

    [Fact]
    public void Without_weights_then_or_now_it_cannot_tell()
    {
        var told = AtHome.Told(0, Symptoms.PoorAppetite);

        Assert.Equal("no weights of 6 months ago", _rule.Read(told.WeighedDaily(0, About(80_000, 40))).Missing);
        Assert.Equal("fewer than 3 weights in the last 14 days", _rule.Read(told.WeighedDaily(-12, About(80_000, 40))).Missing);
    }

    private static PatientPicture From80To(int now) =>
        AtHome.WeighedDaily(-180, [80_000, 80_000, 80_000]).WeighedDaily(0, [now, now, now]);
}
