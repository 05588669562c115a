using System.Globalization;
using HfClinic.Clinical.Rules;
using HfClinic.Web.Ui;

namespace HfClinic.Web.Tests.Ui;

/// <summary>Dates, signs and decimals as the clinic's own writing rules ask (ISMP list of error-prone abbreviations: no bare day-month numbers).</summary>
public class WordingTests
{
    [Fact]
    public void A_day_is_spelled_the_same_under_any_culture()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal("03 Mar 2026", Wording.Day(new DateOnly(2026, 3, 3)));
            Assert.Equal("Tuesday 03 Mar 2026", Wording.LongDay(new DateOnly(2026, 3, 3)));
            Assert.Equal("74.6", Wording.Kilograms(74_600));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Theory]
    [InlineData(3_100, "+3.1")]
    [InlineData(-400, "−0.4")]
    [InlineData(0, "0.0")]
    [InlineData(-49, "0.0")]
    [InlineData(49, "0.0")]
    [InlineData(50, "+0.1")]
    [InlineData(-50, "−0.1")]
    public void A_change_has_its_sign_unless_it_rounds_to_nothing(int grams, string expected) =>
        Assert.Equal(expected, Wording.Change(grams));

    [Fact]
    public void Every_urgency_has_its_own_word() =>
        Assert.Equal(4, Enum.GetValues<Urgency>().Select(Wording.Name).Distinct().Count());
}
