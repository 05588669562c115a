using HfClinic.Testing.Databases;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.AspNetCore.TestHost;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>The real web program on a real port, with a database and a data folder of its own.</summary>
public sealed class ClinicApp : WebApplicationFactory<Program>
{
    private static readonly TestFolder Home = TestFolder.Create("web");

    private readonly TestDatabase _database;
    private readonly TimeProvider? _clock;
    private readonly IReadOnlyDictionary<string, string> _settings;
    private readonly DirectoryInfo _data = Directory.CreateDirectory(Path.Combine(Home.Path, Guid.NewGuid().ToString("N")));

    private ClinicApp(TestDatabase database, TimeProvider? clock, IReadOnlyDictionary<string, string> settings)
    {
        _database = database;
        _clock = clock;
        _settings = settings;
    }

    public DatabaseEngine Engine => _database.Engine;

    public Uri Address => ClientOptions.BaseAddress;

    /// <param name="engine">The database engine.</param>
    /// <param name="template">The starting content; <see cref="DatabaseTemplate.Empty"/> (a first start) unless given.</param>
    /// <param name="clock">Replaces the system clock when given.</param>
    /// <param name="settings">Further settings, as they would be given on the command line.</param>
    public static async Task<ClinicApp> StartAsync(
        DatabaseEngine engine,
        DatabaseTemplate? template = null,
        TimeProvider? clock = null,
        IReadOnlyDictionary<string, string>? settings = null)
    {
        var database = await TestDatabases.CreateAsync(engine, template ?? DatabaseTemplate.Empty);
        var app = new ClinicApp(database, clock, settings ?? new Dictionary<string, string>());
        app.UseKestrel(0);
        try
        {
            app.StartServer();
        }
        catch
        {
            await app.DisposeAsync();
            throw;
        }

        return app;
    }

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        await _database.DisposeAsync();
        _data.Delete(recursive: true);
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        // Static assets of packages are served from the build output only in Development.
        builder.UseEnvironment("Development");
        builder.UseSetting("ConnectionStrings:Clinic", _database.ConnectionString);
        builder.UseSetting("HFCLINIC_DATA", _data.FullName);
        builder.UseSetting("Logging:LogLevel:Default", "Warning");
        foreach (var (key, value) in _settings)
        {
            builder.UseSetting(key, value);
        }

        if (_clock is not null)
        {
            builder.ConfigureTestServices(services => services.AddSingleton(_clock));
        }
    }
}
