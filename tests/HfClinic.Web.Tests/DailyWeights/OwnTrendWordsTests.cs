using HfClinic.Clinical.Values;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;
using HfClinic.Web.DailyWeights;

namespace HfClinic.Web.Tests.DailyWeights;

/// <summary>Invented figures: the wording only.</summary>
public class OwnTrendWordsTests
{
    private static readonly DateOnly Today = new(2026, 12, 1);
    private static readonly StripContent Bare = new([], [], [], [], []);

    private static PatientSummary Known => new()
    {
        LastWeightDay = Today,
        TrendDay = Today,
        FluidGrams = 2_300,
        FluidBandGrams = 400,
        ExcessGrams = -1_240,
        ExcessErrorGrams = 250,
        SlopeGramsPerWeek = -800,
        SlopeBandGramsPerWeek = 500,
        ScatterGrams = 520,
        FluidScore = 3.1m,
    };

    [Fact]
    public void Amounts_stand_with_half_their_interval()
    {
        Assert.Equal(
            [
                "Own trend: 2.3 kg of fluid above own baseline, give or take 0.4 kg",
                "Against target: 1.2 kg below with the scatter taken out, give or take 0.5 kg",
                "Change per week: −0.8 kg, give or take 0.5 kg",
                "Day-to-day scatter: 0.5 kg",
            ],
            Lines(Known));
    }

    [Fact]
    public void A_trend_that_ends_before_today_says_with_which_day()
    {
        var older = Known;
        older.TrendDay = older.LastWeightDay = Today.AddDays(-2);

        Assert.EndsWith("give or take 0.4 kg, up to 29 Nov", Lines(older)[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Without_a_target_there_is_no_line_against_it()
    {
        var free = Known;
        free.ExcessGrams = null;

        Assert.DoesNotContain(Lines(free), line => line.StartsWith("Against target", StringComparison.Ordinal));
    }

    [Fact]
    public void The_silent_have_no_trend()
    {
        var silent = Known;
        (silent.IsSilent, silent.LastWeightDay) = (true, new DateOnly(2026, 11, 18));

        Assert.Equal(["Own trend: not carried on: no weight since 18 Nov 2026"], Lines(silent));
        Assert.Equal(["Own trend: no weight on record"], Lines(new PatientSummary()));
    }

    private static List<string> Lines(PatientSummary summary) =>
        [.. new OwnTrendWords(summary, Bare, Today, WeightUnit.Kilograms).Lines.Select(line => $"{line.What}: {line.Words}")];
}
