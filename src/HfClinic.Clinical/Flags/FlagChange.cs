using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Flags;

/// <summary>What happens to a flag.</summary>
public enum FlagChangeKind
{
    /// <summary>A new episode.</summary>
    Raise = 1,

    /// <summary>The same episode goes on: what was seen has moved on.</summary>
    Join = 2,

    /// <summary>More urgent, or materially further than when it was last news. Ends a putting-off.</summary>
    Escalate = 3,

    /// <summary>The limit is no longer met; the flag stays until a person answers it.</summary>
    NoLongerMet = 4,

    /// <summary>The data cleared it.</summary>
    Clear = 5,

    /// <summary>Answered or cleared, and now open again.</summary>
    Reopen = 6,
}

/// <summary>One step of one flag.</summary>
/// <param name="Before">The flag as it was; null when raised.</param>
/// <param name="After">The flag as it is to be stored.</param>
/// <param name="Finding">What caused the step; null when the rule no longer applies to the patient.</param>
public sealed record FlagChange(FlagChangeKind Kind, LiveFlag? Before, LiveFlag After, Finding? Finding);
