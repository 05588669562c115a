using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>A calculation gives a number with its inputs, or says what stands in the way. No value is filled in.</summary>
public class ComputedTests
{
    private static readonly DateOnly Today = new(2026, 3, 3);

    [Fact]
    public void A_result_shows_its_number_inputs_formula_and_sources()
    {
        var volume = CardiacOutput.StrokeVolume(In.Cm(2.0m) with { Day = Today }, In.Cm(20));

        Assert.Equal("62.8 mL", volume.Text);
        Assert.Equal(["LVOT diameter: 2 cm (1.4 to 3 cm)", "LVOT VTI: 20 cm (3 to 40 cm)"], volume.Inputs.Select(i => $"{i.Name}: {i.Shown} ({i.Accepts})"));
        Assert.Equal(Today, volume.Inputs[0].Day);
        Assert.Equal("π × (LVOT diameter / 2)² × LVOT VTI, in cm", volume.Formula.InWords);
        Assert.Equal(["lvot-doppler"], volume.Formula.SourceKeys);
    }

    [Fact]
    public void What_is_missing_is_named()
    {
        Assert.Equal("not computed: no LVOT diameter", CardiacOutput.StrokeVolume(default, In.Cm(20)).Text);
        Assert.Equal("not computed: no LVOT diameter and no LVOT VTI", CardiacOutput.StrokeVolume(default, default).Text);
        Assert.Equal("not computed: sex not recorded", Renal.Egfr(In.MgPerDl(1), 60, Sex.NotRecorded).Text);
    }

    [Fact]
    public void What_is_missing_is_named_at_the_end_of_a_chain()
    {
        var index = CardiacOutput.PerSquareMetre(
            CardiacOutput.PerMinute(CardiacOutput.StrokeVolume(default, In.Cm(20)), 72), BodySize.SurfaceAreaMosteller(In.Kg(80), default));

        Assert.Null(index.Value);
        Assert.Equal("not computed: no LVOT diameter and no height", index.Text);
    }

    [Fact]
    public void A_number_can_be_followed_back_to_what_was_measured()
    {
        var output = CardiacOutput.PerMinute(CardiacOutput.StrokeVolume(In.Cm(2), In.Cm(20)), 72);

        var origin = output.Inputs[0].From!;
        Assert.Equal("stroke volume", origin.Formula.Name);
        Assert.Equal("LVOT diameter", origin.Inputs[0].Name);
        Assert.Null(output.Inputs[1].From);
    }

    [Theory]
    [InlineData("1.399", "not computed: LVOT diameter 1.399 cm is outside 1.4 to 3 cm")]
    [InlineData("1.4", "30.8 mL")]
    [InlineData("3", "141.4 mL")]
    [InlineData("3.0001", "not computed: LVOT diameter 3.0001 cm is outside 1.4 to 3 cm")]
    [InlineData("20", "not computed: LVOT diameter 20 cm is outside 1.4 to 3 cm")]
    public void Both_ends_of_a_range_are_accepted_and_nothing_beyond(string centimetres, string text) =>
        Assert.Equal(text, CardiacOutput.StrokeVolume(In.Cm(In.Number(centimetres)), In.Cm(20)).Text);

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    [InlineData(1e300)]
    public void Something_that_is_no_number_is_refused(double rate)
    {
        var output = CardiacOutput.PerMinute(60, rate);

        Assert.Null(output.Value);
        Assert.Contains("is outside 25 to 220 beats/min", output.WhyNot);
    }

    [Fact]
    public void A_minus_is_written_as_a_minus() =>
        Assert.Equal("heart rate −5 beats/min is outside 25 to 220 beats/min", CardiacOutput.PerMinute(60, -5).WhyNot);

    [Theory]
    [InlineData(364, null)]
    [InlineData(365, null)]
    [InlineData(366, "LVOT diameter of 02 Mar 2025 is more than 365 days old")]
    [InlineData(-1, "LVOT diameter is dated 04 Mar 2026, after 03 Mar 2026")]
    public void Stale_below_at_and_above_the_oldest_age(int age, string? whyNot)
    {
        var diameter = (In.Cm(2) with { Day = Today.AddDays(-age) }).NotOlderThan(365, Today);

        Assert.Equal(whyNot, CardiacOutput.StrokeVolume(diameter, In.Cm(20)).WhyNot);
    }

    [Fact]
    public void A_result_is_as_old_as_its_oldest_input()
    {
        var volume = CardiacOutput.StrokeVolume(In.Cm(2) with { Day = Today.AddDays(-400) }, In.Cm(20) with { Day = Today });
        Given<double> carried = volume;

        Assert.Equal("stroke volume of 27 Jan 2025 is more than 365 days old", CardiacOutput.PerMinute(carried.NotOlderThan(365, Today), 72).WhyNot);
    }

    [Fact]
    public void An_undated_value_is_not_taken_as_fresh() =>
        Assert.Equal("LVOT diameter has no date", CardiacOutput.StrokeVolume(In.Cm(2).NotOlderThan(365, Today), In.Cm(20)).WhyNot);

    [Fact]
    public void A_missing_value_stays_missing_when_its_age_is_asked() =>
        Assert.Equal("no LVOT diameter", CardiacOutput.StrokeVolume(default(Given<Length>).NotOlderThan(365, Today), In.Cm(20)).WhyNot);

    [Theory]
    [InlineData("de-DE")]
    [InlineData("ar-SA")]
    public void The_language_of_the_server_does_not_matter(string culture)
    {
        var before = System.Globalization.CultureInfo.CurrentCulture;
        System.Globalization.CultureInfo.CurrentCulture = System.Globalization.CultureInfo.GetCultureInfo(culture);
        try
        {
            Assert.Equal("62.8 mL", CardiacOutput.StrokeVolume(In.Cm(2), In.Cm(20)).Text);
            Assert.Equal("106 µmol/L (1.20 mg/dL)", Creatinine.FromMgPerDl(1.2m).ToString());
        }
        finally
        {
            System.Globalization.CultureInfo.CurrentCulture = before;
        }
    }
}
