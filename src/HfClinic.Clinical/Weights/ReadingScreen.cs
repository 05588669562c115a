using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// Checks each weight of one patient at entry against what the trend expects. Holds what has been accepted so far, so that
/// a long file is checked in one pass; for a single weight use the static <see cref="Check"/>.
/// </summary>
/// <remarks>
/// A second weight far off, on a later day and within 1.5 kg of the first, is taken as a real step. A slip in the unit or a
/// tenfold slip is not: it repeats itself with the habit or the setting of the scale, and no body changes by such factors.
/// The limits are choices of this program, to be signed off by the clinic.
/// </remarks>
/// <param name="target">The target weight, or null when none is set.</param>
public sealed class ReadingScreen(Weight? target)
{
    private const int WindowDays = 90;
    private const int AgreeGrams = 1_500;
    private WeightExpectation settled = new(target);
    private DayWeight? today;
    private TimeOnly todayTime;
    private DayWeight? heldBefore;

    /// <summary>Checks one weight against a patient's accepted history; nothing is kept.</summary>
    /// <param name="acceptedHistory">The day series in order of day; weights after <paramref name="day"/> are not looked at.</param>
    /// <param name="target">The target weight, or null when none is set.</param>
    /// <param name="householdRecent">A recent weight of each other member of the household.</param>
    /// <param name="heldBefore">The last weight set aside, unless another was accepted since.</param>
    public static ScreenedWeight Check(
        Weight candidate,
        DateOnly day,
        ReadOnlySpan<DayWeight> acceptedHistory,
        Weight? target,
        IReadOnlyList<Weight> householdRecent,
        DayWeight? heldBefore = null)
    {
        int end = acceptedHistory.Length;
        while (end > 0 && acceptedHistory[end - 1].Day > day)
        {
            end--;
        }

        int start = end;
        while (start > 0 && acceptedHistory[start - 1].Day.DayNumber > acceptedHistory[end - 1].Day.DayNumber - WindowDays)
        {
            start--;
        }

        var expectation = new WeightExpectation(target);
        foreach (var weight in acceptedHistory[start..end])
        {
            expectation.Add(weight);
        }

        return Judge(candidate, day, expectation.On(day), householdRecent, heldBefore);
    }

    /// <summary>Checks the next weight and keeps it: accepted weights shape what is expected next.</summary>
    /// <param name="localTime">Wall-clock time in the clinic's time zone.</param>
    /// <param name="householdRecent">A recent weight of each other member of the household.</param>
    /// <exception cref="ArgumentException">The day lies before one already taken.</exception>
    public ScreenedWeight Take(DateTime localTime, Weight candidate, IReadOnlyList<Weight> householdRecent)
    {
        var day = DateOnly.FromDateTime(localTime);
        RequireOrder(day);
        var expectation = settled;
        if (today is DayWeight known)
        {
            expectation.Add(known);
        }

        var screened = Judge(candidate, day, expectation.On(day), householdRecent, heldBefore);
        switch (screened.Verdict)
        {
            case ScreenVerdict.Held:
                heldBefore = new DayWeight(day, candidate.Grams);
                break;
            case ScreenVerdict.Accepted or ScreenVerdict.AcceptedAsStep:
                Accept(localTime, candidate);
                break;
        }

        return screened;
    }

    /// <summary>Takes in a weight already accepted, unchecked.</summary>
    /// <param name="localTime">Wall-clock time in the clinic's time zone.</param>
    /// <exception cref="ArgumentException">The day lies before one already taken.</exception>
    public void Accept(DateTime localTime, Weight weight)
    {
        var day = DateOnly.FromDateTime(localTime);
        var time = TimeOnly.FromDateTime(localTime);
        RequireOrder(day);
        heldBefore = null;
        if (today is DayWeight known && known.Day == day)
        {
            if (!DaySeries.GoesBefore(time, todayTime))
            {
                return;
            }
        }
        else if (today is DayWeight finished)
        {
            settled.Add(finished);
        }

        today = new DayWeight(day, weight.Grams);
        todayTime = time;
    }

    private static ScreenedWeight Judge(
        Weight candidate,
        DateOnly day,
        ExpectedReading? expected,
        IReadOnlyList<Weight> householdRecent,
        DayWeight? heldBefore)
    {
        if (!candidate.IsInEntryRange)
        {
            return new ScreenedWeight(ScreenVerdict.Refused, null, []);
        }

        if (expected is not ExpectedReading near || !near.IsFarFrom(candidate.Grams / 1000.0))
        {
            return new ScreenedWeight(ScreenVerdict.Accepted, expected, []);
        }

        var slips = WeightSlips.Of(candidate, near, householdRecent);
        bool confirmed = heldBefore is DayWeight held
            && held.Day < day
            && Math.Abs(held.Grams - candidate.Grams) <= AgreeGrams
            && slips[0].Reason > HoldReason.TenfoldTooLow;
        return new ScreenedWeight(confirmed ? ScreenVerdict.AcceptedAsStep : ScreenVerdict.Held, near, slips);
    }

    private void RequireOrder(DateOnly day)
    {
        if (today is DayWeight last && day < last.Day)
        {
            throw new ArgumentException($"Weights must come in order of day: {day:yyyy-MM-dd} after {last.Day:yyyy-MM-dd}.");
        }
    }
}
