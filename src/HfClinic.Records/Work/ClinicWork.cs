using HfClinic.Records.Access;
using HfClinic.Records.Audit;
using HfClinic.Records.Reassessment;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Logging;

namespace HfClinic.Records.Work;

/// <summary>
/// Carries out every change to the record as one transaction: permission, change, reassessment of the patients touched,
/// audit lines, commit, and then the news to open pages. Either all of it holds or none.
/// </summary>
public sealed class ClinicWork(
    IDbContextFactory<ClinicDb> databases, ClinicClock clock, ReassessPatient reassess, ClinicFeed feed, ILogger<ClinicWork> log)
{
    /// <summary>Runs a change that answers with a value.</summary>
    /// <exception cref="NotAllowedException">The actor lacks the capability.</exception>
    /// <exception cref="ChangedMeanwhileException">Somebody else changed the same row meanwhile.</exception>
    public async Task<T> RunAsync<T>(
        Actor actor, Capability needed, Func<WorkScope, Task<T>> work, CancellationToken cancellation = default)
    {
        if (!actor.May(needed))
        {
            throw new NotAllowedException($"{actor.Name} may not do this. It needs one of: {string.Join(", ", Permissions.RolesWith(needed))}.");
        }

        await using var db = await databases.CreateDbContextAsync(cancellation);
        await using var transaction = await db.Database.BeginTransactionAsync(cancellation);
        var scope = new WorkScope(db, actor, clock);
        T result;
        try
        {
            result = await work(scope);
            await scope.SaveAsync(cancellation);
            foreach (var patientId in scope.Touched)
            {
                await reassess.RunAsync(scope, patientId, cancellation);
            }

            await AuditTrail.WriteAsync(scope, cancellation);
        }
        catch (DbUpdateConcurrencyException conflict)
        {
            throw new ChangedMeanwhileException("Somebody else changed this meanwhile. Nothing of yours was saved.", conflict.Entries is [var entry, ..] ? entry.Entity : null);
        }

        await transaction.CommitAsync(cancellation);
        Publish(scope.Touched);
        return result;
    }

    /// <summary>Runs a change that answers with nothing.</summary>
    public Task RunAsync(Actor actor, Capability needed, Func<WorkScope, Task> work, CancellationToken cancellation = default) =>
        RunAsync(actor, needed, async scope =>
        {
            await work(scope);
            return true;
        }, cancellation);

    private void Publish(IReadOnlySet<long> patients)
    {
        try
        {
            feed.Publish(patients);
        }
        catch (AggregateException failure)
        {
            log.LogWarning(failure, "The change is saved, but an open page could not be told of it.");
        }
    }
}
