using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Storage;

/// <summary>Rules the database itself enforces beyond the model: rows that may be added but never changed or removed.</summary>
internal static class Safeguards
{
    private static readonly string[] AppendOnly = ["AuditEntries", "FlagSteps", "ReadingDecisions"];
    private static readonly string[] Forbidden = ["UPDATE", "DELETE"];

    /// <summary>Puts the triggers in place; harmless when they stand already.</summary>
    public static async Task ApplyAsync(ClinicDb db, bool isPostgreSql, CancellationToken cancellation)
    {
        foreach (var sql in isPostgreSql ? ForPostgreSql() : ForSqlite())
        {
            await db.Database.ExecuteSqlRawAsync(sql, cancellation);
        }
    }

    private static IEnumerable<string> ForSqlite() =>
        from table in AppendOnly
        from verb in Forbidden
        select $"""
            CREATE TRIGGER IF NOT EXISTS "{table}_no_{verb.ToLowerInvariant()}" BEFORE {verb} ON "{table}"
            BEGIN SELECT RAISE(ABORT, '{table} may only be added to'); END
            """;

    private static IEnumerable<string> ForPostgreSql() =>
        AppendOnly.Select(table => $"""
            CREATE OR REPLACE TRIGGER "{table}_append_only" BEFORE UPDATE OR DELETE OR TRUNCATE ON "{table}"
            FOR EACH STATEMENT EXECUTE FUNCTION hfclinic_append_only()
            """).Prepend("""
            CREATE OR REPLACE FUNCTION hfclinic_append_only() RETURNS trigger LANGUAGE plpgsql AS
            $$ BEGIN RAISE EXCEPTION '% may only be added to', TG_TABLE_NAME; END $$
            """);
}
