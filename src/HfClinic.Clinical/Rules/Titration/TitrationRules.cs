using System.Collections.Immutable;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// The rules about titration. They read members of the picture that the record does not fill yet, and join <see cref="RuleBook.All"/> when
/// it does.
/// </summary>
public static class TitrationRules
{
    /// <summary>Every titration rule, one line each, in the order of the generated table.</summary>
    public static readonly ImmutableArray<IRule> All =
    [
        new PillarNotCovered(),
        new BelowTargetAndDue(),
        new TitrationOverdue(),
        new TitrationHeld(),
        new TitrationCheckDue(),
        new BetaBlockerNotEvidenceBased(),
        new SaltNotRecorded(),
        new StepDoneLabDue(),
        new StoppedAfterImprovement(),
        new LimitExpired(),
        new RegimenNotAtTarget(),
        new PostDischargeStep(),
        new IvabradineNotInSinusRhythm(),
        new TitrationInformation(),
    ];
}
