using System.Collections.Immutable;

namespace HfClinic.Clinical.Rules;

/// <summary>What a rule says about a picture.</summary>
public enum Outcome
{
    Clear = 0,
    Fires = 1,

    /// <summary>Something the rule needs is missing; it is never shown as "fine".</summary>
    CannotTell = 2,

    /// <summary>The rule itself failed; shown as "could not be checked".</summary>
    CouldNotBeChecked = 3,
}

/// <summary>One value a finding rests on.</summary>
/// <param name="What">What was seen, in words: "Lowest of the 3 days before".</param>
/// <param name="Value">The value with its unit: "71.9 kg".</param>
/// <param name="Day">The clinic day it belongs to.</param>
/// <param name="ReadingId">The stored reading it came from, if any.</param>
/// <param name="RaisedIt">Whether this is the very value that raised the finding.</param>
public sealed record Evidence(string What, string Value, DateOnly? Day = null, long? ReadingId = null, bool RaisedIt = false);

/// <summary>One rule's answer for one subject of one patient.</summary>
public sealed record Finding
{
    public required string RuleId { get; init; }

    public required int RuleVersion { get; init; }

    /// <summary>What the rule looked at when it can fire for several things, for example a medicine class; else empty.</summary>
    public string Subject { get; init; } = "";

    public required Outcome Outcome { get; init; }

    public Urgency Urgency { get; init; }

    /// <summary>One sentence saying what was seen: "Gained 2.6 kg in 3 days". Describes; never instructs.</summary>
    public string Statement { get; init; } = "";

    /// <summary>The limit in words: "more than 2.0 kg in 3 days".</summary>
    public string Limit { get; init; } = "";

    /// <summary>A word of caution that goes with it; describes, never instructs. Mostly empty.</summary>
    public string Caution { get; init; } = "";

    public ImmutableArray<Evidence> Evidence { get; init; } = [];

    /// <summary>Keys into the source table.</summary>
    public ImmutableArray<string> SourceKeys { get; init; } = [];

    /// <summary>How far the evidence goes, in the rule's own unit; a later, materially larger one is news. Null when there is no such scale.</summary>
    public decimal? Magnitude { get; init; }

    /// <summary>For <see cref="Outcome.CannotTell"/>: what is missing. For <see cref="Outcome.CouldNotBeChecked"/>: what failed.</summary>
    public string Missing { get; init; } = "";
}
