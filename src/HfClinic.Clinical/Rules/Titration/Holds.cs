using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Everything that speaks against a step now, and when the last of it was gone.</summary>
internal static class Holds
{
    /// <summary>All reasons, gravest first.</summary>
    public static ImmutableArray<HoldReason> Now(
        TitrationClass titration, Candidate candidate, TitrationFacts facts, PostDischargeTrack? track)
    {
        var onTrack = track is not null && PostDischargeTrack.Covers(titration);
        var measured = MeasuredHolds.Now(candidate, facts).ToList();
        var indicators = onTrack ? track!.SafetyIndicators : [];
        var flags = facts.Picture.OpenSafetyFlags.Where(flag => flag.Class == titration).Select(flag => new HoldReason(
            LimitEffect.Urgent, $"safety flag {flag.RuleId} is open", "", "for the prescriber's decision", facts.Picture.AsOf, null, ["clinic-default"]));
        return
        [
            .. measured
                .Concat(indicators.Where(indicator => !measured.Any(other => other.Words == indicator.Words)))
                .Concat(ConditionHolds.Now(candidate, facts, onTrack))
                .Concat(flags)
                .OrderByDescending(reason => reason.Effect),
        ];
    }

    /// <summary>The last day on which something that held no longer did; nothing before the given day matters.</summary>
    public static DateOnly? LastCleared(TitrationClass titration, Candidate candidate, TitrationFacts facts, DateOnly since) =>
        new[]
        {
            MeasuredHolds.LastCleared(candidate, facts, since),
            ConditionHolds.LastCleared(candidate, facts),
            RecordedLimits.LastCleared(titration, facts.Picture, facts.Protocol),
        }.Max();
}
