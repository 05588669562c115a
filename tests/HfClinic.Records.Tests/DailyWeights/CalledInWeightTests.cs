using HfClinic.Clinical.Values;
using HfClinic.Records.DailyWeights;

namespace HfClinic.Records.Tests.DailyWeights;

/// <summary>
/// One pound is 453.59237 g and one stone 14 lb, exact by definition (NIST Handbook 44, Appendix C);
/// the kilograms were worked out from that by hand.
/// </summary>
public class CalledInWeightTests
{
    [Theory]
    [InlineData("74.6", 74_600)]
    [InlineData("74,6", 74_600)]
    [InlineData(" 74.6kg ", 74_600)]
    [InlineData("74 kilos", 74_000)]
    [InlineData("164.5 lb", 74_616)]
    [InlineData("164,5LBS", 74_616)]
    [InlineData("165 pounds", 74_843)]
    [InlineData("11 st 10 lb", 74_389)]
    [InlineData("11st 10", 74_389)]
    [InlineData("11 stone", 69_853)]
    [InlineData("74.625", 74_625)]
    public void Reads_what_people_say(string typed, int grams) =>
        Assert.Equal(grams, CalledInWeight.Read(typed, WeightUnit.Kilograms, "Weight", out _)?.Weight.Grams);

    [Theory]
    [InlineData("164.5", WeightUnit.Pounds, "164.5 lb", "164.5 lb = 74.6 kg")]
    [InlineData("164.5", WeightUnit.Kilograms, "164.5 kg", "164.5 kg = 362.7 lb")]
    [InlineData("74.6 kg", WeightUnit.Pounds, "74.6 kg", "74.6 kg = 164.5 lb")]
    [InlineData("11 st 10 lb", WeightUnit.Kilograms, "11 st 10 lb", "11 st 10 lb = 74.4 kg")]
    public void A_number_alone_is_in_the_clinics_unit_and_the_other_stands_beside_it(string typed, WeightUnit usual, string kept, string words)
    {
        var read = CalledInWeight.Read(typed, usual, "Weight", out _);

        Assert.Equal((kept, words), (read?.Typed, read?.Words));
    }

    [Theory]
    [InlineData("seventy")]
    [InlineData("74.6 g")]
    [InlineData("74.6 kg lb")]
    [InlineData("7 4.6")]
    [InlineData("-74.6")]
    [InlineData("1,234")]
    [InlineData("11 st 14 lb")]
    [InlineData("٧٤")]
    public void What_cannot_be_read_is_said_with_its_field_and_never_guessed(string typed)
    {
        Assert.Null(CalledInWeight.Read(typed, WeightUnit.Kilograms, "Weight", out var problem));
        Assert.Equal("Weight", problem?.Field);
        Assert.Contains(typed, problem!.What, StringComparison.Ordinal);
        Assert.NotEmpty(problem.Mend);
    }

    [Fact]
    public void Nothing_typed_is_no_weight_and_no_problem()
    {
        Assert.Null(CalledInWeight.Read("  ", WeightUnit.Kilograms, "Weight", out var problem));
        Assert.Null(problem);
    }
}
