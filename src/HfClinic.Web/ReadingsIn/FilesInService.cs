using HfClinic.Records;
using HfClinic.Records.Exchange;
using HfClinic.Records.Settings;

namespace HfClinic.Web.ReadingsIn;

/// <summary>Reads queued files in, one after the other, and settles readings-in that a stopped server left open.</summary>
public sealed class FilesInService(
    FilesIn files, ImportFile import, ImportAftermath aftermath, CurrentSettings settings, TimeProvider time, ILogger<FilesInService> log) : BackgroundService
{
    private static readonly TimeSpan Pause = TimeSpan.FromMinutes(1);

    protected override Task ExecuteAsync(CancellationToken stoppingToken)
    {
        files.RemoveLeftovers(time.GetUtcNow().UtcDateTime);
        return Task.WhenAll(ReadInAsync(stoppingToken), SettleAsync(stoppingToken));
    }

    private async Task ReadInAsync(CancellationToken stopping)
    {
        try
        {
            await foreach (var job in files.WaitingAsync(stopping))
            {
                await RunAsync(job, stopping);
            }
        }
        catch (OperationCanceledException) when (stopping.IsCancellationRequested)
        {
            log.LogInformation("No more files are read in: the program is stopping.");
        }
    }

    private async Task RunAsync(ImportJob job, CancellationToken stopping)
    {
        using var either = CancellationTokenSource.CreateLinkedTokenSource(stopping, job.Stopped);
        try
        {
            var id = await import.RunAsync(job.Actor, job.Look, job.Mapping, job, either.Token);
            files.Remove(job);
            job.Finish(id);
        }
        catch (Exception fault) when (fault is RefusedException or NotAllowedException)
        {
            files.Remove(job);
            job.Fail(new Problem("File", fault.Message));
        }
        catch (Exception fault)
        {
            log.LogError(fault, "A file could not be read in to its end.");
            files.Remove(job);
            job.Fail(new Problem("File",
                "The file could not be read in to its end: the record could not be reached or a fault occurred.",
                "What went in so far is kept. Read the same file in again later; nothing goes in twice."));
        }
    }

    private async Task SettleAsync(CancellationToken stopping)
    {
        while (!stopping.IsCancellationRequested)
        {
            try
            {
                if (settings.OrNull is not null)
                {
                    await aftermath.SettleInterruptedAsync(stopping);
                }
            }
            catch (Exception fault) when (!stopping.IsCancellationRequested)
            {
                log.LogError(fault, "Interrupted readings-in could not be settled; this is tried again in a minute.");
            }

            await Task.Delay(Pause, time, stopping).ConfigureAwait(ConfigureAwaitOptions.SuppressThrowing);
        }
    }
}
