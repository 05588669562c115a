using HfClinic.Clinical.Flags;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Flags;

/// <summary>What the verbs on flags share.</summary>
internal static class OpenFlags
{
    /// <summary>Takes the flag's patient, then reads the flag, which must be open.</summary>
    public static async Task<Flag> TakeAsync(WorkScope scope, long flagId, CancellationToken cancellation)
    {
        var patientId = await scope.Db.Flags.Where(flag => flag.Id == flagId).Select(flag => (long?)flag.PatientId).SingleOrDefaultAsync(cancellation)
            ?? throw new NotFoundException("There is no such flag.");
        await scope.TakePatientAsync(patientId, cancellation);
        var flag = await scope.Db.Flags.SingleAsync(f => f.Id == flagId, cancellation);
        return flag.State == FlagState.Open
            ? flag
            : throw new ChangedMeanwhileException(
                $"This flag was {(flag.State == FlagState.Answered ? $"settled by {flag.AnsweredByName}" : "cleared by newer data")} meanwhile. Nothing of yours was saved.", flag);
    }

    /// <summary>A step that keeps what the flag shows at this moment.</summary>
    public static FlagStep Step(WorkScope scope, Flag flag, FlagStepKind kind, string? note) => new()
    {
        FlagId = flag.Id,
        PatientId = flag.PatientId,
        Kind = kind,
        At = scope.Now,
        ById = scope.Actor.UserId,
        ByName = scope.Actor.Name,
        Urgency = flag.Urgency,
        Statement = flag.Statement,
        Limit = flag.Limit,
        Caution = flag.Caution,
        EvidenceJson = flag.EvidenceJson,
        RuleVersion = flag.RuleVersion,
        ProtocolVersion = flag.ProtocolVersion,
        Note = note,
    };
}
