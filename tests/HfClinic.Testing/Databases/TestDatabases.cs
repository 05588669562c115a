namespace HfClinic.Testing.Databases;

/// <summary>
/// Gives each test its own database on either engine. The PostgreSQL server starts with the first test that needs it
/// and ends with the test process; a missing PostgreSQL fails the test, it is never skipped.
/// </summary>
public static class TestDatabases
{
    private static readonly Lazy<SqliteFiles> Files = new(() => new SqliteFiles(TestFolder.Create("sqlite").Path));
    private static readonly Lazy<Task<PostgresCluster>> Cluster = new(PostgresCluster.StartAsync);

    public static async Task<TestDatabase> CreateAsync(DatabaseEngine engine, DatabaseTemplate template) => engine switch
    {
        DatabaseEngine.Sqlite => await Files.Value.CreateAsync(template),
        DatabaseEngine.PostgreSql => await (await Cluster.Value).CreateAsync(template),
        _ => throw new ArgumentOutOfRangeException(nameof(engine), engine, "Not an engine the clinic runs on."),
    };
}
