using HfClinic.Clinical.Values;
using HfClinic.Records.DailyWeights;

namespace HfClinic.Records.Tests.DailyWeights;

public class CalledInSymptomsTests
{
    [Theory]
    [InlineData("ankles, dizzy", Symptoms.AnkleSwelling | Symptoms.Dizziness)]
    [InlineData("Swollen ankles and dizziness", Symptoms.AnkleSwelling | Symptoms.Dizziness)]
    [InlineData("breathless at rest; sleeps in a chair", Symptoms.BreathlessAtRest | Symptoms.Orthopnoea)]
    [InlineData("light-headed + cough", Symptoms.Dizziness | Symptoms.Cough)]
    [InlineData("oedéma", Symptoms.AnkleSwelling)]
    public void Words_stand_for_listed_symptoms(string typed, Symptoms expected) =>
        Assert.Equal(expected, CalledInSymptoms.Read(typed).Symptoms);

    [Fact]
    public void Every_listed_word_is_understood() => Assert.All(SymptomWords.All, entry =>
        Assert.Equal(entry.Symptom, CalledInSymptoms.Read(entry.Words).Symptoms));

    [Theory]
    [InlineData("none")]
    [InlineData("No symptoms")]
    public void None_told_is_an_answer_too(string typed)
    {
        var told = CalledInSymptoms.Read(typed);
        Assert.True(told.AskedNone);
        Assert.Equal(Symptoms.None, told.Symptoms);
    }

    [Fact]
    public void Unknown_words_are_kept_as_typed() => Assert.Equal(["itchy skin"], CalledInSymptoms.Read("ankles, itchy skin").Unknown);

    [Theory]
    [InlineData("breathless")]
    [InlineData("swelling")]
    [InlineData("SOB")]
    public void A_word_with_several_meanings_is_not_guessed(string typed)
    {
        var told = CalledInSymptoms.Read(typed);
        Assert.Equal([typed], told.Unclear);
        Assert.Equal(Symptoms.None, told.Symptoms);
    }
}
