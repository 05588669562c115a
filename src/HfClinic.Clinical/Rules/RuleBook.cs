using System.Collections.Frozen;
using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules.Titration;
using HfClinic.Clinical.Rules.Volume;

namespace HfClinic.Clinical.Rules;

/// <summary>All rules, and how a picture is read by them.</summary>
public static class RuleBook
{
    /// <summary>Every rule, one line each, in the order of the generated table.</summary>
    public static readonly ImmutableArray<IRule> All =
    [
        new GainInThreeDays(),
        new GainInSevenDays(),
        new GainInOneDayThreePounds(),
        new GainInOneDayTwoPounds(),
        new LossInSevenDays(),
        new AboveTarget(),
        new FluidGain(),
        new EarlyFluidGain(),
        new AboveTargetTrend(),
        new FluidLoss(),
        new WeightLossOverMonths(),
        new SymptomsReported(),
        new NoWeight(),
        new HeldReadingWaiting(),
        new TargetWeightOld(),
        new TargetWeightStale(),
    ];

    private static readonly FrozenDictionary<string, IRule> ById = All.ToFrozenDictionary(rule => rule.Id, StringComparer.Ordinal);

    /// <summary>The rule of that identity, or null: a flag may be older than this rule book.</summary>
    public static IRule? Find(string ruleId) => ById.GetValueOrDefault(ruleId);

    /// <summary>The rule's name on screen; its identity when this rule book does not know it.</summary>
    public static string TitleOf(string ruleId) => Find(ruleId)?.Title ?? ruleId;

    /// <summary>What every rule says about the picture.</summary>
    public static ImmutableArray<Finding> Assess(PatientPicture picture, ClinicProtocol protocol) => Assess(All, picture, protocol);

    /// <summary>What the given rules say. A rule that fails says so in its own finding; the others are not held up by it.</summary>
    public static ImmutableArray<Finding> Assess(IEnumerable<IRule> rules, PatientPicture picture, ClinicProtocol protocol)
    {
        var titration = new Lazy<TitrationAssessment>(() => TitrationAssessment.Of(picture, protocol));
        return [.. rules.SelectMany(rule => Checked(rule, () => rule is TitrationRule one
            ? one.Read(titration.Value, picture, protocol)
            : rule.Assess(picture, protocol)))];
    }

    private static ImmutableArray<Finding> Checked(IRule rule, Func<IEnumerable<Finding>> read)
    {
        try
        {
            var findings = read().ToImmutableArray();
            var twice = findings.GroupBy(finding => finding.Subject).FirstOrDefault(group => group.Skip(1).Any());
            return twice is null ? findings : [NotChecked(rule, $"it answered twice for '{twice.Key}'")];
        }
#pragma warning disable CA1031 // Whatever a rule throws, the patient's other rules must still be read and the failure be seen.
        catch (Exception fault)
#pragma warning restore CA1031
        {
            return [NotChecked(rule, $"{fault.GetType().Name}: {fault.Message}")];
        }
    }

    private static Finding NotChecked(IRule rule, string fault) => new()
    {
        RuleId = rule.Id,
        RuleVersion = rule.Version,
        Outcome = Outcome.CouldNotBeChecked,
        Statement = $"{rule.Title} could not be checked",
        SourceKeys = rule.SourceKeys,
        Missing = fault,
    };
}
