using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Storage;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
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

    private readonly TestDatabase? _database;

    private TestClinic(TestDatabase? database, DatabaseEngine engine, string connectionString, FakeTimeProvider clock, ServiceProvider services)
    {
        _database = database;
        Engine = engine;
        ConnectionString = connectionString;
        Clock = clock;
        Services = services;
    }

    public DatabaseEngine Engine { get; }

    public string ConnectionString { get; }

    public FakeTimeProvider Clock { get; }

    /// <summary>A person of the given role.</summary>
    public static Actor As(ClinicRole role) => new(Guid.Empty, $"Test {role}", [role]);

    /// <summary>One of the clinic's services.</summary>
    public T Get<T>()
        where T : notnull => Services.GetRequiredService<T>();

    /// <summary>A context of its own, for looking.</summary>
    public ClinicDb OpenDb() => Get<IDbContextFactory<ClinicDb>>().CreateDbContext();

    public ServiceProvider Services { get; }

    /// <param name="engine">The database engine.</param>
    /// <param name="template">The starting content; <see cref="Templates.Ready"/> unless given.</param>
    /// <param name="now">Where the clock stands; <see cref="UsualStart"/> unless given.</param>
    /// <param name="configure">Adds or replaces services after the clinic's own.</param>
    public static async Task<TestClinic> StartAsync(
        DatabaseEngine engine,
        DatabaseTemplate? template = null,
        DateTimeOffset? now = null,
        Action<IServiceCollection>? configure = null)
    {
        var database = await TestDatabases.CreateAsync(engine, template ?? Templates.Ready);
        var clock = new FakeTimeProvider(now ?? UsualStart);
        var services = new ServiceCollection();
        services.AddClinic(database.ConnectionString, clock);
        configure?.Invoke(services);
        var clinic = new TestClinic(database, database.Engine, database.ConnectionString, clock, services.BuildServiceProvider(new ServiceProviderOptions { ValidateScopes = true, ValidateOnBuild = true }));
        await clinic.Get<ClinicStorage>().PrepareAsync(CancellationToken.None);
        return clinic;
    }

    /// <summary>A second server on the same database and clock; dispose it before the first.</summary>
    public static async Task<TestClinic> JoinAsync(TestClinic first)
    {
        var services = new ServiceCollection();
        services.AddClinic(first.ConnectionString, first.Clock);
        var clinic = new TestClinic(null, first.Engine, first.ConnectionString, first.Clock, services.BuildServiceProvider());
        await clinic.Get<ClinicStorage>().PrepareAsync(CancellationToken.None);
        return clinic;
    }

    public async ValueTask DisposeAsync()
    {
        await Services.DisposeAsync();
        if (_database is not null)
        {
            await _database.DisposeAsync();
        }
    }
}
