using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>What becomes of a weight at entry. Nothing is corrected by the program.</summary>
public enum ScreenVerdict
{
    /// <summary>Within what is expected, or nothing to compare with.</summary>
    Accepted = 1,

    /// <summary>Far from expectation, but a second time: a real step (another scale or a true change), to be flagged.</summary>
    AcceptedAsStep = 2,

    /// <summary>Far from expectation: set aside until a person decides or a second weight agrees.</summary>
    Held = 3,

    /// <summary>Outside 25 to 300 kg: not a person's weight.</summary>
    Refused = 4,
}

/// <summary>One reading of what may have happened.</summary>
/// <param name="Reason">The likely slip.</param>
/// <param name="Meant">The weight it would have been, or null where the slip does not tell.</param>
public readonly record struct LikelySlip(HoldReason Reason, Weight? Meant);

/// <summary>The outcome for one weight.</summary>
/// <param name="Expected">What was expected; null without history and target, or when refused.</param>
/// <param name="Slips">
/// Every slip that would explain a weight far from expectation, in the order they are offered; empty for other verdicts.
/// </param>
public readonly record struct ScreenedWeight(ScreenVerdict Verdict, ExpectedReading? Expected, ImmutableArray<LikelySlip> Slips)
{
    /// <summary>The first reason offered, or null when the weight is not far from expectation.</summary>
    public HoldReason? Reason => Slips.IsDefaultOrEmpty ? null : Slips[0].Reason;
}
