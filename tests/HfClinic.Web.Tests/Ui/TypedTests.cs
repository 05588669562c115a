using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Web.Ui;

namespace HfClinic.Web.Tests.Ui;

public class TypedTests
{
    private static readonly DateOnly Today = new(2026, 3, 31);

    [Theory]
    [InlineData("03 Mar 2026", "2026-03-03")]
    [InlineData(" 3  mar 2026 ", "2026-03-03")]
    [InlineData("3 March 2026", "2026-03-03")]
    [InlineData("2026-03-03", "2026-03-03")]
    [InlineData("Today", "2026-03-31")]
    [InlineData("yesterday", "2026-03-30")]
    public void Reads_a_day_that_is_sure(string typed, string day) =>
        Assert.Equal(DateOnly.Parse(day, null), Typed.Day([], "Day", typed, Today));

    [Theory]
    [InlineData("03/04/2026")]
    [InlineData("31 Feb 2026")]
    [InlineData("3.4.2026")]
    [InlineData("soon")]
    public void Asks_about_a_day_that_is_not(string typed)
    {
        var problems = new List<Problem>();
        Assert.Null(Typed.Day(problems, "Day", typed, Today));
        Assert.Contains(typed, Assert.Single(problems).What);
        Assert.Contains("31 Mar 2026", problems[0].Mend);
    }

    // One pound is 453.59237 g (NIST Handbook 44, Appendix C): 164.5 lb = 74,615.94 g.
    [Theory]
    [InlineData("74.6", WeightUnit.Kilograms, 74_600)]
    [InlineData("74,6 kg", WeightUnit.Pounds, 74_600)]
    [InlineData("164.5 lb", WeightUnit.Kilograms, 74_616)]
    [InlineData("164.5", WeightUnit.Pounds, 74_616)]
    [InlineData("164.5 LBS", WeightUnit.Kilograms, 74_616)]
    public void Reads_a_weight_in_the_unit_typed_or_else_the_clinics(string typed, WeightUnit unit, int grams) =>
        Assert.Equal(grams, Typed.Weight([], "Weight", typed, unit)?.Grams);

    [Theory]
    [InlineData("")]
    [InlineData("-70")]
    [InlineData("70 kg 5")]
    [InlineData("7,0.5")]
    public void Asks_about_a_weight_it_cannot_read(string typed)
    {
        var problems = new List<Problem>();
        Assert.Null(Typed.Weight(problems, "Weight", typed, WeightUnit.Kilograms));
        Assert.Equal("Weight", Assert.Single(problems).Field);
    }
}
