using HfClinic.Clinical.Values;
using HfClinic.Web.Ui;

namespace HfClinic.Web.Tests.Ui;

public class PersonWordsTests
{
    [Theory]
    [InlineData("1948-05-02", "2026-05-01", 77)]
    [InlineData("1948-05-02", "2026-05-02", 78)]
    [InlineData("1948-02-29", "2026-02-27", 77)]
    [InlineData("1948-02-29", "2026-02-28", 78)]
    [InlineData("2026-03-31", "2026-03-31", 0)]
    public void Counts_completed_years(string born, string today, int years) =>
        Assert.Equal(years, PersonWords.Age(DateOnly.Parse(born, null), DateOnly.Parse(today, null)));

    [Fact]
    public void Says_what_is_known()
    {
        var today = new DateOnly(2026, 3, 31);
        Assert.Equal("77 years, woman", PersonWords.AgeAndSex(new DateOnly(1948, 5, 2), Sex.Female, today));
        Assert.Equal("man", PersonWords.AgeAndSex(null, Sex.Male, today));
        Assert.Equal("–", PersonWords.AgeAndSex(null, Sex.NotRecorded, today));
    }
}
