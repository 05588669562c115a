using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Patients;

/// <summary>Records the weight the prescriber wants from a day on.</summary>
public sealed class SetTargetWeight(ClinicWork work)
{
    /// <summary>Adds a target; the earlier ones stay on record.</summary>
    /// <exception cref="RefusedException">Outside 25 to 300 kg, in the future, or without a reason.</exception>
    public Task<long> RunAsync(
        Actor actor, long patientId, Weight target, DateOnly from, string? reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.SetTargetWeight, async scope =>
        {
            await scope.TakePatientAsync(patientId, cancellation);
            return await AddAsync(scope, patientId, target, from, reason, cancellation);
        }, cancellation);

    /// <summary>Takes a wrong target out; it stays visible as struck out.</summary>
    public Task StrikeOutAsync(Actor actor, long targetId, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.SetTargetWeight, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            var patientId = await scope.Db.TargetWeights.Where(t => t.Id == targetId).Select(t => (long?)t.PatientId).SingleOrDefaultAsync(cancellation)
                ?? throw new NotFoundException("There is no such target weight.");
            await scope.TakePatientAsync(patientId, cancellation);
            var target = await scope.Db.TargetWeights.SingleAsync(t => t.Id == targetId, cancellation);
            if (target.StruckOutAt is not null)
            {
                throw new ChangedMeanwhileException("This target weight was struck out meanwhile.");
            }

            (target.StruckOutAt, target.StruckOutBecause) = (scope.Now, because);
        }, cancellation);

    internal static async Task<long> AddAsync(
        WorkScope scope, long patientId, Weight target, DateOnly from, string? reason, CancellationToken cancellation)
    {
        var because = TextRules.Optional("Reason", "The reason", reason, 400);
        if (!target.IsInEntryRange)
        {
            throw new RefusedException(new Problem("Target", $"{target} is outside 25 to 300 kg.", "Check the number and its unit."));
        }

        if (from > scope.Today)
        {
            throw new RefusedException(new Problem("From", "The day lies in the future.", "Give today or an earlier day."));
        }

        var row = new TargetWeight
        {
            PatientId = patientId,
            From = from,
            Grams = target.Grams,
            Reason = because,
            ById = scope.Actor.UserId,
            ByName = scope.Actor.Name,
            RecordedAt = scope.Now,
        };
        scope.Db.TargetWeights.Add(row);
        await scope.SaveAsync(cancellation);
        return row.Id;
    }
}
