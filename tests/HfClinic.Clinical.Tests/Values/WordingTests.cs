using System.Globalization;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Values;

public class WordingTests
{
    [Theory]
    [InlineData(74_600, WeightUnit.Kilograms, "74.6 kg")]
    [InlineData(74_000, WeightUnit.Kilograms, "74.0 kg")]
    [InlineData(105_097, WeightUnit.Kilograms, "105.1 kg")]
    [InlineData(74_650, WeightUnit.Kilograms, "74.7 kg")]
    [InlineData(74_616, WeightUnit.Pounds, "164.5 lb")]
    public void A_weight_has_one_decimal_and_a_space_before_its_unit(int grams, WeightUnit unit, string expected) =>
        Assert.Equal(expected, Wording.Weight(new Weight(grams), unit));

    [Theory]
    [InlineData(400, "+0.4")]
    [InlineData(-500, "−0.5")]
    [InlineData(0, "0.0")]
    [InlineData(-49, "0.0")]
    [InlineData(49, "0.0")]
    [InlineData(-50, "−0.1")]
    public void A_change_has_its_sign(int grams, string expected) =>
        Assert.Equal(expected, Wording.Change(new Weight(grams), WeightUnit.Kilograms));

    [Theory]
    [InlineData(2_600, 2_000, "2.6 kg")]
    [InlineData(2_040, 2_000, "2.04 kg")]
    [InlineData(2_001, 2_000, "2.001 kg")]
    [InlineData(2_268, 2_268, "2.3 kg")]
    public void A_size_is_written_so_that_it_can_be_told_from_its_limit(int grams, int limit, string expected) =>
        Assert.Equal(expected, Wording.SizeBeside(new Weight(grams), new Weight(limit), WeightUnit.Kilograms));

    [Theory]
    [InlineData("de-DE")]
    [InlineData("ar-SA")]
    public void The_language_of_the_server_does_not_matter(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
        try
        {
            Assert.Equal("03 Mar 2026", Wording.Day(new DateOnly(2026, 3, 3)));
            Assert.Equal("Tuesday 03 Mar 2026", Wording.LongDay(new DateOnly(2026, 3, 3)));
            Assert.Equal("07:12", Wording.Time(new DateTime(2026, 3, 3, 7, 12, 59)));
            Assert.Equal("03 Mar", Wording.ShortDay(new DateOnly(2026, 3, 3)));
            Assert.Equal("74.6 kg", Wording.Weight(new Weight(74_600), WeightUnit.Kilograms));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Theory]
    [InlineData(1, "1 day")]
    [InlineData(6, "6 days")]
    public void Days_are_counted(int number, string expected) => Assert.Equal(expected, Wording.Days(number));

    [Theory]
    [InlineData(Symptoms.None, "")]
    [InlineData(Symptoms.AnkleSwelling, "ankles swollen")]
    [InlineData(Symptoms.AnkleSwelling | Symptoms.BreathlessAtRest, "breathless at rest and ankles swollen")]
    [InlineData(Symptoms.Cough | Symptoms.Dizziness | Symptoms.Syncope, "fainted, dizzy and cough")]
    public void Symptoms_are_joined_gravest_first(Symptoms symptoms, string expected) =>
        Assert.Equal(expected, SymptomWords.List(symptoms));

    [Fact]
    public void Every_symptom_has_words() =>
        Assert.Equal(Enum.GetValues<Symptoms>().Except([Symptoms.None]).Order(), SymptomWords.All.Select(entry => entry.Symptom).Order());
}
