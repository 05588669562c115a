using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Storage;

/// <summary>Which database the clinic's record is kept in, told from the connection string.</summary>
/// <param name="ConnectionString">As given, or the default SQLite file.</param>
/// <param name="IsPostgreSql">True for PostgreSQL, false for SQLite.</param>
public sealed record StorageChoice(string ConnectionString, bool IsPostgreSql)
{
    private const string PostgreSqlMigrations = "HfClinic.Migrations.PostgreSql";
    private const string SqliteMigrations = "HfClinic.Migrations.Sqlite";

    /// <summary>PostgreSQL for a string naming a host, SQLite for one naming a data source.</summary>
    /// <exception cref="ArgumentException">The string names neither.</exception>
    public static StorageChoice From(string connectionString)
    {
        var keys = connectionString.Split(';', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries)
            .Select(part => part.Split('=', 2)[0].Trim().ToUpperInvariant()).ToHashSet();
        if (keys.Contains("HOST") || keys.Contains("SERVER"))
        {
            return new(connectionString, IsPostgreSql: true);
        }

        return keys.Contains("DATA SOURCE") || keys.Contains("DATASOURCE") || keys.Contains("FILENAME")
            ? new(connectionString, IsPostgreSql: false)
            : throw new ArgumentException(
                "The connection string 'Clinic' names neither a PostgreSQL host (Host=...) nor a SQLite file (Data Source=...).",
                nameof(connectionString));
    }

    /// <summary>The embedded default: a SQLite file.</summary>
    public static StorageChoice SqliteFile(string path) =>
        new(new SqliteConnectionStringBuilder { DataSource = path }.ToString(), IsPostgreSql: false);

    /// <summary>Points a context at this database and its migrations.</summary>
    public void Configure(DbContextOptionsBuilder options)
    {
        if (IsPostgreSql)
        {
            options.UseNpgsql(ConnectionString, npgsql => npgsql.MigrationsAssembly(PostgreSqlMigrations));
        }
        else
        {
            options.UseSqlite(ConnectionString, sqlite => sqlite.MigrationsAssembly(SqliteMigrations));
        }
    }
}
