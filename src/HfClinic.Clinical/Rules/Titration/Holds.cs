using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Everything that speaks against a step now, and when the last of it was gone.</summary>
internal static class Holds
{
    /// <summary>All reasons, gravest first.</summary>
    public static ImmutableArray<HoldReason> Now(
        TitrationClass titration, Candidate candidate, PatientPicture picture, ClinicProtocol protocol, PostDischargeTrack? track)
    {
        var onTrack = track is not null && PostDischargeTrack.Covers(titration);
        var measured = MeasuredHolds.Now(candidate, picture, protocol).ToList();
        var indicators = onTrack ? track!.SafetyIndicators : [];
        var flags = picture.OpenSafetyFlags.Where(flag => flag.Class == titration).Select(flag => new HoldReason(
            LimitEffect.Urgent, $"safety flag {flag.RuleId} is open", "", "for the prescriber's decision", picture.AsOf, null, ["clinic-default"]));
        return
        [
            .. measured
                .Concat(indicators.Where(indicator => !measured.Any(other => other.Words == indicator.Words)))
                .Concat(ConditionHolds.Now(candidate, picture, protocol, onTrack))
                .Concat(flags)
                .OrderByDescending(reason => reason.Effect),
        ];
    }

    /// <summary>The last day on which something that held no longer did.</summary>
    public static DateOnly? LastCleared(TitrationClass titration, Candidate candidate, PatientPicture picture, ClinicProtocol protocol) =>
        new[]
        {
            MeasuredHolds.LastCleared(candidate, picture, protocol),
            ConditionHolds.LastCleared(candidate, picture, protocol),
            RecordedLimits.LastCleared(titration, picture, protocol),
        }.Max();
}
