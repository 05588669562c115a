using HfClinic.Records;
using HfClinic.Records.Storage;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Configuration;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Time.Testing;

namespace HfClinic.Testing;

/// <summary>
/// A clinic without a browser: its services on a database of its own and a clock that stands still until moved.
/// </summary>
/// <example><code>
/// [Theory, BothDatabases]
/// public async Task Does_what_it_says(DatabaseEngine engine)
/// {
///     await using var clinic = await TestClinic.StartAsync(engine);
/// </code></example>
public sealed class TestClinic : IAsyncDisposable
{
    /// <summary>Where the clock stands unless a test says otherwise: a Tuesday morning, 08:00 UTC.</summary>
    public static DateTimeOffset UsualStart { get; } = new(2026, 3, 31, 8, 0, 0, TimeSpan.Zero);

    private readonly TestDatabase _database;
    private readonly ServiceProvider _services;
    private readonly AsyncServiceScope _scope;

    private TestClinic(TestDatabase database, FakeTimeProvider clock, ServiceProvider services)
    {
        _database = database;
        _services = services;
        _scope = services.CreateAsyncScope();
        Clock = clock;
    }

    public DatabaseEngine Engine => _database.Engine;

    public string ConnectionString => _database.ConnectionString;

    public FakeTimeProvider Clock { get; }

    /// <summary>One of the clinic's services.</summary>
    public T Get<T>()
        where T : notnull => _scope.ServiceProvider.GetRequiredService<T>();

    /// <summary>The record itself, through a context of its own: what is really stored. The caller disposes it.</summary>
    public Task<ClinicDb> OpenDbAsync() => Get<IDbContextFactory<ClinicDb>>().CreateDbContextAsync();

    /// <param name="engine">The database engine.</param>
    /// <param name="template">The starting content; <see cref="ClinicTemplates.Migrated"/> unless given.</param>
    /// <param name="now">Where the clock stands; <see cref="UsualStart"/> unless given.</param>
    /// <param name="configure">Adds or replaces services after the clinic's own.</param>
    public static async Task<TestClinic> StartAsync(
        DatabaseEngine engine,
        DatabaseTemplate? template = null,
        DateTimeOffset? now = null,
        Action<IServiceCollection>? configure = null)
    {
        var database = await TestDatabases.CreateAsync(engine, template ?? ClinicTemplates.Migrated);
        var clock = new FakeTimeProvider(now ?? UsualStart);
        var services = new ServiceCollection();
        services.AddSingleton<IConfiguration>(new ConfigurationBuilder()
            .AddInMemoryCollection([new("ConnectionStrings:Clinic", database.ConnectionString)])
            .Build());
        services.AddLogging(logging => logging.SetMinimumLevel(LogLevel.Warning));
        services.AddSingleton<TimeProvider>(clock);
        services.AddDbContextFactory<ClinicDb>((_, options) => StorageChoice.From(database.ConnectionString).Configure(options));
        configure?.Invoke(services);
        return new TestClinic(database, clock, services.BuildServiceProvider(new ServiceProviderOptions { ValidateScopes = true, ValidateOnBuild = true }));
    }

    public async ValueTask DisposeAsync()
    {
        await _scope.DisposeAsync();
        await _services.DisposeAsync();
        await _database.DisposeAsync();
    }
}
