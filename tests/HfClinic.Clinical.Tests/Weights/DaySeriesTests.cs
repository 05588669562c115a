using CsCheck;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>The choice of the day's weight is a convention of this program; morning weighing is common practice, no source.</summary>
public class DaySeriesTests
{
    private static readonly DateOnly Monday = new(2026, 3, 2);

    [Theory]
    [InlineData("02:59", "09:00", 2)]
    [InlineData("03:00", "09:00", 1)]
    [InlineData("12:00", "14:00", 1)]
    [InlineData("02:00", "12:00", 1)]
    [InlineData("00:10", "11:59", 2)]
    public void TheFirstMorningReadingCountsElseTheFirstOfTheDay(string first, string second, int chosen)
    {
        var series = DaySeries.From([At(1, Monday, first, 80_100), At(2, Monday, second, 80_200)]);

        Assert.Equal([new DayWeight(Monday, chosen == 1 ? 80_100 : 80_200)], series);
    }

    [Fact]
    public void HeldReadingsDoNotCount()
    {
        var held = new HeldReading(HoldReason.Unexplained, Monday.ToDateTime(new TimeOnly(7, 0)));

        var series = DaySeries.From(
        [
            At(1, Monday, "07:00", 96_000) with { Held = held },
            At(2, Monday, "20:00", 80_400),
            At(3, Monday.AddDays(1), "07:00", 96_000) with { Held = held },
        ]);

        Assert.Equal([new DayWeight(Monday, 80_400)], series);
    }

    [Fact]
    public void TheOrderOfArrivalDoesNotMatter()
    {
        var reading = Gen.Select(Gen.Long[1, 1000], Gen.Int[0, 20], Gen.Int[0, 1439], Gen.Int[60_000, 90_000])
            .Select((id, day, minute, grams) => new WeightReading(id, Monday.AddDays(day).ToDateTime(TimeOnly.MinValue).AddMinutes(minute), new Weight(grams)));
        var readings = reading.Array[0, 40].Select(all => all.DistinctBy(one => one.Id).ToArray());

        Gen.Select(readings, Gen.Int).Sample((inOrder, seed) =>
        {
            var shuffled = inOrder.ToArray();
            new Random(seed).Shuffle(shuffled);
            Assert.Equal(DaySeries.From(inOrder), DaySeries.From(shuffled));
        });
    }

    private static WeightReading At(long id, DateOnly day, string time, int grams) =>
        new(id, day.ToDateTime(TimeOnly.ParseExact(time, "HH:mm", System.Globalization.CultureInfo.InvariantCulture)), new Weight(grams));
}
