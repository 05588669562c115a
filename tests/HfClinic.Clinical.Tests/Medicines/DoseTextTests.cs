using System.Globalization;
using CsCheck;
using HfClinic.Clinical.Medicines;

namespace HfClinic.Clinical.Tests.Medicines;

/// <summary>
/// Safe writing (no trailing zero, leading zero, micrograms spelled out, schedules in words) and the abbreviations understood are
/// common practice, no source.
/// </summary>
public class DoseTextTests
{
    private static readonly Medicine Arni = Formulary.BuiltIn.Find("sacubitril/valsartan")!;

    [Theory]
    [InlineData("2.5 mg twice daily", "2.5 mg twice daily")]
    [InlineData("2.5mg BID", "2.5 mg twice daily")]
    [InlineData("  2.50 MG b.i.d. ", "2.5 mg twice daily")]
    [InlineData("2,5 mg bd", "2.5 mg twice daily")]
    [InlineData(".5 mg od", "0.5 mg daily")]
    [InlineData("5.0 mg once a day", "5 mg daily")]
    [InlineData("10 mg/day", "10 mg daily")]
    [InlineData("40 mg at night", "40 mg daily")]
    [InlineData("25 mg tds", "25 mg three times daily")]
    [InlineData("75 mg 4 times a day", "75 mg four times daily")]
    [InlineData("25 mg every other day", "25 mg every other day")]
    [InlineData("25 mg alternate days", "25 mg every other day")]
    [InlineData("25 mg qod", "25 mg every other day")]
    [InlineData("1/2 tablet of 5 mg daily", "2.5 mg daily")]
    [InlineData("half a tablet of 5 mg, once daily", "2.5 mg daily")]
    [InlineData("½ tab 5 mg od", "2.5 mg daily")]
    [InlineData("1 1/2 tablets of 5 mg twice a day", "7.5 mg twice daily")]
    [InlineData("2 tablets of 20 mg daily", "40 mg daily")]
    [InlineData("2 x 20 mg daily", "40 mg daily")]
    [InlineData("5 mg tablets twice daily", "5 mg twice daily")]
    [InlineData("125 micrograms", "125 micrograms")]
    [InlineData("125 mcg daily", "125 micrograms daily")]
    [InlineData("62.5 µg od", "62.5 micrograms daily")]
    [InlineData("0,125 mg qd", "125 micrograms daily")]
    [InlineData("1 g daily", "1000 mg daily")]
    [InlineData("5 mg by mouth every 12 hours", "5 mg twice daily")]
    public void It_is_read_and_written_in_one_way(string text, string canonical)
    {
        var reading = DoseText.Read(text);

        Assert.Equal((canonical, ""), (reading.Dose?.InWords(), reading.NotUnderstood));
    }

    [Theory]
    [InlineData("24/26 bid", 50, "24/26 mg twice daily")]
    [InlineData("49/51 twice daily", 100, "49/51 mg twice daily")]
    [InlineData("97/103 mg twice daily", 200, "97/103 mg twice daily")]
    public void The_strengths_of_a_combination_are_added_and_written_as_strengths(string text, decimal sum, string canonical)
    {
        var dose = DoseText.Read(text, Arni).Dose!;

        Assert.Equal((sum, canonical), (dose.Milligrams, dose.InWords(Arni.FullName)));
    }

    [Theory]
    [InlineData("", "Nothing is written")]
    [InlineData("twice daily", "does not begin with an amount")]
    [InlineData("5 daily", "The unit is missing after 5")]
    [InlineData("5", "The unit is missing after 5")]
    [InlineData("5 ml daily", "\"ml\" is not a unit")]
    [InlineData("5 mg when needed", "\"when needed\" is not understood")]
    [InlineData("5 mg once a week", "\"once a week\" is not understood")]
    [InlineData("5 mg morning, 2.5 mg evening", "is not understood")]
    [InlineData("0 mg daily", "not above zero")]
    [InlineData("1,250 mg daily", "\"1,250\" can be read in two ways")]
    [InlineData("1/2 tablet daily", "The strength of the tablet is missing")]
    [InlineData("1/2 daily", "choose the medicine first")]
    [InlineData("1/0 tablet of 5 mg", "")]
    public void What_is_not_plain_is_asked_about(string text, string why)
    {
        var reading = DoseText.Read(text);

        Assert.Null(reading.Dose);
        Assert.Contains(why, reading.NotUnderstood);
        Assert.NotEmpty(reading.NotUnderstood);
    }

    [Fact]
    public void A_strength_of_another_medicine_is_refused() =>
        Assert.Contains("\"50/50\" is not a strength of sacubitril/valsartan", DoseText.Read("50/50 bid", Arni).NotUnderstood);

    [Fact]
    public void What_is_written_is_read_back_the_same() =>
        Gen.Select(Gen.Int[1, 40_000], Gen.Int[0, 4].Select(at => new[] { 0.5m, 1m, 2m, 3m, 4m }[at])).Sample((units, times) =>
        {
            var dose = new WrittenDose(units / 80m, times);

            Assert.Equal(dose, DoseText.Read(dose.InWords()).Dose);
        });

    [Fact]
    public void No_text_is_taken_without_an_answer() =>
        Gen.String[Gen.Char["0123456789/.,½ mgtablexodicru"], 0, 20].Sample(text =>
        {
            var reading = DoseText.Read(text);

            Assert.True(reading.Dose is null != (reading.NotUnderstood.Length == 0), text);
        });

    [Theory]
    [InlineData("sacubitril/valsartan", "100", "2", "sacubitril/valsartan 49/51 mg twice daily")]
    [InlineData("digoxin", "0.0625", "1", "digoxin 62.5 micrograms daily")]
    [InlineData("bisoprolol", "1.250", "1", "bisoprolol 1.25 mg daily")]
    [InlineData("something else", "10", "6", "something else 10 mg 6 times daily")]
    public void A_course_in_words(string medicine, string milligrams, string times, string words) =>
        Assert.Equal(words, DoseWords.Of(
            medicine, decimal.Parse(milligrams, CultureInfo.InvariantCulture), decimal.Parse(times, CultureInfo.InvariantCulture)));
}
