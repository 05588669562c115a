using Bunit;
using HfClinic.Clinical.Values;
using HfClinic.Web.Ui;

namespace HfClinic.Web.Tests.Ui;

public class WeightStripTests : BunitContext
{
    private static readonly DateOnly From = new(2026, 11, 4);
    private static readonly DateOnly To = new(2026, 12, 1);

    [Fact]
    public void Says_its_numbers_in_words()
    {
        var label = Draw(new()
        {
            From = From,
            To = To,
            Readings = [new(From, 71_400), new(From.AddDays(1), 70_900), new(To.AddDays(-1), 141_600, Held: true), new(To, 74_600, Raised: true)],
            Targets = [new(new DateOnly(2026, 11, 3), 71_500)],
            DiureticChanges = [new(new DateOnly(2026, 11, 23), "furosemide 80 → 40 mg daily")],
        }).Find("svg").GetAttribute("aria-label");

        Assert.Equal(
            "Weights from 04 Nov 2026 to 01 Dec 2026, 28 days: 3 weights, first 71.4 kg on 04 Nov 2026, last 74.6 kg on 01 Dec 2026, " +
            "lowest 70.9 kg, highest 74.6 kg. 24 days without a weight. Target 71.5 kg. 1 weight raised a flag. " +
            "141.6 kg on 30 Nov 2026 is held to be checked. 23 Nov 2026: furosemide 80 → 40 mg daily.",
            label);
    }

    [Fact]
    public void Marks_raised_held_and_missing_by_shape_as_well_as_colour()
    {
        var strip = Draw(new()
        {
            From = From,
            To = To,
            Readings = [new(From, 71_400), new(To.AddDays(-1), 141_600, Held: true), new(To, 74_600, Raised: true)],
        });

        Assert.Single(strip.FindAll("circle.strip-dot"));
        Assert.Equal("2.6", strip.Find("circle.strip-raised").GetAttribute("r"));
        Assert.Equal("3.2", strip.Find("circle.strip-held").GetAttribute("r"));
        Assert.Equal(25, strip.FindAll("line.strip-missing").Count);
    }

    [Fact]
    public void Days_before_or_after_the_expected_ones_are_not_missing()
    {
        var strip = Draw(new() { From = From, To = To, ExpectedFrom = To.AddDays(-4), ExpectedTo = To.AddDays(-1), Readings = [new(To.AddDays(-2), 70_000)] });

        Assert.Equal(3, strip.FindAll("line.strip-missing").Count);
    }

    [Fact]
    public void A_held_reading_does_not_stretch_the_scale_and_stays_inside()
    {
        WeightStripData calm = new() { From = From, To = To, Readings = [new(From, 71_400)] };
        var wild = calm with { Readings = calm.Readings.Add(new(To, 141_600, Held: true)) };

        Assert.Equal(Draw(calm).Find("circle.strip-dot").GetAttribute("cy"), Draw(wild).Find("circle.strip-dot").GetAttribute("cy"));
        Assert.Equal("4.0", Draw(wild).Find("circle.strip-held").GetAttribute("cy"));
    }

    [Fact]
    public void Each_target_has_its_step()
    {
        var strip = Draw(new() { From = From, To = To, Targets = [new(From.AddDays(-60), 72_000), new(To.AddDays(-7), 71_000), new(To.AddDays(3), 60_000)] });

        Assert.Equal(2, strip.FindAll("rect.strip-band").Count);
    }

    [Fact]
    public void Weights_and_changes_outside_the_strip_are_not_drawn()
    {
        var strip = Draw(new() { From = From, To = To, Readings = [new(From.AddDays(-1), 71_400)], DiureticChanges = [new(To.AddDays(1), "stopped")] });

        Assert.Empty(strip.FindAll("circle"));
        Assert.Empty(strip.FindAll("path.strip-change"));
        Assert.Contains("28 days: none. 28 days without a weight", strip.Find("svg").GetAttribute("aria-label"), StringComparison.Ordinal);
    }

    [Fact]
    public void The_line_is_dashed_where_no_weight_came_and_keeps_its_band()
    {
        WeightStripData data = new()
        {
            From = From,
            To = To,
            Readings = [.. new[] { 0, 1, 2, 6, 7 }.Select(day => new StripReading(From.AddDays(day), 71_000)), new(From.AddDays(4), 90_000, Held: true)],
            Trend = [.. Enumerable.Range(0, 8).Select(day => new StripTrendPoint(From.AddDays(day), 71_000, 70_500, 71_500))],
        };
        var strip = Draw(data);

        Assert.Equal([true, false, true], WeightStripLine.Of(data).Select(stretch => stretch.Weighed));
        Assert.Equal([3, 5, 2], WeightStripLine.Of(data).Select(stretch => stretch.Points.Count));
        Assert.Single(strip.FindAll("polyline.strip-carried"));
        Assert.Equal(3, strip.FindAll("polyline.strip-trend").Count);
        Assert.Equal(16, strip.Find("polygon.strip-doubt").GetAttribute("points")!.Split(' ').Length);
    }

    [Fact]
    public void The_legend_names_the_marks_that_are_drawn()
    {
        WeightStripData bare = new() { From = From, To = From.AddDays(1), Readings = [new(From, 71_000), new(From.AddDays(1), 71_200)] };
        Assert.Equal("Dots: the weight of each day. No target weight is set.", WeightStripWords.Legend(bare, WeightUnit.Kilograms));

        Assert.Equal(
            "Dots: the weight of each day. Hollow: held to be checked. Line: weight with the scatter taken out since 05 Nov, in its 95 % band; dashed where no weight came. "
            + "Ticks below: no weight. Shaded: target 71.5 kg ± 1.0 kg, set 03 Nov 2026. ▲ 05 Nov: furosemide 40 mg daily.",
            WeightStripWords.Legend(bare with
            {
                To = From.AddDays(4),
                Readings = bare.Readings.Add(new(From.AddDays(2), 90_000, Held: true)),
                Trend = [new(From.AddDays(1), 71_000), new(From.AddDays(2), 71_000)],
                Targets = [new(new DateOnly(2026, 11, 3), 71_500)],
                DiureticChanges = [new(From.AddDays(1), "furosemide 40 mg daily")],
            }, WeightUnit.Kilograms));
    }

    [Fact]
    public void A_heavier_weight_stands_higher_and_a_later_day_further_right()
    {
        WeightStripScale scale = new(new() { From = From, To = To, Readings = [new(From, 70_000), new(To, 76_000)] }, left: 4, top: 4, width: 174, height: 32);

        Assert.Equal((4, 36), (scale.X(From), scale.Y(70_000)));
        Assert.Equal((178, 4), (scale.X(To), scale.Y(76_000)));
    }

    private IRenderedComponent<WeightStrip> Draw(WeightStripData data) => Render<WeightStrip>(p => p.Add(x => x.Data, data));
}
