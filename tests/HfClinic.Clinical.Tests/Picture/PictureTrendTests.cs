using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Picture;

public class PictureTrendTests
{
    private static PatientPicture Usual => AtHome.Target(-60, 80_000).WeighedDaily(0, About(80_000, 40));

    [Fact]
    public void It_is_computed_once_for_one_picture()
    {
        var picture = Usual;

        Assert.Same(picture.Trend, picture.Trend);
        Assert.Equal(WeightTrend.Of(DaySeries.From(picture.Weights), picture.TargetWeights, [], Today).Days, picture.Trend.Days);
    }

    [Fact]
    public void A_copy_with_other_data_has_its_own()
    {
        var picture = Usual;
        var before = picture.Trend;

        Assert.NotEqual(before.Days[^1], (picture with { Weights = AtHome.WeighedDaily(0, About(81_000, 40)).Weights }).Trend.Days[^1]);
        Assert.NotEqual(before.Days[^1].Excess, (picture with { TargetWeights = [] }).Trend.Days[^1].Excess);
        Assert.Equal(39, (picture with { AsOf = Today.AddDays(-1) }).Trend.Days.Length);
        Assert.NotEqual(before.Days[^1].State, (picture with { DischargedFromHospitalOn = Today }).Trend.Days[^1].State);
        Assert.Equal(before.Days, picture.Trend.Days);
    }

    [Fact]
    public void Asking_for_it_changes_nothing_about_the_picture()
    {
        var picture = Usual;
        var copy = picture with { };
        _ = picture.Trend;

        Assert.Equal(copy, picture);
        Assert.Equal(copy.GetHashCode(), picture.GetHashCode());
    }

    [Fact]
    public void A_discharge_starts_at_the_target_of_its_day_or_else_at_the_first_weights_after_it()
    {
        var day = Today.AddDays(-1);
        var picture = AtHome.WeighedDaily(0, [.. About(86_000, 40), 79_000, 79_400]) with { DischargedFromHospitalOn = day };

        Assert.Equal(79.2, picture.Trend.On(day)!.Value.Expected, 9);
        Assert.Equal(78, picture.Target(-50, 78_000).Trend.On(day)!.Value.Expected, 9);
        Assert.Equal(new Weight(79_000), picture.Weights[^2].Weight);
    }

    [Fact]
    public void A_discharge_yet_to_come_is_none() =>
        Assert.Equal(Usual.Trend.Days, (Usual with { DischargedFromHospitalOn = Today.AddDays(1) }).Trend.Days);
}
