using HfClinic.Records;
using HfClinic.Records.Settings;
using HfClinic.Records.Storage;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Infrastructure;
using Microsoft.Extensions.Logging.Abstractions;

namespace HfClinic.Testing;

/// <summary>The starting contents tests share.</summary>
public static class ClinicTemplates
{
    /// <summary>All tables and safeguards, prepared the way the program prepares them at start-up; no clinic set up yet.</summary>
    public static DatabaseTemplate Migrated { get; } = new("migrated", async (_, connectionString) =>
    {
        var options = new DbContextOptionsBuilder<ClinicDb>();
        StorageChoice.From(connectionString).Configure(options);
        var databases = new PooledDbContextFactory<ClinicDb>(options.Options);
        await new ClinicStorage(databases, new CurrentSettings(), NullLogger<ClinicStorage>.Instance).PrepareAsync(CancellationToken.None);
    });
}
