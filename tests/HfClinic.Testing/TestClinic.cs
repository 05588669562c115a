using HfClinic.Testing.Databases;
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

    private TestClinic(TestDatabase database, FakeTimeProvider clock, ServiceProvider services)
    {
        _database = database;
        Clock = clock;
        Services = services;
    }

    public DatabaseEngine Engine => _database.Engine;

    public string ConnectionString => _database.ConnectionString;

    public FakeTimeProvider Clock { get; }

    public ServiceProvider Services { get; }

    /// <param name="engine">The database engine.</param>
    /// <param name="template">The starting content; <see cref="DatabaseTemplate.Empty"/> unless given.</param>
    /// <param name="now">Where the clock stands; <see cref="UsualStart"/> unless given.</param>
    /// <param name="configure">Adds or replaces services after the clinic's own.</param>
    public static async Task<TestClinic> StartAsync(
        DatabaseEngine engine,
        DatabaseTemplate? template = null,
        DateTimeOffset? now = null,
        Action<IServiceCollection>? configure = null)
    {
        var database = await TestDatabases.CreateAsync(engine, template ?? DatabaseTemplate.Empty);
        var clock = new FakeTimeProvider(now ?? UsualStart);
        var services = new ServiceCollection();
        services.AddSingleton<IConfiguration>(new ConfigurationBuilder()
            .AddInMemoryCollection([new("ConnectionStrings:Clinic", database.ConnectionString)])
            .Build());
        services.AddLogging(logging => logging.SetMinimumLevel(LogLevel.Warning));
        services.AddSingleton<TimeProvider>(clock);
        configure?.Invoke(services);
        return new TestClinic(database, clock, services.BuildServiceProvider(new ServiceProviderOptions { ValidateScopes = true, ValidateOnBuild = true }));
    }

    public async ValueTask DisposeAsync()
    {
        await Services.DisposeAsync();
        await _database.DisposeAsync();
    }
}
