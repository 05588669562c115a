using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>Held readings and their 24 hours: a default of this program, no published source.</summary>
public class HeldReadingWaitingTests
{
    private readonly HeldReadingWaiting _rule = new();

    [Fact]
    public void Without_one_it_is_clear() => Assert.Equal(Outcome.Clear, _rule.Read(AtHome.Weighed(0, 80_000)).Outcome);

    /// <summary>The plain 3-day limit, read for the held weight.</summary>
    [Theory]
    [InlineData(81_999, false)]
    [InlineData(82_000, false)]
    [InlineData(82_001, true)]
    public void Below_at_and_above_the_gain_limit_it_waits_all_the_same(int grams, bool possibleGain)
    {
        var finding = _rule.Read(AtHome.Weighed(-2, 80_000).Weighed(0, grams, HoldReason.Unexplained));

        Assert.Equal(Outcome.Fires, finding.Outcome);
        Assert.Equal(possibleGain, finding.Statement.StartsWith("Possible gain of 2.001 kg, unconfirmed: ", StringComparison.Ordinal));
    }

    [Fact]
    public void A_jump_does_not_vanish_as_an_error()
    {
        var finding = _rule.Read(AtHome.Weighed(-1, 80_000).Weighed(0, 84_100, HoldReason.Unexplained));

        Assert.Equal("Possible gain of 4.1 kg, unconfirmed: 84.1 kg is far from the recent weights", finding.Statement);
        Assert.Equal(("more than 2.0 kg in 3 days", 4_100m), (finding.Limit, finding.Magnitude));
        Assert.Equal(
            [
                new Evidence("Lowest of the 3 days before", "80.0 kg", Today.AddDays(-1), 100),
                new Evidence("Set aside", "84.1 kg is far from the recent weights", Today, 101, RaisedIt: true),
            ],
            finding.Evidence);
    }

    [Fact]
    public void Pounds_taken_as_kilograms_are_read_as_pounds_for_the_gain()
    {
        var finding = _rule.Read(AtHome.Weighed(-2, 61_000).Weighed(0, 141_600, HoldReason.PoundsTakenAsKilograms));

        Assert.Equal("Possible gain of 3.2 kg, unconfirmed: 141.6 kg looks like pounds", finding.Statement);
        Assert.Contains(new Evidence("Would then be", "64.2 kg", Today, 101), finding.Evidence);
    }

    [Fact]
    public void Where_only_the_number_as_recorded_would_be_a_gain_it_still_says_so()
    {
        var finding = _rule.Read(AtHome.Weighed(-2, 64_000).Weighed(0, 141_600, HoldReason.PoundsTakenAsKilograms));

        Assert.Equal("Reading to check: 141.6 kg looks like pounds; possible gain, unconfirmed", finding.Statement);
        Assert.Equal((Urgency.ThisWeek, null), (finding.Urgency, finding.Magnitude));
    }

    [Fact]
    public void A_low_one_is_just_to_be_checked() =>
        Assert.Equal("Reading to check: 74.6 lb looks like kilograms",
            _rule.Read(AtHome.Weighed(-1, 74_500).Weighed(0, 33_838, HoldReason.KilogramsTakenAsPounds)).Statement);

    [Fact]
    public void Of_several_the_largest_possible_gain_is_told()
    {
        var picture = AtHome.Weighed(-3, 80_000).Weighed(-1, 85_000, HoldReason.WrongDigit).Weighed(0, 40_000, HoldReason.Unexplained);

        Assert.Equal("Possible gain of 5.0 kg, unconfirmed: 85.0 kg looks as if one digit is wrong; 2 readings to check", _rule.Read(picture).Statement);
    }

    /// <summary>The reading of 07:00; the picture stands for the end of its day.</summary>
    [Theory]
    [InlineData(0, 17, Urgency.Today)]
    [InlineData(0, 18, Urgency.ThisWeek)]
    [InlineData(0, 24, Urgency.ThisWeek)]
    [InlineData(-1, 24, Urgency.Today)]
    public void A_possible_gain_that_has_waited_long_enough_is_for_today(int day, int hours, Urgency expected) =>
        Assert.Equal(expected, _rule.Read(
            AtHome.Weighed(-2, 80_000).Weighed(day, 84_000, HoldReason.Unexplained),
            Defaults.With([new("held.worklist-hours", hours)])).Urgency);

    [Theory]
    [InlineData(HoldReason.PoundsTakenAsKilograms, "98.0 kg looks like pounds", 44_452)]
    [InlineData(HoldReason.KilogramsTakenAsPounds, "216.1 lb looks like kilograms", 216_053)]
    [InlineData(HoldReason.TenfoldTooHigh, "98.0 kg looks ten times too high", 9_800)]
    [InlineData(HoldReason.TenfoldTooLow, "98.0 kg looks ten times too low", 980_000)]
    [InlineData(HoldReason.DroppedDigit, "98.0 kg looks as if a digit was left out", null)]
    [InlineData(HoldReason.SwappedDigits, "98.0 kg looks as if two digits were swapped", null)]
    [InlineData(HoldReason.WrongDigit, "98.0 kg looks as if one digit is wrong", null)]
    [InlineData(HoldReason.AnotherPerson, "98.0 kg fits another person of the household", null)]
    [InlineData(HoldReason.Unexplained, "98.0 kg is far from the recent weights", null)]
    public void Each_reason_has_its_words_and_its_mended_weight(HoldReason reason, string words, int? mended)
    {
        var reading = AtHome.Weighed(0, 98_000, reason).Weights[0];

        Assert.Equal(words, HeldWords.Describe(reading, Clinical.Values.WeightUnit.Kilograms));
        Assert.Equal(mended, HeldWords.Mended(reading)?.Grams);
    }
}
