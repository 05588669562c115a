using HfClinic.Records;
using Microsoft.AspNetCore.Diagnostics.HealthChecks;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Diagnostics.HealthChecks;

namespace HfClinic.Web.Endpoints;

/// <summary>Two addresses for whoever watches the server: is the program alive, and can it work.</summary>
public static class HealthEndpoints
{
    public const string Ready = "ready";

    public static void MapHealth(this IEndpointRouteBuilder endpoints)
    {
        endpoints.MapHealthChecks("/health/live", new HealthCheckOptions { Predicate = _ => false }).AllowAnonymous();
        endpoints.MapHealthChecks("/health/ready", new HealthCheckOptions { Predicate = check => check.Tags.Contains(Ready) }).AllowAnonymous();
    }
}

/// <summary>Ready means: the database answers and is up to this version of the program.</summary>
public sealed class DatabaseCheck(IDbContextFactory<ClinicDb> databases) : IHealthCheck
{
    public async Task<HealthCheckResult> CheckHealthAsync(HealthCheckContext context, CancellationToken cancellationToken = default)
    {
        try
        {
            await using var db = await databases.CreateDbContextAsync(cancellationToken);
            var pending = await db.Database.GetPendingMigrationsAsync(cancellationToken);
            return pending.Any() ? HealthCheckResult.Unhealthy("The database waits for a migration.") : HealthCheckResult.Healthy();
        }
        catch (Exception failure) when (failure is not OperationCanceledException)
        {
            return HealthCheckResult.Unhealthy("The database does not answer.", failure);
        }
    }
}
