using HfClinic.Clinical.Flags;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Flags;

/// <summary>Notes who first looked at a patient's open flags.</summary>
public sealed class MarkFlagsSeen(ClinicWork work)
{
    /// <summary>Marks the open flags of the patient that nobody has looked at yet.</summary>
    public Task RunAsync(Actor actor, long patientId, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.ReadCharts, async scope =>
        {
            await scope.TakePatientAsync(patientId, cancellation);
            var unseen = await scope.Db.Flags
                .Where(flag => flag.PatientId == patientId && flag.State == FlagState.Open && flag.SeenAt == null)
                .OrderBy(flag => flag.Id).ToListAsync(cancellation);
            foreach (var flag in unseen)
            {
                (flag.SeenAt, flag.SeenByName) = (scope.Now, actor.Name);
                flag.Version++;
                scope.Db.FlagSteps.Add(OpenFlags.Step(scope, flag, FlagStepKind.Seen, null));
            }
        }, cancellation);
}
