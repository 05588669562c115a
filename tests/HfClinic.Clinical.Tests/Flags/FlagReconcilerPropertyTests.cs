using CsCheck;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Flags;

public class FlagReconcilerPropertyTests
{
    private static readonly string[] RuleIds = [new GainInThreeDays().Id, new SymptomsReported().Id, new NoWeight().Id, new TargetWeightOld().Id];

    private static readonly Gen<(string Rule, string Subject)> Keys = Gen.Select(Gen.Int[0, 3].Select(index => RuleIds[index]), Gen.Bool.Select(one => one ? "swelling" : ""));

    private static readonly Gen<DateOnly> Days = Gen.Int[-40, 0].Select(Today.AddDays);

    private static readonly Gen<decimal?> Magnitudes = Gen.Int[-1, 20].Select(step => step < 0 ? (decimal?)null : step * 400m);

    private static readonly Gen<string> Statements = Gen.Bool.Select(one => one ? "one" : "another");

    private static readonly Gen<Finding[]> Findings = Gen
        .Select(Keys, Gen.Enum<Outcome>(), Gen.Enum<Urgency>(), Magnitudes, Statements)
        .Select((key, outcome, urgency, magnitude, statement) => new Finding
        {
            RuleId = key.Rule,
            RuleVersion = 1,
            Subject = key.Subject,
            Outcome = outcome,
            Urgency = urgency,
            Magnitude = magnitude,
            Statement = statement,
            Evidence = [new Evidence("Seen", statement, Today, RaisedIt: true)],
        })
        .Array[0, 8]
        .Select(findings => findings.DistinctBy(finding => (finding.RuleId, finding.Subject)).ToArray());

    private static readonly Gen<LiveFlag[]> Flags = Gen
        .Select(Keys, Gen.Enum<FlagState>(), Gen.Enum<Urgency>(), Magnitudes, Days, Days, Gen.Bool)
        .Select((key, state, urgency, magnitude, start, answered, met) => new LiveFlag
        {
            RuleId = key.Rule,
            Subject = key.Subject,
            EpisodeStart = start,
            State = state,
            Urgency = urgency,
            Magnitude = magnitude,
            IsMet = met,
            AnsweredOn = state == FlagState.Answered ? answered : null,
            PutOffUntil = state == FlagState.Open && met ? Today.AddDays(3) : null,
            Statement = "one",
        })
        .Array[0, 8]
        .Select(flags => flags
            .DistinctBy(flag => (flag.RuleId, flag.Subject, flag.EpisodeStart))
            .DistinctBy(flag => (flag.RuleId, flag.Subject, flag.State == FlagState.Open ? 0 : flag.EpisodeStart.DayNumber))
            .ToArray());

    [Fact]
    public void Doing_it_twice_changes_nothing_more() => Gen.Select(Flags, Findings).Sample((flags, findings) =>
    {
        var after = Apply(flags, Reconcile(flags, findings));

        Assert.Empty(Reconcile(after, findings));
    });

    [Fact]
    public void No_two_flags_share_an_identity_and_one_is_open_at_most() => Gen.Select(Flags, Findings).Sample((flags, findings) =>
    {
        var after = Apply(flags, Reconcile(flags, findings));

        Assert.Distinct(after.Select(flag => (flag.RuleId, flag.Subject, flag.EpisodeStart)));
        Assert.Distinct(after.Where(flag => flag.State == FlagState.Open).Select(flag => (flag.RuleId, flag.Subject)));
    });

    [Fact]
    public void An_open_flag_of_a_latching_rule_stays_open() => Gen.Select(Flags, Findings).Sample((flags, findings) =>
    {
        var latching = RuleBook.All.Where(rule => rule.Latches).Select(rule => rule.Id).ToHashSet();
        var after = Apply(flags, Reconcile(flags, findings));

        Assert.Equal(0, flags.Count(flag => flag.State == FlagState.Open && latching.Contains(flag.RuleId)
            && !after.Any(other => other.State == FlagState.Open && other.RuleId == flag.RuleId && other.Subject == flag.Subject)));
    });

    [Fact]
    public void What_fires_is_open_or_its_answer_stands() => Gen.Select(Flags, Findings).Sample((flags, findings) =>
    {
        var after = Apply(flags, Reconcile(flags, findings));

        Assert.All(findings.Where(finding => finding.Outcome == Outcome.Fires), finding =>
            Assert.Contains(after, flag => flag.RuleId == finding.RuleId && flag.Subject == finding.Subject && flag.State != FlagState.Cleared));
    });

    private static System.Collections.Immutable.ImmutableArray<FlagChange> Reconcile(LiveFlag[] flags, Finding[] findings) =>
        FlagReconciler.Reconcile(flags, findings, RuleBook.All, Today);

    private static LiveFlag[] Apply(LiveFlag[] flags, IReadOnlyCollection<FlagChange> changes) =>
    [
        .. flags.Select(flag => changes.SingleOrDefault(change => ReferenceEquals(change.Before, flag))?.After ?? flag),
        .. changes.Where(change => change.Before is null).Select(change => change.After),
    ];
}
