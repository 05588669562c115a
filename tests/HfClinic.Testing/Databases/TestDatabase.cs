namespace HfClinic.Testing.Databases;

/// <summary>One test's own database, removed when disposed.</summary>
public sealed class TestDatabase(DatabaseEngine engine, string connectionString, Func<Task> remove) : IAsyncDisposable
{
    public DatabaseEngine Engine { get; } = engine;

    /// <summary>As the clinic would configure it in <c>ConnectionStrings__Clinic</c>.</summary>
    public string ConnectionString { get; } = connectionString;

    public async ValueTask DisposeAsync() => await remove();
}
