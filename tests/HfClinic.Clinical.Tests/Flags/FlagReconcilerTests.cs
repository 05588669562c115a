using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Flags;

/// <summary>How flags live is a design of this program, no published source.</summary>
public class FlagReconcilerTests
{
    private static readonly string Latching = new GainInThreeDays().Id;

    private static readonly string Passing = new NoWeight().Id;

    private static readonly LiveFlag Open = new()
    {
        Id = 7,
        RuleId = Latching,
        EpisodeStart = Today.AddDays(-5),
        Urgency = Urgency.ThisWeek,
        Magnitude = 2_500,
        Statement = "Gained 2.5 kg in 3 days",
    };

    private static readonly LiveFlag Answered = Open with { State = FlagState.Answered, AnsweredOn = Today.AddDays(-3) };

    private static readonly Finding Fires = new()
    {
        RuleId = Latching,
        RuleVersion = 1,
        Outcome = Outcome.Fires,
        Urgency = Urgency.ThisWeek,
        Magnitude = 2_500,
        Statement = Open.Statement,
    };

    private static readonly Finding Clear = Fires with { Outcome = Outcome.Clear };

    [Fact]
    public void A_finding_without_a_flag_raises_one()
    {
        var change = Assert.Single(Reconcile([], Fires));

        Assert.Equal((FlagChangeKind.Raise, null), (change.Kind, change.Before));
        Assert.Equal(Open with { Id = 0, EpisodeStart = Today, Evidence = change.After.Evidence }, change.After);
    }

    [Fact]
    public void The_same_finding_again_changes_nothing() => Assert.Empty(Reconcile([Open], Fires));

    [Fact]
    public void Another_subject_is_another_flag() =>
        Assert.Equal(FlagChangeKind.Raise, Assert.Single(Reconcile([Open], Fires, Fires with { Subject = "swelling" })).Kind);

    [Theory]
    [InlineData(2_600)]
    [InlineData(3_499)]
    public void A_little_more_joins_the_flag_and_keeps_what_was_news(int magnitude)
    {
        var change = Assert.Single(Reconcile([Open], Fires with { Magnitude = magnitude, Statement = "Gained more" }));

        Assert.Equal(FlagChangeKind.Join, change.Kind);
        Assert.Equal(Open with { Statement = "Gained more", Evidence = change.After.Evidence }, change.After);
    }

    [Fact]
    public void New_evidence_alone_joins() =>
        Assert.Equal(FlagChangeKind.Join, Assert.Single(Reconcile([Open], Fires with { Evidence = [new("Today", "82.0 kg")] })).Kind);

    [Theory]
    [InlineData(3_500, Urgency.ThisWeek)]
    [InlineData(2_500, Urgency.Today)]
    public void Materially_more_or_more_urgent_escalates_and_ends_a_putting_off(int magnitude, Urgency urgency)
    {
        var putOff = Open with { PutOffUntil = Today.AddDays(4) };

        var change = Assert.Single(Reconcile([putOff], Fires with { Magnitude = magnitude, Urgency = urgency }));

        Assert.Equal(FlagChangeKind.Escalate, change.Kind);
        Assert.Equal((null, magnitude, urgency), (change.After.PutOffUntil, (int)change.After.Magnitude!, change.After.Urgency));
    }

    [Fact]
    public void Small_steps_add_up_to_a_large_one()
    {
        var flag = Assert.Single(Reconcile([Open], Fires with { Magnitude = 3_100, Statement = "3.1" })).After;

        Assert.Equal(FlagChangeKind.Escalate, Assert.Single(Reconcile([flag], Fires with { Magnitude = 3_500 })).Kind);
    }

    [Fact]
    public void A_magnitude_where_there_was_none_is_news() =>
        Assert.Equal(FlagChangeKind.Escalate, Assert.Single(Reconcile([Open with { Magnitude = null }], Fires with { Magnitude = 1_000 })).Kind);

    [Fact]
    public void A_putting_off_outlasts_the_same_finding() =>
        Assert.Equal(Today.AddDays(4), Assert.Single(Reconcile([Open with { PutOffUntil = Today.AddDays(4) }], Fires with { Statement = "x" })).After.PutOffUntil);

    [Fact]
    public void A_latching_flag_keeps_its_highest_urgency() =>
        Assert.Equal(Urgency.Today, Assert.Single(Reconcile([Open with { Urgency = Urgency.Today }], Fires with { Statement = "x" })).After.Urgency);

    [Fact]
    public void A_latching_flag_stays_open_when_its_limit_is_no_longer_met()
    {
        var change = Assert.Single(Reconcile([Open], Clear));

        Assert.Equal((FlagChangeKind.NoLongerMet, FlagState.Open, false), (change.Kind, change.After.State, change.After.IsMet));
        Assert.Empty(Reconcile([change.After], Clear));
        Assert.Equal((FlagChangeKind.Join, true), Reconcile([change.After], Fires) is [var again] ? (again.Kind, again.After.IsMet) : default);
    }

    [Theory]
    [InlineData(FlagState.Open)]
    [InlineData(FlagState.Answered)]
    public void A_passing_flag_is_cleared_by_the_data_with_what_cleared_it(FlagState state)
    {
        var clear = Clear with { RuleId = Passing, Evidence = [new("Last weight", "80.0 kg", Today, 9)] };

        var change = Assert.Single(Reconcile([Open with { RuleId = Passing, State = state }], clear));

        Assert.Equal((FlagChangeKind.Clear, FlagState.Cleared), (change.Kind, change.After.State));
        Assert.Equal(9, Assert.Single(change.Finding!.Evidence).ReadingId);
    }

    [Fact]
    public void A_passing_flag_is_cleared_when_its_rule_no_longer_applies() =>
        Assert.Equal((FlagChangeKind.Clear, null), Reconcile([Open with { RuleId = Passing }]) is [var change] ? (change.Kind, change.Finding) : default);

    [Theory]
    [InlineData(Outcome.CannotTell)]
    [InlineData(Outcome.CouldNotBeChecked)]
    public void Nothing_is_cleared_by_a_rule_that_does_not_know(Outcome outcome)
    {
        var flag = Open with { RuleId = Passing, Subject = "swelling" };

        Assert.Empty(Reconcile([flag, Open], Clear with { RuleId = Passing, Outcome = outcome }, Clear with { Outcome = outcome }));
    }

    [Fact]
    public void A_rule_that_does_not_know_one_subject_clears_another()
    {
        LiveFlag[] flags = [Open with { RuleId = Passing, Subject = "a" }, Open with { RuleId = Passing, Subject = "b" }];
        var cannotTell = Clear with { RuleId = Passing, Outcome = Outcome.CannotTell, Subject = "a" };

        var change = Assert.Single(Reconcile(flags, cannotTell, Clear with { RuleId = Passing, Subject = "b" }));

        Assert.Equal(("b", FlagState.Cleared), (change.After.Subject, change.After.State));
    }

    [Fact]
    public void Flags_of_a_rule_that_was_not_assessed_are_left_alone() =>
        Assert.Empty(Reconcile([Open with { RuleId = "retired.rule" }]));

    [Theory]
    [InlineData(3_499, Urgency.ThisWeek, false)]
    [InlineData(3_500, Urgency.ThisWeek, true)]
    [InlineData(2_500, Urgency.Today, true)]
    public void An_answer_stands_unless_the_evidence_is_materially_worse(int magnitude, Urgency urgency, bool reopens)
    {
        var changes = Reconcile([Answered], Fires with { Magnitude = magnitude, Urgency = urgency });

        Assert.Equal(reopens, changes is [{ Kind: FlagChangeKind.Reopen, After: { Id: 7, State: FlagState.Open, AnsweredOn: null } }]);
        Assert.Equal(reopens, changes.Length == 1);
    }

    [Theory]
    [InlineData(-6, null, false)]
    [InlineData(-7, null, false)]
    [InlineData(-8, null, true)]
    [InlineData(-30, 0, false)]
    [InlineData(-30, -1, true)]
    [InlineData(-2, -1, true)]
    public void When_an_answer_no_longer_stands_a_new_episode_begins(int answeredOn, int? standsUntil, bool raises)
    {
        var flag = Answered with
        {
            EpisodeStart = Today.AddDays(-40),
            AnsweredOn = Today.AddDays(answeredOn),
            AnswerStandsUntil = standsUntil is { } day ? Today.AddDays(day) : null,
        };

        var changes = Reconcile([flag], Fires);

        Assert.Equal(raises, changes is [{ Kind: FlagChangeKind.Raise, Before: null }]);
        Assert.Equal(raises, changes.Length == 1);
    }

    [Fact]
    public void An_answered_flag_is_not_touched_when_the_limit_is_no_longer_met() => Assert.Empty(Reconcile([Answered], Clear));

    [Theory]
    [InlineData(0, FlagChangeKind.Reopen)]
    [InlineData(-1, FlagChangeKind.Raise)]
    public void A_cleared_flag_of_the_same_day_is_reopened_since_its_identity_is_taken(int start, FlagChangeKind expected)
    {
        var cleared = Open with { RuleId = Passing, State = FlagState.Cleared, IsMet = false, EpisodeStart = Today.AddDays(start) };

        Assert.Equal(expected, Assert.Single(Reconcile([cleared], Fires with { RuleId = Passing })).Kind);
    }

    private static System.Collections.Immutable.ImmutableArray<FlagChange> Reconcile(LiveFlag[] flags, params Finding[] findings) =>
        FlagReconciler.Reconcile(flags, findings, RuleBook.All, Today);
}
