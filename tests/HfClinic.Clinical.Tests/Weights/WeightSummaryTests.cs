using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

public class WeightSummaryTests
{
    private static readonly DateOnly Today = new(2026, 3, 3);

    [Fact]
    public void Without_a_weight_there_is_no_figure()
    {
        var summary = Of();

        Assert.Null(summary.Latest);
        Assert.Null(summary.SilentDays);
        Assert.Null(summary.Gain(3));
        Assert.Null(summary.Loss(3));
    }

    [Fact]
    public void A_gain_is_from_the_lowest_and_a_loss_from_the_highest_of_the_days_before()
    {
        var summary = Of((-3, 80_000), (-2, 79_500), (-1, 80_500), (0, 80_100));

        Assert.Equal(600, summary.Gain(3)!.Difference.Grams);
        Assert.Equal(-400, summary.Loss(3)!.Difference.Grams);
        Assert.Equal(Today.AddDays(-2), summary.Gain(3)!.Reference.Day);
        Assert.Equal(-400, summary.Gain(1)!.Difference.Grams);
    }

    [Fact]
    public void Of_several_days_alike_the_latest_is_named()
    {
        var summary = Of((-3, 80_000), (-2, 80_000), (0, 81_000));

        Assert.Equal(Today.AddDays(-2), summary.Gain(3)!.Reference.Day);
        Assert.Equal(Today.AddDays(-2), summary.Loss(3)!.Reference.Day);
    }

    [Theory]
    [InlineData(-7, true)]
    [InlineData(-8, false)]
    public void The_days_before_end_at_their_number(int day, bool counted) =>
        Assert.Equal(counted, Of((day, 80_000), (0, 81_000)).Gain(7) is not null);

    [Fact]
    public void The_latest_day_with_a_weight_counts_even_when_it_is_not_today()
    {
        var summary = Of((-6, 80_000), (-5, 82_100));

        Assert.Equal(5, summary.SilentDays);
        Assert.Equal(2_100, summary.Gain(3)!.Difference.Grams);
    }

    private static WeightSummary Of(params (int Day, int Grams)[] weights) => WeightSummary.Of(new PatientPicture
    {
        AsOf = Today,
        EnrolledOn = Today.AddYears(-1),
        Weights = [.. weights.Select((weight, index) =>
            new WeightReading(index + 1, Today.AddDays(weight.Day).ToDateTime(new TimeOnly(7, 0)), new Weight(weight.Grams)))],
    });
}
