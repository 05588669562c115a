using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Records.Flags;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Reassessment;

/// <summary>
/// The only door from data to flags: reads the whole picture, assesses it by the rule book, and writes the flags and the summary,
/// inside the piece of work that changed the data. Late, corrected and repeated data are therefore harmless.
/// </summary>
public sealed class ReassessPatient(PatientPictureLoader pictures, ProtocolInForce protocol, SummaryWriter summaries)
{
    /// <summary>Answers older than this many days never stand any more.</summary>
    private const int OldestAnswerDays = 400;

    /// <summary>Reassesses one patient as of today. The caller holds the patient.</summary>
    public async Task RunAsync(WorkScope scope, long patientId, CancellationToken cancellation)
    {
        var db = scope.Db;
        var patient = await db.Patients.AsNoTracking().SingleAsync(p => p.Id == patientId, cancellation);
        var picture = await pictures.LoadAsync(db, patient, scope.Today, cancellation);
        var inForce = await protocol.ForAsync(db, patientId, cancellation);
        var findings = patient.LeftOn is null ? RuleBook.Assess(picture, inForce) : [];

        var flags = await StandingFlagsAsync(db, patientId, scope.Today, cancellation);
        var changes = FlagReconciler.Reconcile([.. flags.Select(ToLive)], findings, RuleBook.All, scope.Today);
        var changed = changes.Select(change => (Flag: Apply(scope, flags, change, patientId, inForce.Version), Change: change)).ToList();
        await db.SaveChangesAsync(cancellation);
        db.FlagSteps.AddRange(changed.Select(step => OpenFlags.Step(scope, step.Flag, KindOf(step.Change.Kind), NoteOf(step.Flag, step.Change))));
        await summaries.WriteAsync(scope, patient, picture, findings, flags, cancellation);
    }

    private static async Task<List<Flag>> StandingFlagsAsync(ClinicDb db, long patientId, DateOnly today, CancellationToken cancellation)
    {
        var oldest = today.AddDays(-OldestAnswerDays);
        return await db.Flags
            .Where(flag => flag.PatientId == patientId && (flag.State == FlagState.Open
                || (flag.State == FlagState.Answered && flag.AnsweredOn >= oldest)
                || (flag.State == FlagState.Cleared && flag.EpisodeStart == today)))
            .OrderBy(flag => flag.Id).ToListAsync(cancellation);
    }

    private static Flag Apply(WorkScope scope, List<Flag> flags, FlagChange change, long patientId, int protocolVersion)
    {
        var flag = change.Before is { } before
            ? flags.Single(standing => standing.Id == before.Id)
            : Added(scope, flags, change, patientId);
        if (change.Finding is { Outcome: Outcome.Fires } finding)
        {
            flag.RuleVersion = finding.RuleVersion;
            flag.ProtocolVersion = protocolVersion;
            flag.SourceKeys = string.Join(' ', finding.SourceKeys);
            flag.LastMetOn = scope.Today;
        }

        var after = change.After;
        (flag.State, flag.Urgency, flag.Magnitude) = (after.State, after.Urgency, after.Magnitude);
        (flag.Statement, flag.Limit, flag.Caution) = (after.Statement, after.Limit, after.Caution);
        flag.EvidenceJson = EvidenceText.Write(after.Evidence);
        flag.NoLongerMetOn = after.IsMet ? null : flag.NoLongerMetOn ?? scope.Today;
        Settle(scope, flag, change);
        flag.Version++;
        return flag;
    }

    private static Flag Added(WorkScope scope, List<Flag> flags, FlagChange change, long patientId)
    {
        var flag = new Flag
        {
            PatientId = patientId,
            RuleId = change.After.RuleId,
            Subject = change.After.Subject,
            EpisodeStart = change.After.EpisodeStart,
            Statement = change.After.Statement,
            RaisedAt = scope.Now,
        };
        scope.Db.Flags.Add(flag);
        flags.Add(flag);
        return flag;
    }

    private static void Settle(WorkScope scope, Flag flag, FlagChange change)
    {
        if (change.After.State == FlagState.Cleared)
        {
            (flag.ClearedAt, flag.ClearedBecause) = (scope.Now, WhatCleared(change));
        }

        if (change.Kind is FlagChangeKind.Reopen)
        {
            (flag.AnsweredAt, flag.AnsweredOn, flag.AnsweredByName, flag.Answer, flag.AnswerStandsUntil) = (null, null, null, null, null);
            (flag.ClearedAt, flag.ClearedBecause) = (null, null);
        }

        if (change.After.PutOffUntil is null)
        {
            (flag.PutOffUntil, flag.PutOffBecause) = (null, null);
        }

        if (change.Kind is FlagChangeKind.Raise or FlagChangeKind.Escalate or FlagChangeKind.Reopen)
        {
            (flag.SeenAt, flag.SeenByName) = (null, null);
        }
    }

    private static string? NoteOf(Flag flag, FlagChange change) => change.Kind == FlagChangeKind.Clear ? flag.ClearedBecause : null;

    private static string WhatCleared(FlagChange change) => change.Finding switch
    {
        null => "It no longer applies to this patient.",
        { Statement.Length: > 0 } finding => finding.Statement,
        { Evidence: [var first, ..] } => $"{first.What}: {first.Value}",
        _ => "The data no longer meet the limit.",
    };

    private static FlagStepKind KindOf(FlagChangeKind kind) => kind switch
    {
        FlagChangeKind.Raise => FlagStepKind.Raised,
        FlagChangeKind.Join => FlagStepKind.Joined,
        FlagChangeKind.Escalate => FlagStepKind.Escalated,
        FlagChangeKind.NoLongerMet => FlagStepKind.NoLongerMet,
        FlagChangeKind.Clear => FlagStepKind.Cleared,
        _ => FlagStepKind.Reopened,
    };

    private static LiveFlag ToLive(Flag flag) => new()
    {
        Id = flag.Id,
        RuleId = flag.RuleId,
        Subject = flag.Subject,
        EpisodeStart = flag.EpisodeStart,
        State = flag.State,
        Urgency = flag.Urgency,
        Magnitude = flag.Magnitude,
        IsMet = flag.NoLongerMetOn is null,
        AnsweredOn = flag.AnsweredOn,
        AnswerStandsUntil = flag.AnswerStandsUntil,
        PutOffUntil = flag.PutOffUntil,
        Statement = flag.Statement,
        Limit = flag.Limit,
        Caution = flag.Caution,
        Evidence = EvidenceText.Read(flag.EvidenceJson),
    };
}
