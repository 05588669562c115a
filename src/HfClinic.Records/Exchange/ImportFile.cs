using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Logging;

namespace HfClinic.Records.Exchange;

/// <summary>
/// Reads a file in: batch by batch, each a transaction of its own with its part of the report, so that an interruption leaves whole
/// batches and the same file read in again adds only what is missing.
/// </summary>
public sealed class ImportFile(ClinicWork work, ImportAftermath aftermath, ClinicClock clock, ILogger<ImportFile> log)
{
    /// <summary>Reads the file in and reassesses the patients it touches.</summary>
    /// <param name="look">The first look at the file.</param>
    /// <param name="mapping">What the person said about it.</param>
    /// <param name="progress">Told after every batch.</param>
    /// <param name="cancellation">Stops after the batch under way; what is in stays in, and its patients are reassessed.</param>
    /// <returns>The number of the reading-in, for its report.</returns>
    /// <exception cref="RefusedException">The mapping leaves something open, or the file is not a list of lines to its end.</exception>
    /// <exception cref="NotAllowedException">The actor may not read files in.</exception>
    public async Task<long> RunAsync(
        Actor actor, FileLook look, FileMapping mapping, IProgress<ImportProgress>? progress = null, CancellationToken cancellation = default)
    {
        var problems = mapping.Problems(look);
        if (problems.Count > 0)
        {
            throw new RefusedException(problems);
        }

        ILineTaker taker = mapping.Kind == ImportKind.Roster ? new RosterLines(mapping) : new ReadingLines(mapping, clock);
        await using var lines = await CsvLines.OpenAsync(look.Path, look.Encoding, cancellation);
        var importId = await BeginAsync(actor, look, mapping, cancellation);
        ImportState state;
        try
        {
            state = await TakeLinesAsync(actor, importId, look, lines, taker, progress, cancellation);
        }
        catch (Exception fault)
        {
            log.LogError(fault, "Import {ImportId} of {Kind} stopped at a fault.", importId, mapping.Kind);
            await TryCloseAsync(actor, importId, taker);
            throw;
        }

        await aftermath.CloseAsync(actor, importId, taker.Owed, state,
            (done, all) => progress?.Report(new(importId, look.Bytes, look.Bytes, look.Lines, done, all)), CancellationToken.None);
        return importId;
    }

    /// <summary>When even this fails (the database is away), the reading-in is settled later by its missing signs of life.</summary>
    private async Task TryCloseAsync(Actor actor, long importId, ILineTaker taker)
    {
        try
        {
            await aftermath.CloseAsync(actor, importId, taker.Owed, ImportState.Interrupted, null, CancellationToken.None);
        }
        catch (Exception fault) when (fault is System.Data.Common.DbException or DbUpdateException or InvalidOperationException)
        {
            log.LogWarning(fault, "Import {ImportId} could not be closed now; it is settled later.", importId);
        }
    }

    private Task<long> BeginAsync(Actor actor, FileLook look, FileMapping mapping, CancellationToken cancellation) =>
        work.RunAsync(actor, Capability.ImportFiles, async scope =>
        {
            var run = new ImportRun
            {
                Kind = mapping.Kind,
                FileName = look.FileName.Length <= 260 ? look.FileName : look.FileName[^260..],
                StartedAt = scope.Now,
                HeartbeatAt = scope.Now,
                ById = actor.UserId,
                ByName = actor.Name,
            };
            scope.Db.ImportRuns.Add(run);
            await scope.SaveAsync(cancellation);
            return run.Id;
        }, cancellation);

    private async Task<ImportState> TakeLinesAsync(
        Actor actor, long importId, FileLook look, CsvLines lines, ILineTaker taker, IProgress<ImportProgress>? progress, CancellationToken cancellation)
    {
        var taken = 0;
        try
        {
            await foreach (var batch in lines.ReadAsync(cancellation).Chunk(taker.BatchSize).WithCancellation(cancellation))
            {
                await TakeBatchAsync(actor, importId, batch, taker, cancellation);
                taken += batch.Length;
                progress?.Report(new(importId, lines.BytesRead, look.Bytes, taken));
            }

            return ImportState.Done;
        }
        catch (OperationCanceledException) when (cancellation.IsCancellationRequested)
        {
            return ImportState.Stopped;
        }
    }

    /// <summary>A batch that collides with somebody else's work, for example the same file read in twice at once, is tried once more.</summary>
    private async Task TakeBatchAsync(Actor actor, long importId, CsvLine[] batch, ILineTaker taker, CancellationToken cancellation)
    {
        try
        {
            await TakeOnceAsync(actor, importId, batch, taker, cancellation);
        }
        catch (Exception failure) when (failure is System.Data.Common.DbException or DbUpdateException or ChangedMeanwhileException)
        {
            log.LogWarning(failure, "A batch of import {ImportId} from line {Line} did not hold; it is tried once more.", importId, batch[0].Number);
            taker.Forget();
            await TakeOnceAsync(actor, importId, batch, taker, cancellation);
        }
    }

    private Task TakeOnceAsync(Actor actor, long importId, CsvLine[] batch, ILineTaker taker, CancellationToken cancellation) =>
        work.RunAsync(actor, Capability.ImportFiles, async scope =>
        {
            var outcomes = await taker.TakeAsync(scope, importId, batch, cancellation);
            var runs = scope.Db.ImportRuns.Where(run => run.Id == importId);
            var before = await runs.AsNoTracking().SingleAsync(cancellation);
            scope.Db.ImportLines.AddRange(outcomes.ToKeep(before));
            var later = outcomes.Count(line => ReferenceEquals(line.Fault, LineFault.Later));
            await runs.ExecuteUpdateAsync(set => set
                .SetProperty(run => run.Lines, run => run.Lines + outcomes.Count)
                .SetProperty(run => run.Accepted, run => run.Accepted + outcomes.Count(ImportLineOutcome.Accepted))
                .SetProperty(run => run.Later, run => run.Later + later)
                .SetProperty(run => run.Duplicates, run => run.Duplicates + outcomes.Count(ImportLineOutcome.Duplicate))
                .SetProperty(run => run.Held, run => run.Held + outcomes.Count(ImportLineOutcome.Held))
                .SetProperty(run => run.Refused, run => run.Refused + outcomes.Count(ImportLineOutcome.Refused))
                .SetProperty(run => run.HeartbeatAt, scope.Now), cancellation);
        }, cancellation);
}
