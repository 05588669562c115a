using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>
/// The home-scale file against the outcome given with it: five lines held, each a weight in pounds taken as kilograms.
/// </summary>
public class ReadingScreenFileTests
{
    private const string PoundsOutcome = "held: looks like pounds entered as kilograms";

    [Fact]
    public void OnePassHoldsTheFiveLinesAndNoOther()
    {
        var targets = HomeReadingsFile.Targets();
        var screens = targets.ToDictionary(target => target.Key, target => new ReadingScreen(target.Value));
        CheckHeld(line => screens[line.Clinic].Take(line.LocalTime, line.Weight, []));
    }

    [Fact]
    public void OnePassWithoutTargetsHoldsTheSame()
    {
        var screens = HomeReadingsFile.Targets().ToDictionary(target => target.Key, _ => new ReadingScreen(target: null));
        CheckHeld(line => screens[line.Clinic].Take(line.LocalTime, line.Weight, []));
    }

    [Fact]
    public void SingleChecksHoldTheSame()
    {
        var targets = HomeReadingsFile.Targets();
        var accepted = targets.Keys.ToDictionary(clinic => clinic, _ => new List<WeightReading>());
        CheckHeld(line =>
        {
            var known = accepted[line.Clinic];
            var screened = ReadingScreen.Check(
                line.Weight, DateOnly.FromDateTime(line.LocalTime), DaySeries.From(known).AsSpan(), targets[line.Clinic], []);
            if (screened.Verdict == ScreenVerdict.Accepted)
            {
                known.Add(new WeightReading(line.Number, line.LocalTime, line.Weight));
            }

            return screened;
        });
    }

    private static void CheckHeld(Func<HomeReadingsFile.Line, ScreenedWeight> screen)
    {
        var lines = HomeReadingsFile.GoodLines();
        Assert.Equal(5049 + 45 + 5, lines.Count);
        var expected = HomeReadingsFile.Expected.Where(line => line.Value == PoundsOutcome).Select(line => line.Key).Order();

        var outcomes = lines.Select(line => (line.Number, Screened: screen(line))).ToList();

        var set = outcomes.Where(outcome => outcome.Screened.Verdict != ScreenVerdict.Accepted).ToList();
        Assert.Equal(expected, set.Select(outcome => outcome.Number).Order());
        Assert.All(set, outcome =>
        {
            Assert.Equal(ScreenVerdict.Held, outcome.Screened.Verdict);
            Assert.Equal(HoldReason.PoundsTakenAsKilograms, outcome.Screened.Reason);
        });
    }
}
