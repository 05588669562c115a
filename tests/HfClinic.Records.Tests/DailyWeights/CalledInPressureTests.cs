using HfClinic.Records.DailyWeights;

namespace HfClinic.Records.Tests.DailyWeights;

public class CalledInPressureTests
{
    [Theory]
    [InlineData("118/72")]
    [InlineData("118 / 72")]
    [InlineData("118 72")]
    [InlineData("118-72")]
    [InlineData("118 over 72")]
    public void Reads_both_numbers(string typed) => Assert.Equal(new CalledInPressure(118, 72), CalledInPressure.Read(typed, "Pressure", out _));

    [Theory]
    [InlineData("118")]
    [InlineData("118/")]
    [InlineData("1187/2")]
    [InlineData("118/72/60")]
    [InlineData("high")]
    public void What_cannot_be_read_is_said(string typed)
    {
        Assert.Null(CalledInPressure.Read(typed, "Pressure", out var problem));
        Assert.Equal("Pressure", problem?.Field);
    }

    [Fact]
    public void Nothing_typed_is_no_problem()
    {
        Assert.Null(CalledInPressure.Read("", "Pressure", out var problem));
        Assert.Null(problem);
    }
}
