using HfClinic.Records.Settings;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;

namespace HfClinic.Records.Reassessment;

/// <summary>Looks every minute whether today's sweep is still due: at start-up if it was missed, and when a clinic day begins.</summary>
public sealed class MorningSweepService(
    MorningSweep sweep, CurrentSettings settings, TimeProvider time, ILogger<MorningSweepService> log) : BackgroundService
{
    private static readonly TimeSpan Pause = TimeSpan.FromMinutes(1);

    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        while (!stoppingToken.IsCancellationRequested)
        {
            try
            {
                if (settings.OrNull is not null)
                {
                    await sweep.RunIfDueAsync(stoppingToken);
                }

                await Task.Delay(Pause, time, stoppingToken);
            }
            catch (OperationCanceledException) when (stoppingToken.IsCancellationRequested)
            {
                return;
            }
            catch (Exception failure)
            {
                log.LogError(failure, "The morning sweep stopped; it is tried again in a minute.");
                await Task.Delay(Pause, time, stoppingToken);
            }
        }
    }
}
