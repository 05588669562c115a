using HfClinic.Records.Exchange;

namespace HfClinic.Records.Tests.Exchange;

/// <summary>ISO 8601 and month names are read as they stand; two numbers and a year never without an answer, unless one reading is left.</summary>
public class DateTextTests
{
    [Theory]
    [InlineData("2026-03-31", null)]
    [InlineData("2026-03-31 07:05:09", "07:05:09")]
    [InlineData("2026-03-31T07:05", "07:05:00")]
    [InlineData("2026/3/31 7:05", "07:05:00")]
    [InlineData("20260331", null)]
    [InlineData("31 Mar 2026", null)]
    [InlineData("31-March-2026 7:05 pm", "19:05:00")]
    [InlineData("March 31, 2026 12:01 am", "00:01:00")]
    [InlineData("31.03.2026 07:05", "07:05:00")]
    [InlineData("03/31/2026 07:05", "07:05:00")]
    public void Dates_with_one_reading_are_read(string text, string? time)
    {
        var read = DateText.Read(text, order: null);
        Assert.Equal((DateOutcome.Read, new DateOnly(2026, 3, 31)), (read.Outcome, read.Day));
        Assert.Equal(time, read.Time?.ToString("HH:mm:ss", System.Globalization.CultureInfo.InvariantCulture));
    }

    [Theory]
    [InlineData("03/04/2026", "Ambiguous")]
    [InlineData("3.4.2026 07:00", "Ambiguous")]
    [InlineData("03/04/26", "TwoDigitYear")]
    [InlineData("2026-02-30", "NoSuchDate")]
    [InlineData("31/31/2026", "NoSuchDate")]
    [InlineData("2026-13-01", "NoSuchDate")]
    [InlineData("0000-01-01", "NoSuchDate")]
    [InlineData("2026-03-31 25:00", "NoSuchTime")]
    [InlineData("2026-03-31 13:00 pm", "NoSuchTime")]
    [InlineData("yesterday", "NotADate")]
    [InlineData("2026-3/1", "NotADate")]
    [InlineData("2026111", "NotADate")]
    [InlineData("31 Foo 2026", "NotADate")]
    [InlineData("", "NotADate")]
    public void Others_are_told_apart(string text, string outcome) => Assert.Equal(outcome, DateText.Read(text, order: null).Outcome.ToString());

    [Fact]
    public void The_answer_decides_and_binds()
    {
        Assert.Equal(new DateOnly(2026, 4, 3), DateText.Read("03/04/2026", DateOrder.DayFirst).Day);
        Assert.Equal(new DateOnly(2026, 3, 4), DateText.Read("03/04/2026", DateOrder.MonthFirst).Day);
        Assert.Equal(DateOutcome.NoSuchDate, DateText.Read("03/25/2026", DateOrder.DayFirst).Outcome);
    }

    [Theory]
    [InlineData("2026-03-31T07:05:00Z", 0)]
    [InlineData("2026-03-31T07:05:00+01:00", 60)]
    [InlineData("2026-03-31T07:05:00.250-0530", -330)]
    public void The_distance_from_UTC_is_kept(string text, int minutes) =>
        Assert.Equal(TimeSpan.FromMinutes(minutes), DateText.Read(text, order: null).Offset);
}
