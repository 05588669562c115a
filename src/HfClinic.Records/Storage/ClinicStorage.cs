using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Logging;

namespace HfClinic.Records.Storage;

/// <summary>Brings the database up to this version of the program at start-up.</summary>
public sealed class ClinicStorage(
    IDbContextFactory<ClinicDb> databases, CurrentSettings settings, ILogger<ClinicStorage> log)
{
    /// <summary>Migrates, applies the safeguards and reads the settings. Safe when several servers start at once.</summary>
    public async Task PrepareAsync(CancellationToken cancellation)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var isPostgreSql = db.Database.IsNpgsql();
        if (!isPostgreSql)
        {
            await RemoveStaleLockAsync(db, cancellation);
        }

        await db.Database.MigrateAsync(cancellation);
        await Safeguards.ApplyAsync(db, isPostgreSql, cancellation);
        await settings.RefreshAsync(db, cancellation);
    }

    /// <summary>
    /// On SQLite a program killed while migrating leaves its lock row behind, and every later start would wait for it without end.
    /// A lock older than two minutes cannot be a living one: no migration of a clinic's file takes that long.
    /// </summary>
    private async Task RemoveStaleLockAsync(ClinicDb db, CancellationToken cancellation)
    {
        var tables = await db.Database.SqlQueryRaw<int>(
            "SELECT COUNT(*) AS \"Value\" FROM sqlite_master WHERE type = 'table' AND name = '__EFMigrationsLock'").SingleAsync(cancellation);
        if (tables == 0)
        {
            return;
        }

        var removed = await db.Database.ExecuteSqlRawAsync(
            "DELETE FROM \"__EFMigrationsLock\" WHERE julianday('now') - julianday(\"Timestamp\") > 2.0 / (24 * 60)", cancellation);
        if (removed > 0)
        {
            log.LogWarning("Removed a migration lock left behind by a program that was stopped while migrating.");
        }
    }
}
