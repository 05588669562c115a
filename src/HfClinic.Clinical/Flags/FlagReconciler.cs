using System.Collections.Immutable;
using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Flags;

/// <summary>Turns one patient's findings into steps of that patient's flags. Doing it twice changes nothing more.</summary>
/// <remarks>
/// Pass every finding of the assessment and every flag that is open, whose answer may still stand, or that was cleared
/// on the same day. A rule that cannot tell or could not be checked never clears a flag.
/// </remarks>
public static class FlagReconciler
{
    /// <param name="flags">The patient's open, answered and freshly cleared flags.</param>
    /// <param name="findings">All findings of one assessment; at most one for each rule and subject.</param>
    /// <param name="rules">The rules that were assessed. Flags of other rules are left alone.</param>
    /// <param name="today">The clinic day of the assessment.</param>
    public static ImmutableArray<FlagChange> Reconcile(
        IReadOnlyCollection<LiveFlag> flags,
        IReadOnlyCollection<Finding> findings,
        IEnumerable<IRule> rules,
        DateOnly today)
    {
        var byId = rules.ToDictionary(rule => rule.Id, StringComparer.Ordinal);
        var changes = ImmutableArray.CreateBuilder<FlagChange>();
        foreach (var finding in findings.Where(finding => finding.Outcome == Outcome.Fires))
        {
            var own = flags.Where(flag => flag.RuleId == finding.RuleId && flag.Subject == finding.Subject);
            if (Fire(own.ToList(), finding, byId[finding.RuleId], today) is { } change)
            {
                changes.Add(change);
            }
        }

        foreach (var flag in flags.Where(flag => byId.ContainsKey(flag.RuleId) && !IsHeldUp(flag, findings)))
        {
            if (Settle(flag, byId[flag.RuleId].Latches, ClearFinding(flag, findings)) is { } change)
            {
                changes.Add(change);
            }
        }

        return changes.ToImmutable();
    }

    private static FlagChange? Fire(List<LiveFlag> own, Finding finding, IRule rule, DateOnly today)
    {
        var flag = own.Find(candidate => candidate.State == FlagState.Open) ?? own.MaxBy(candidate => candidate.EpisodeStart);
        return flag switch
        {
            null => Raise(finding, today),
            { State: FlagState.Open } => MoveOn(flag, finding, rule),
            { State: FlagState.Answered } when IsNews(flag, finding, rule) => Reopen(flag, finding),
            { State: FlagState.Answered } when AnswerStands(flag, rule, today) => null,
            _ when flag.EpisodeStart == today => Reopen(flag, finding),
            _ => Raise(finding, today),
        };
    }

    private static FlagChange? MoveOn(LiveFlag flag, Finding finding, IRule rule)
    {
        if (IsNews(flag, finding, rule))
        {
            var urgency = rule.Latches && flag.Urgency > finding.Urgency ? flag.Urgency : finding.Urgency;
            return new FlagChange(FlagChangeKind.Escalate, flag, News(flag, finding) with { Urgency = urgency }, finding);
        }

        var after = Show(flag, finding) with { Urgency = rule.Latches ? flag.Urgency : finding.Urgency, IsMet = true };
        return Same(flag, after) ? null : new FlagChange(FlagChangeKind.Join, flag, after, finding);
    }

    private static FlagChange? Settle(LiveFlag flag, bool latches, Finding? clear) => (latches, flag.State) switch
    {
        (true, FlagState.Open) when flag.IsMet => new FlagChange(FlagChangeKind.NoLongerMet, flag, flag with { IsMet = false }, clear),
        (false, FlagState.Open or FlagState.Answered) =>
            new FlagChange(FlagChangeKind.Clear, flag, flag with { State = FlagState.Cleared, IsMet = false, PutOffUntil = null }, clear),
        _ => null,
    };

    /// <summary>Whether the rule fires for the flag's subject, or has not been able to say.</summary>
    private static bool IsHeldUp(LiveFlag flag, IEnumerable<Finding> findings) => findings
        .Where(finding => finding.RuleId == flag.RuleId)
        .Any(finding => finding.Outcome == Outcome.CouldNotBeChecked
            || (finding.Outcome == Outcome.Fires && finding.Subject == flag.Subject)
            || (finding.Outcome == Outcome.CannotTell && (finding.Subject == flag.Subject || finding.Subject.Length == 0)));

    private static Finding? ClearFinding(LiveFlag flag, IEnumerable<Finding> findings) => findings.FirstOrDefault(finding =>
        finding.RuleId == flag.RuleId && finding.Subject == flag.Subject && finding.Outcome == Outcome.Clear);

    /// <summary>More urgent, or a whole step further; without a magnitude there was nothing yet.</summary>
    private static bool IsNews(LiveFlag flag, Finding finding, IRule rule) =>
        finding.Urgency > flag.Urgency || (finding.Magnitude ?? 0) - (flag.Magnitude ?? 0) >= rule.MaterialStep;

    private static bool AnswerStands(LiveFlag flag, IRule rule, DateOnly today) =>
        today <= (flag.AnswerStandsUntil ?? (flag.AnsweredOn ?? flag.EpisodeStart).AddDays(rule.JoinDays));

    private static FlagChange Raise(Finding finding, DateOnly today)
    {
        var flag = new LiveFlag
        {
            RuleId = finding.RuleId,
            Subject = finding.Subject,
            EpisodeStart = today,
            Urgency = finding.Urgency,
            Statement = finding.Statement,
        };
        return new FlagChange(FlagChangeKind.Raise, null, News(flag, finding), finding);
    }

    private static FlagChange Reopen(LiveFlag flag, Finding finding) =>
        new(FlagChangeKind.Reopen, flag, News(flag, finding), finding);

    private static LiveFlag News(LiveFlag flag, Finding finding) => Show(flag, finding) with
    {
        State = FlagState.Open,
        Urgency = finding.Urgency,
        Magnitude = finding.Magnitude,
        IsMet = true,
        AnsweredOn = null,
        AnswerStandsUntil = null,
        PutOffUntil = null,
    };

    private static LiveFlag Show(LiveFlag flag, Finding finding) => flag with
    {
        Statement = finding.Statement,
        Limit = finding.Limit,
        Caution = finding.Caution,
        Evidence = finding.Evidence,
    };

    private static bool Same(LiveFlag one, LiveFlag other) =>
        one.Evidence.SequenceEqual(other.Evidence) && one == other with { Evidence = one.Evidence };
}
