using HfClinic.Clinical.Values;
using HfClinic.Records.DailyWeights;

namespace HfClinic.Records.Tests.DailyWeights;

public class CalledInLineTests
{
    private static readonly DateTime Now = new(2026, 3, 31, 9, 0, 0, DateTimeKind.Unspecified);

    [Fact]
    public void A_full_line_is_read()
    {
        var taken = new CalledInLine { Weight = "164.5 lb", Pressure = "118/72", Pulse = "88", Symptoms = "ankles" }.Read(WeightUnit.Kilograms, Now);

        Assert.Equal(new Weight(74_616), taken.Weight);
        Assert.Equal("164.5 lb", taken.WeightAsTyped);
        Assert.Equal((118, 72, 88), (taken.SystolicPressure, taken.DiastolicPressure, taken.HeartRate));
        Assert.Equal((Symptoms.AnkleSwelling, false, Now), (taken.Symptoms, taken.AskedForSymptoms, taken.LocalTime));
    }

    [Fact]
    public void Every_field_that_cannot_be_read_is_named()
    {
        var refused = Assert.Throws<RefusedException>(() =>
            new CalledInLine { Weight = "x", Pressure = "118", Pulse = "fast", Symptoms = "breathless" }.Read(WeightUnit.Kilograms, Now));

        Assert.Equal(["Weight", "Pressure", "Pulse", "Symptoms"], refused.Problems.Select(problem => problem.Field));
    }

    [Fact]
    public void Unknown_words_are_a_note_only_when_the_person_says_so()
    {
        var line = new CalledInLine { Symptoms = "ankles, itchy" };

        Assert.Contains("“itchy”", Assert.Throws<RefusedException>(() => line.Read(WeightUnit.Kilograms, Now)).Message, StringComparison.Ordinal);
        Assert.Equal("itchy", (line with { KeepsUnknownWords = true }).Read(WeightUnit.Kilograms, Now).Note);
    }

    /// <summary>Stored without a symptom it would read as "asked, no symptoms", which was not said.</summary>
    [Fact]
    public void An_unknown_word_alone_is_never_recorded_as_no_symptoms()
    {
        var line = new CalledInLine { Symptoms = "itchy", KeepsUnknownWords = true };
        Assert.Throws<RefusedException>(() => line.Read(WeightUnit.Kilograms, Now));
    }

    [Fact]
    public void None_and_a_symptom_together_are_asked_about() =>
        Assert.Throws<RefusedException>(() => new CalledInLine { Symptoms = "none, ankles" }.Read(WeightUnit.Kilograms, Now));
}
