using System.Data.Common;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Data.Sqlite;
using Npgsql;

namespace HfClinic.Records.Tests.Storage;

/// <summary>The ground the data tests stand on: each test has its own copy of the template, and nothing else.</summary>
public class TestDatabasesTests
{
    private static readonly DatabaseTemplate OneRow = new("one_row", (engine, connectionString) =>
        ExecuteAsync(engine, connectionString, "create table seen (word text not null); insert into seen values ('template');"));

    [Theory, BothDatabases]
    public async Task A_test_starts_from_the_template_and_leaves_it_untouched(DatabaseEngine engine)
    {
        await using (var first = await TestDatabases.CreateAsync(engine, OneRow))
        {
            await ExecuteAsync(engine, first.ConnectionString, "insert into seen values ('first test');");
            Assert.Equal(2, await CountAsync(engine, first.ConnectionString));
        }

        await using var second = await TestDatabases.CreateAsync(engine, OneRow);
        Assert.Equal(1, await CountAsync(engine, second.ConnectionString));
    }

    [Theory, BothDatabases]
    public async Task A_removed_database_is_gone(DatabaseEngine engine)
    {
        var database = await TestDatabases.CreateAsync(engine, OneRow);
        Assert.Equal(1, await CountAsync(engine, database.ConnectionString));
        await database.DisposeAsync();
        await Assert.ThrowsAnyAsync<DbException>(() => CountAsync(engine, database.ConnectionString + (engine == DatabaseEngine.Sqlite ? ";Mode=ReadOnly" : "")));
    }

    [Theory, BothDatabases("kept as given", 7)]
    public void Values_beside_the_engine_reach_the_test(DatabaseEngine engine, string words, int number)
    {
        Assert.True(Enum.IsDefined(engine));
        Assert.Equal("kept as given", words);
        Assert.Equal(7, number);
    }

    [Theory, BothDatabases]
    public async Task The_clock_stands_still_until_moved(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, OneRow);
        Assert.Equal(engine, clinic.Engine);
        Assert.Equal(1, await CountAsync(engine, clinic.ConnectionString));
        clinic.Clock.Advance(TimeSpan.FromDays(1));
        Assert.Equal(TestClinic.UsualStart.AddDays(1), clinic.Clock.GetUtcNow());
    }

    private static async Task ExecuteAsync(DatabaseEngine engine, string connectionString, string sql)
    {
        await using var connection = Connect(engine, connectionString);
        await connection.OpenAsync();
        await using var command = connection.CreateCommand();
        command.CommandText = sql;
        await command.ExecuteNonQueryAsync();
    }

    private static async Task<long> CountAsync(DatabaseEngine engine, string connectionString)
    {
        await using var connection = Connect(engine, connectionString);
        await connection.OpenAsync();
        await using var command = connection.CreateCommand();
        command.CommandText = "select count(*) from seen";
        return (long)(await command.ExecuteScalarAsync())!;
    }

    private static DbConnection Connect(DatabaseEngine engine, string connectionString) =>
        engine == DatabaseEngine.Sqlite ? new SqliteConnection(connectionString) : new NpgsqlConnection(connectionString);
}
