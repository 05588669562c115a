using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// Slips are worked out by hand from a person who weighs 80.0 kg each day (104.0 kg where the slip needs three figures);
/// the limits are conventions of this program.
/// </summary>
public class ReadingScreenTests
{
    private static readonly DateOnly Today = new(2026, 3, 31);

    [Theory]
    [InlineData(80.0, 176.4, HoldReason.PoundsTakenAsKilograms, 80.0)]
    [InlineData(80.0, 36.3, HoldReason.KilogramsTakenAsPounds, 80.0)]
    [InlineData(28.0, 280.0, HoldReason.TenfoldTooHigh, 28.0)]
    [InlineData(270.0, 27.0, HoldReason.TenfoldTooLow, 270.0)]
    [InlineData(134.0, 34.0, HoldReason.DroppedDigit, 134.0)]
    [InlineData(86.0, 68.0, HoldReason.SwappedDigits, 86.0)]
    [InlineData(104.0, 140.0, HoldReason.SwappedDigits, 104.0)]
    [InlineData(80.0, 90.1, HoldReason.WrongDigit, 80.1)]
    [InlineData(80.0, 96.0, HoldReason.Unexplained, null)]
    public void HeldWithTheLikelySlip(double usual, double entered, HoldReason reason, double? meant)
    {
        var screened = ReadingScreen.Check(Kilograms(entered), Today, Steady(usual, 30), Kilograms(usual), []);

        Assert.Equal(ScreenVerdict.Held, screened.Verdict);
        Assert.Equal(reason, screened.Reason);
        Assert.Equal(meant, screened.Slips[0].Meant is Weight weight ? Math.Round((double)weight.Kilograms, 1) : null);
    }

    [Fact]
    public void AllSlipsThatFitAreOfferedInOrder()
    {
        var screened = ReadingScreen.Check(Kilograms(90), Today, Steady(100, 30), null, []);

        Assert.Equal(screened.Slips.Select(slip => slip.Reason).Order(), screened.Slips.Select(slip => slip.Reason));
        Assert.Contains(screened.Slips, slip => slip.Reason == HoldReason.WrongDigit);
    }

    [Fact]
    public void AnotherMemberOfTheHouseholdIsNamedOnlyWhenNoSlipFits()
    {
        Assert.Equal(HoldReason.AnotherPerson, ReadingScreen.Check(Kilograms(63.5), Today, Steady(80, 30), null, [Kilograms(63.0)]).Reason);
        Assert.Equal(HoldReason.Unexplained, ReadingScreen.Check(Kilograms(63.5), Today, Steady(80, 30), null, [Kilograms(58.0)]).Reason);
        Assert.Equal(HoldReason.WrongDigit, ReadingScreen.Check(Kilograms(70.0), Today, Steady(80, 30), null, [Kilograms(70.0)]).Reason);
    }

    [Theory]
    [InlineData(24.9, ScreenVerdict.Refused)]
    [InlineData(25.0, ScreenVerdict.Accepted)]
    [InlineData(300.0, ScreenVerdict.Accepted)]
    [InlineData(300.1, ScreenVerdict.Refused)]
    public void HardRangeIsRefusedEvenWithoutHistory(double entered, ScreenVerdict verdict) =>
        Assert.Equal(verdict, ReadingScreen.Check(Kilograms(entered), Today, [], null, []).Verdict);

    [Fact]
    public void WithoutHistoryTheTargetWeightIsTheMeasure()
    {
        Assert.Equal(ScreenVerdict.Accepted, ReadingScreen.Check(Kilograms(84), Today, [], Kilograms(80), []).Verdict);
        Assert.Equal(HoldReason.PoundsTakenAsKilograms, ReadingScreen.Check(Kilograms(176.4), Today, [], Kilograms(80), []).Reason);
    }

    [Theory]
    [InlineData(83.0, ScreenVerdict.Accepted)]
    [InlineData(83.5, ScreenVerdict.Held)]
    public void AtEightyKilogramsTheGateIsFiveDeviationsAboutThreeAndAQuarter(double entered, ScreenVerdict verdict) =>
        Assert.Equal(verdict, ReadingScreen.Check(Kilograms(entered), Today, Steady(80, 60), Kilograms(80), []).Verdict);

    [Fact]
    public void AFastGainIsNotHeldWhileEachWeightIsNearTheLast()
    {
        var screen = new ReadingScreen(Kilograms(60));
        foreach (var weight in Steady(60, 30))
        {
            screen.Accept(Morning(weight.Day), new Weight(weight.Grams));
        }

        Assert.Equal(ScreenVerdict.Accepted, screen.Take(Morning(Today), Kilograms(62.0), []).Verdict);
        var ahead = screen.Take(Morning(Today.AddDays(2)), Kilograms(64.5), []);
        Assert.Equal(ScreenVerdict.Accepted, ahead.Verdict);
        Assert.True(64.5 - ahead.Expected!.Value.Kilograms > ahead.Expected.Value.Gate);
    }

    [Fact]
    public void GapsWidenWhatIsTaken()
    {
        var history = Steady(80, 60).ToArray().Select(weight => weight with { Day = weight.Day.AddDays(-40) }).ToArray();

        Assert.Equal(ScreenVerdict.Accepted, ReadingScreen.Check(Kilograms(83.9), Today, history, Kilograms(80), []).Verdict);
    }

    [Fact]
    public void LaterWeightsAreNotLookedAt()
    {
        DayWeight[] history = [.. Steady(80, 30), new DayWeight(Today.AddDays(1), 96_000), new DayWeight(Today.AddDays(2), 96_000)];

        Assert.Equal(ScreenVerdict.Accepted, ReadingScreen.Check(Kilograms(80.4), Today, history, null, []).Verdict);
    }

    [Theory]
    [InlineData(1, 84.0, 85.4, ScreenVerdict.AcceptedAsStep)]
    [InlineData(1, 84.0, 85.6, ScreenVerdict.Held)]
    [InlineData(0, 84.0, 84.2, ScreenVerdict.Held)]
    [InlineData(1, 176.4, 176.6, ScreenVerdict.Held)]
    public void ASecondFarWeightOnALaterDayIsARealStepButNotAUnitSlip(int daysBefore, double first, double second, ScreenVerdict verdict)
    {
        var held = new DayWeight(Today.AddDays(-daysBefore), Kilograms(first).Grams);

        Assert.Equal(verdict, ReadingScreen.Check(Kilograms(second), Today, Steady(80, 30), null, [], held).Verdict);
    }

    [Fact]
    public void OnePassTakesTheStepAndExpectsTheNewWeightNext()
    {
        var screen = new ReadingScreen(Kilograms(80));
        foreach (var weight in Steady(80, 30))
        {
            Assert.Equal(ScreenVerdict.Accepted, screen.Take(Morning(weight.Day), new Weight(weight.Grams), []).Verdict);
        }

        Assert.Equal(ScreenVerdict.Held, screen.Take(Morning(Today), Kilograms(84.5), []).Verdict);
        Assert.Equal(ScreenVerdict.AcceptedAsStep, screen.Take(Morning(Today.AddDays(1)), Kilograms(84.7), []).Verdict);
        Assert.Equal(ScreenVerdict.Accepted, screen.Take(Morning(Today.AddDays(2)), Kilograms(84.6), []).Verdict);
    }

    [Fact]
    public void AnOrdinaryWeightBetweenTwoFarOnesEndsTheSuspicion()
    {
        var screen = new ReadingScreen(Kilograms(80));
        foreach (var weight in Steady(80, 30))
        {
            screen.Accept(Morning(weight.Day), new Weight(weight.Grams));
        }

        Assert.Equal(ScreenVerdict.Held, screen.Take(Morning(Today), Kilograms(84.5), []).Verdict);
        Assert.Equal(ScreenVerdict.Accepted, screen.Take(Morning(Today.AddDays(1)), Kilograms(80.1), []).Verdict);
        Assert.Equal(ScreenVerdict.Held, screen.Take(Morning(Today.AddDays(2)), Kilograms(84.5), []).Verdict);
    }

    [Fact]
    public void WeightsOutOfOrderAreRefusedByTheOnePassForm()
    {
        var screen = new ReadingScreen(null);
        screen.Accept(Morning(Today), Kilograms(80));

        Assert.Throws<ArgumentException>(() => screen.Accept(Morning(Today.AddDays(-1)), Kilograms(80)));
        Assert.Throws<ArgumentException>(() => screen.Take(Morning(Today.AddDays(-1)), Kilograms(80), []));
    }

    [Fact]
    public void TheMorningWeightStandsForTheDayInTheOnePassForm()
    {
        // A weight at 01:00 gives way to one at 07:00; a third at 20:00 does not count.
        var one = new ReadingScreen(Kilograms(80));
        one.Accept(Today.ToDateTime(new TimeOnly(1, 0)), Kilograms(81.5));
        one.Accept(Today.ToDateTime(new TimeOnly(7, 0)), Kilograms(80.2));
        one.Accept(Today.ToDateTime(new TimeOnly(20, 0)), Kilograms(81.9));
        var other = new ReadingScreen(Kilograms(80));
        other.Accept(Morning(Today), Kilograms(80.2));

        Assert.Equal(
            other.Take(Morning(Today.AddDays(1)), Kilograms(80), []).Expected,
            one.Take(Morning(Today.AddDays(1)), Kilograms(80), []).Expected);
    }

    private static ReadOnlySpan<DayWeight> Steady(double kilograms, int days) =>
        Enumerable.Range(0, days).Select(day => new DayWeight(Today.AddDays(day - days), Kilograms(kilograms).Grams)).ToArray();

    private static Weight Kilograms(double kilograms) => Weight.FromKilograms((decimal)kilograms);

    private static DateTime Morning(DateOnly day) => day.ToDateTime(new TimeOnly(7, 0));
}
