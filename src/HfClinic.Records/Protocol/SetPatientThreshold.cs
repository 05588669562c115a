using HfClinic.Clinical.Rules;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Protocol;

/// <summary>A prescriber sets a threshold for one patient, or goes back to the clinic's.</summary>
public sealed class SetPatientThreshold(ClinicWork work, ProtocolInForce protocol)
{
    /// <summary>Sets the threshold from now on.</summary>
    /// <exception cref="RefusedException">Unknown threshold, a value outside its safe range, or no reason.</exception>
    public Task RunAsync(
        Actor actor, long patientId, string key, decimal value, bool isOn, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.SetThresholds, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            if (!protocol.Clinic.Thresholds.TryGetValue(key, out var threshold))
            {
                throw new RefusedException(new Problem("Key", $"There is no threshold '{key}'."));
            }

            if (value < threshold.Lowest || value > threshold.Highest)
            {
                throw new RefusedException(new Problem("Value",
                    $"{value:0.###} {threshold.Unit} is outside the safe range.",
                    $"Give a value from {threshold.Lowest:0.###} to {threshold.Highest:0.###} {threshold.Unit}."));
            }

            await EndAsync(scope, patientId, key, cancellation);
            scope.Db.PatientThresholds.Add(new PatientThreshold
            {
                PatientId = patientId,
                Key = key,
                Value = value,
                IsOn = isOn,
                Reason = because,
                RecordedAt = scope.Now,
                ById = actor.UserId,
                ByName = actor.Name,
            });
        }, cancellation);

    /// <summary>Goes back to the clinic's threshold.</summary>
    public Task RemoveAsync(Actor actor, long patientId, string key, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.SetThresholds, scope => EndAsync(scope, patientId, key, cancellation), cancellation);

    private static async Task EndAsync(WorkScope scope, long patientId, string key, CancellationToken cancellation)
    {
        await scope.TakePatientAsync(patientId, cancellation);
        var current = await scope.Db.PatientThresholds
            .SingleOrDefaultAsync(t => t.PatientId == patientId && t.Key == key && t.EndedAt == null, cancellation);
        if (current is not null)
        {
            current.EndedAt = scope.Now;
            await scope.SaveAsync(cancellation);
        }
    }
}
