using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Logging;

namespace HfClinic.Records.Exchange;

/// <summary>
/// What follows the last line: the patients touched are reassessed, then the reading-in is closed. A reading-in whose server stopped is
/// found by its missing signs of life and settled the same way, because its readings carry its number.
/// </summary>
public sealed class ImportAftermath(
    ClinicWork work, IDbContextFactory<ClinicDb> databases, ClinicClock clock, ILogger<ImportAftermath> log)
{
    private const int PatientsAtOnce = 20;
    private static readonly TimeSpan SilentFor = TimeSpan.FromMinutes(2);
    private static readonly Actor Settler = Actor.Program("reading-in of files");

    /// <summary>Settles the readings-in that nobody works at any more.</summary>
    /// <returns>How many there were.</returns>
    public async Task<int> SettleInterruptedAsync(CancellationToken cancellation)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var silentSince = clock.Now - SilentFor;
        var silent = await db.ImportRuns.AsNoTracking()
            .Where(run => run.State == ImportState.Running && run.HeartbeatAt < silentSince).ToListAsync(cancellation);
        var settled = 0;
        foreach (var run in silent)
        {
            var taken = await db.ImportRuns.Where(other => other.Id == run.Id && other.State == ImportState.Running && other.HeartbeatAt == run.HeartbeatAt)
                .ExecuteUpdateAsync(set => set.SetProperty(other => other.HeartbeatAt, clock.Now), cancellation);
            if (taken == 1)
            {
                log.LogWarning("Import {ImportId} was interrupted; its patients are reassessed now.", run.Id);
                var owed = await db.Readings.Where(reading => reading.ImportId == run.Id)
                    .Select(reading => reading.PatientId).Distinct().ToListAsync(cancellation);
                await CloseAsync(Settler, run.Id, owed, ImportState.Interrupted, null, cancellation);
                settled++;
            }
        }

        return settled;
    }

    /// <summary>Reassesses the patients and closes the reading-in.</summary>
    /// <param name="onReassessed">Called with how many are done and how many there are.</param>
    internal async Task CloseAsync(
        Actor actor, long importId, IReadOnlyCollection<long> owed, ImportState state, Action<int, int>? onReassessed, CancellationToken cancellation)
    {
        var done = 0;
        foreach (var patients in owed.Order().Chunk(PatientsAtOnce))
        {
            onReassessed?.Invoke(done, owed.Count);
            await ReassessAsync(actor, importId, patients, cancellation);
            done += patients.Length;
        }

        await work.RunAsync(actor, Capability.ImportFiles, async scope =>
        {
            var run = await scope.Db.ImportRuns.SingleAsync(import => import.Id == importId, cancellation);
            (run.State, run.FinishedAt) = (state, scope.Now);
        }, cancellation);
    }

    private async Task ReassessAsync(Actor actor, long importId, long[] patients, CancellationToken cancellation)
    {
        try
        {
            await ReassessTogetherAsync(actor, importId, patients, cancellation);
        }
        catch (Exception failure) when (patients.Length > 1 && failure is not OperationCanceledException)
        {
            log.LogWarning(failure, "Patients of import {ImportId} could not be reassessed together; they are taken one by one.", importId);
            foreach (var patient in patients)
            {
                await ReassessAsync(actor, importId, [patient], cancellation);
            }
        }
    }

    private Task ReassessTogetherAsync(Actor actor, long importId, long[] patients, CancellationToken cancellation) =>
        work.RunAsync(actor, Capability.ImportFiles, async scope =>
        {
            await scope.Db.ImportRuns.Where(run => run.Id == importId)
                .ExecuteUpdateAsync(set => set.SetProperty(run => run.HeartbeatAt, scope.Now), cancellation);
            await scope.TakePatientsAsync(patients, cancellation);
        }, cancellation);
}
