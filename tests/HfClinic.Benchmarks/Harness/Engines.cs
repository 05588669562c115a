using System.Data.Common;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Data.Sqlite;
using Npgsql;

namespace HfClinic.Benchmarks.Harness;

/// <summary>The database below a measured clinic.</summary>
internal static class Engines
{
    public static DbConnection Connect(TestClinic clinic) => clinic.Engine == DatabaseEngine.PostgreSql
        ? new NpgsqlConnection(clinic.ConnectionString)
        : new SqliteConnection(clinic.ConnectionString);

    /// <summary>"PostgreSQL 15.18", "SQLite 3.50.4".</summary>
    public static async Task<string> NameAsync(TestClinic clinic) => clinic.Engine == DatabaseEngine.PostgreSql
        ? $"PostgreSQL {((string)(await ScalarAsync(clinic, "SHOW server_version"))!).Split(' ')[0]}"
        : $"SQLite {await ScalarAsync(clinic, "SELECT sqlite_version()")}";

    /// <summary>What PostgreSQL's own autovacuum does a little later. SQLite has nothing of the kind, and gets nothing.</summary>
    public static async Task SettleAsync(TestClinic clinic)
    {
        if (clinic.Engine == DatabaseEngine.PostgreSql)
        {
            await ScalarAsync(clinic, "VACUUM ANALYZE");
        }
    }

    private static async Task<object?> ScalarAsync(TestClinic clinic, string sql)
    {
        await using var connection = Connect(clinic);
        await connection.OpenAsync();
        await using var command = connection.CreateCommand();
        command.CommandText = sql;
        command.CommandTimeout = 300;
        return await command.ExecuteScalarAsync();
    }
}
