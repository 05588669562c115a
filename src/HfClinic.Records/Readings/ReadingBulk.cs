using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;
using Npgsql;
using NpgsqlTypes;

namespace HfClinic.Records.Readings;

/// <summary>
/// Adds many readings at once, inside the transaction that is open: PostgreSQL's binary copy, a prepared statement on SQLite.
/// The database assigns the numbers; they are not read back. Nothing is checked here beyond what the database itself refuses.
/// </summary>
public static class ReadingBulk
{
    /// <summary>How a reading is stored, column by column; every column but the number the database assigns.</summary>
    private static readonly (string Name, NpgsqlDbType Type, Func<Reading, object?> Value)[] Columns =
    [
        (nameof(Reading.PatientId), NpgsqlDbType.Bigint, r => r.PatientId),
        (nameof(Reading.Kind), NpgsqlDbType.Integer, r => (int)r.Kind),
        (nameof(Reading.MeasuredAt), NpgsqlDbType.TimestampTz, r => Utc(r.MeasuredAt)),
        (nameof(Reading.Day), NpgsqlDbType.Date, r => r.Day),
        (nameof(Reading.Value), NpgsqlDbType.Integer, r => r.Value),
        (nameof(Reading.AsTyped), NpgsqlDbType.Varchar, r => r.AsTyped),
        (nameof(Reading.Source), NpgsqlDbType.Integer, r => (int)r.Source),
        (nameof(Reading.Device), NpgsqlDbType.Varchar, r => r.Device),
        (nameof(Reading.State), NpgsqlDbType.Integer, r => (int)r.State),
        (nameof(Reading.FirstState), NpgsqlDbType.Integer, r => (int)r.FirstState),
        (nameof(Reading.HoldReason), NpgsqlDbType.Integer, r => r.HoldReason is { } reason ? (int)reason : null),
        (nameof(Reading.RecordedAt), NpgsqlDbType.TimestampTz, r => Utc(r.RecordedAt)),
        (nameof(Reading.RecordedById), NpgsqlDbType.Uuid, r => r.RecordedById),
        (nameof(Reading.SupersedesId), NpgsqlDbType.Bigint, r => r.SupersedesId),
        (nameof(Reading.ImportId), NpgsqlDbType.Bigint, r => r.ImportId),
    ];

    private static readonly string ColumnList = string.Join(", ", Columns.Select(column => $"\"{column.Name}\""));

    /// <summary>Adds the readings. Their patients should be taken by the piece of work.</summary>
    /// <returns>How many were added.</returns>
    /// <exception cref="InvalidOperationException">No transaction is open.</exception>
    /// <exception cref="System.Data.Common.DbException">The database refuses a row, for example one that is on record already; roll back.</exception>
    public static Task<int> InsertAsync(ClinicDb db, IEnumerable<Reading> readings, CancellationToken cancellation)
    {
        var transaction = db.Database.CurrentTransaction
            ?? throw new InvalidOperationException("Readings are added in bulk only inside a transaction.");
        return db.Database.GetDbConnection() is NpgsqlConnection npgsql
            ? CopyAsync(npgsql, readings, cancellation)
            : InsertPreparedAsync((SqliteTransaction)transaction.GetDbTransaction(), readings, cancellation);
    }

    private static async Task<int> CopyAsync(NpgsqlConnection connection, IEnumerable<Reading> readings, CancellationToken cancellation)
    {
        await using var copy = await connection.BeginBinaryImportAsync($"COPY \"Readings\" ({ColumnList}) FROM STDIN (FORMAT BINARY)", cancellation);
        foreach (var reading in readings)
        {
            await copy.StartRowAsync(cancellation);
            foreach (var (_, type, value) in Columns)
            {
                if (value(reading) is { } stored)
                {
                    await copy.WriteAsync(stored, type, cancellation);
                }
                else
                {
                    await copy.WriteNullAsync(cancellation);
                }
            }
        }

        return (int)await copy.CompleteAsync(cancellation);
    }

    /// <summary>SQLite has no asynchronous calls: a batch is written on the caller's thread. Dates go in as the text EF writes.</summary>
    private static async Task<int> InsertPreparedAsync(SqliteTransaction transaction, IEnumerable<Reading> readings, CancellationToken cancellation)
    {
        await using var insert = transaction.Connection!.CreateCommand();
        insert.Transaction = transaction;
        insert.CommandText = $"INSERT INTO \"Readings\" ({ColumnList}) VALUES ({string.Join(", ", Columns.Select(column => "@" + column.Name))})";
        var parameters = Columns.Select(column => insert.Parameters.Add("@" + column.Name, SqliteTypeOf(column.Type))).ToArray();
        await insert.PrepareAsync(cancellation);
        var added = 0;
        foreach (var reading in readings)
        {
            cancellation.ThrowIfCancellationRequested();
            for (var i = 0; i < Columns.Length; i++)
            {
                parameters[i].Value = Columns[i].Value(reading) ?? DBNull.Value;
            }

            added += await insert.ExecuteNonQueryAsync(cancellation);
        }

        return added;
    }

    private static SqliteType SqliteTypeOf(NpgsqlDbType type) =>
        type is NpgsqlDbType.Bigint or NpgsqlDbType.Integer ? SqliteType.Integer : SqliteType.Text;

    private static DateTime Utc(DateTime time) =>
        time.Kind == DateTimeKind.Local ? time.ToUniversalTime() : DateTime.SpecifyKind(time, DateTimeKind.Utc);
}
