using HfClinic.Records.Flags;
using HfClinic.Web.DailyWeights;

namespace HfClinic.Web.Tests.DailyWeights;

/// <summary>The entries as the summary stores them.</summary>
public class NotKnownTests
{
    private const string Trend = "Fluid gain, Early fluid gain, Trend above target weight, Fluid loss and Target weight out of step: ";
    private const string Symptoms = "Symptoms reported: no symptom report in the last 3 days";

    [Fact]
    public void Symptoms_not_asked_about_are_left_to_the_panel()
    {
        var missing = Assert.Single(NotKnown.Of(new PatientSummary { NotChecked = Symptoms }));

        Assert.Equal(("Not asked about symptoms in the last 3 days", false), (missing.Words, missing.OnRow));
    }

    [Fact]
    public void The_rules_of_the_trend_are_one_thing_and_of_the_silent_it_is_told_elsewhere()
    {
        var stored = new PatientSummary { NotChecked = $"{Trend}no weight for 13 days; {Symptoms}" };

        Assert.Equal(["Own trend: no weight for 13 days", "Not asked about symptoms in the last 3 days"], NotKnown.Of(stored).Select(missing => missing.Words));
        Assert.Equal([true, false], NotKnown.Of(stored).Select(missing => missing.OnRow));
        stored.IsSilent = true;
        Assert.Equal(["Not asked about symptoms in the last 3 days"], NotKnown.Of(stored).Select(missing => missing.Words));
    }

    [Fact]
    public void A_trend_that_learns_is_told_elsewhere()
    {
        var stored = new PatientSummary { IsLearning = true, NotChecked = $"{Trend}still learning this person's own scatter: 3 of 7 weights in 14 days" };

        Assert.Empty(NotKnown.Of(stored));
    }

    [Theory]
    [InlineData("Gain in 3 days: no weight on the 3 days before 01 Dec 2026", "gain in 3 days not known")]
    [InlineData("Above target weight and Trend above target weight: no target weight", "no target weight")]
    public void A_row_says_it_in_short(string stored, string expected)
    {
        var missing = Assert.Single(NotKnown.Of(new PatientSummary { NotChecked = stored }));

        Assert.Equal((expected, true, stored), (missing.InShort, missing.OnRow, missing.Words));
    }
}
