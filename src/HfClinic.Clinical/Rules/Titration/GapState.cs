using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// Turns a dose below target, or an absent pillar, into a state: a recorded limit closes it, a hold stops it, time opens it, a missing
/// value asks for a check, and only then it is a gap.
/// </summary>
internal static class GapState
{
    /// <param name="reading">With holds, missing, limit and days filled in.</param>
    /// <param name="gap">The state when nothing argues against asking.</param>
    /// <param name="what">What is short, in words.</param>
    /// <param name="name">The class in words.</param>
    public static ClassTitration Decide(ClassTitration reading, PatientPicture picture, TitrationState gap, string what, string name)
    {
        var (due, overdue) = (reading.DueSince!.Value, reading.OverdueFrom!.Value);
        if (reading.Limit is { } limit)
        {
            return reading with
            {
                State = TitrationState.LimitRecorded,
                Sentence = $"{name}: {what}; limit recorded by {limit.By} on {Wording.Day(limit.On)}: {limit.Reason}",
            };
        }

        if (!reading.Holds.IsEmpty)
        {
            var held = string.Join("; ", reading.Holds.Select(hold => hold.Sentence));
            return reading with { State = TitrationState.Held, Sentence = $"{name}: held: {held}; {what}" };
        }

        if (picture.AsOf < due)
        {
            return reading with { State = TitrationState.NotYetDue, Sentence = $"{name}: {what}; shown from {Wording.Day(due)}" };
        }

        if (!reading.Missing.IsEmpty)
        {
            return reading with { State = TitrationState.CheckDue, Sentence = $"{name}: check due: {Wording.List(reading.Missing)}; {what}" };
        }

        var isOverdue = picture.AsOf >= overdue;
        var since = isOverdue ? $"overdue since {Wording.Day(overdue)}" : $"due since {Wording.Day(due)}";
        return reading with { State = gap, IsOverdue = isOverdue, Sentence = $"{name}: {what}; {since}" };
    }
}
