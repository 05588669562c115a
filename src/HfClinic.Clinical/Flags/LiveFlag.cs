using System.Collections.Immutable;
using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Flags;

/// <summary>
/// A flag as the reconciler sees it. One patient's flag is known by rule, subject and the day its episode started.
/// </summary>
public sealed record LiveFlag
{
    /// <summary>The stored flag; 0 while it is only about to be raised.</summary>
    public long Id { get; init; }

    public required string RuleId { get; init; }

    public string Subject { get; init; } = "";

    /// <summary>The clinic day on which it was raised.</summary>
    public required DateOnly EpisodeStart { get; init; }

    public FlagState State { get; init; } = FlagState.Open;

    /// <summary>The highest urgency so far; for a flag that does not latch, the present one.</summary>
    public required Urgency Urgency { get; init; }

    /// <summary>How far the evidence went when the flag was last news: raised, escalated or reopened. Joining leaves it.</summary>
    public decimal? Magnitude { get; init; }

    /// <summary>False once the data no longer meet the limit of a flag that waits for a person all the same.</summary>
    public bool IsMet { get; init; } = true;

    /// <summary>The clinic day of the answer.</summary>
    public DateOnly? AnsweredOn { get; init; }

    /// <summary>The last day on which the answer stands, where a person set it; else the rule's <see cref="IRule.JoinDays"/> count.</summary>
    public DateOnly? AnswerStandsUntil { get; init; }

    /// <summary>The day on which a flag put off by a person comes back to the list.</summary>
    public DateOnly? PutOffUntil { get; init; }

    public required string Statement { get; init; }

    public string Limit { get; init; } = "";

    public string Caution { get; init; } = "";

    public ImmutableArray<Evidence> Evidence { get; init; } = [];
}
