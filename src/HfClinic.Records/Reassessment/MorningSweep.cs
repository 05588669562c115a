using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Logging;

namespace HfClinic.Records.Reassessment;

/// <summary>
/// Reassesses everybody once a clinic day, for the rules about absence and time. Only one server runs it;
/// one that stops half-way is taken over after some minutes and goes on where it stood.
/// </summary>
public sealed class MorningSweep(ClinicWork work, IDbContextFactory<ClinicDb> databases, ClinicClock clock, ILogger<MorningSweep> log)
{
    private const int BatchSize = 50;
    private static readonly TimeSpan HoldFor = TimeSpan.FromMinutes(5);
    private static readonly Actor Sweeper = Actor.Program("morning sweep");
    private readonly Guid self = Guid.NewGuid();

    /// <summary>Runs today's sweep unless it is done or another server is at it.</summary>
    /// <returns>Whether this call ran it to the end.</returns>
    public async Task<bool> RunIfDueAsync(CancellationToken cancellation)
    {
        var today = clock.Today;
        if (!await ClaimAsync(today, cancellation))
        {
            return false;
        }

        while (await NextBatchAsync(today, cancellation) is { Count: > 0 } batch)
        {
            await SweepAsync(today, batch, cancellation);
        }

        await work.RunAsync(Sweeper, Capability.ReadCharts, async scope =>
        {
            var run = await scope.Db.SweepRuns.SingleAsync(sweep => sweep.Day == today, cancellation);
            run.FinishedAt = scope.Now;
            scope.Note("Morning sweep", detail: $"{run.Patients} patients reassessed, {run.Failed} could not be.");
        }, cancellation);
        return true;
    }

    private async Task<bool> ClaimAsync(DateOnly today, CancellationToken cancellation)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var now = clock.Now;
        var run = await db.SweepRuns.SingleOrDefaultAsync(sweep => sweep.Day == today, cancellation);
        if (run?.FinishedAt is not null || (run is not null && run.HeldBy != self && now - run.HeldAt < HoldFor))
        {
            return false;
        }

        if (run is null)
        {
            db.SweepRuns.Add(new SweepRun { Day = today, HeldAt = now, HeldBy = self });
        }
        else
        {
            (run.HeldAt, run.HeldBy) = (now, self);
        }

        try
        {
            await db.SaveChangesAsync(cancellation);
            return true;
        }
        catch (DbUpdateException taken)
        {
            log.LogInformation(taken, "Another server took the sweep of {Day}.", today);
            return false;
        }
    }

    private async Task<List<long>> NextBatchAsync(DateOnly today, CancellationToken cancellation)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var after = await db.SweepRuns.Where(sweep => sweep.Day == today).Select(sweep => sweep.LastPatientId).SingleAsync(cancellation);
        return await db.Patients.Where(patient => patient.Id > after && patient.LeftOn == null)
            .OrderBy(patient => patient.Id).Select(patient => patient.Id).Take(BatchSize).ToListAsync(cancellation);
    }

    private async Task SweepAsync(DateOnly today, List<long> batch, CancellationToken cancellation)
    {
        try
        {
            await StepAsync(today, batch, failed: 0, cancellation);
        }
        catch (Exception failure) when (failure is not OperationCanceledException)
        {
            log.LogWarning(failure, "A batch of the sweep failed; its patients are taken one by one.");
            foreach (var patient in batch)
            {
                await SweepOneAsync(today, patient, cancellation);
            }
        }
    }

    private async Task SweepOneAsync(DateOnly today, long patient, CancellationToken cancellation)
    {
        try
        {
            await StepAsync(today, [patient], failed: 0, cancellation);
        }
        catch (Exception failure) when (failure is not OperationCanceledException and not ChangedMeanwhileException)
        {
            log.LogError(failure, "Patient {PatientId} could not be reassessed in the sweep.", patient);
            await StepAsync(today, [], failed: 1, cancellation, upTo: patient);
        }
    }

    /// <summary>Reassesses and notes how far the sweep is, in one transaction, if this server still holds the day.</summary>
    private Task StepAsync(DateOnly today, List<long> patients, int failed, CancellationToken cancellation, long? upTo = null) =>
        work.RunAsync(Sweeper, Capability.ReadCharts, async scope =>
        {
            var run = await scope.Db.SweepRuns.SingleAsync(sweep => sweep.Day == today, cancellation);
            if (run.HeldBy != self)
            {
                throw new ChangedMeanwhileException("Another server took over this sweep.");
            }

            run.HeldAt = scope.Now;
            run.LastPatientId = upTo ?? patients[^1];
            run.Patients += patients.Count;
            run.Failed += failed;
            await scope.TakePatientsAsync(patients, cancellation);
        }, cancellation);
}
