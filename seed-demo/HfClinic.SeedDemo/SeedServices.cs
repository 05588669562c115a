using HfClinic.Records;
using HfClinic.SeedDemo.Days;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Logging.Abstractions;

namespace HfClinic.SeedDemo;

/// <summary>The clinic's services on the same database, with a clock that can stand in the past.</summary>
internal static class SeedServices
{
    /// <param name="host">The program's own services; its database is used.</param>
    public static ServiceProvider Build(IServiceProvider host, SeedClock clock)
    {
        var services = new ServiceCollection();
        services.AddSingleton<TimeProvider>(clock);
        services.AddSingleton(host.GetService<ILoggerFactory>() ?? NullLoggerFactory.Instance);
        services.AddSingleton(typeof(ILogger<>), typeof(Logger<>));
        services.AddClinicRecords(_ => throw new InvalidOperationException("The demo uses the database of the program that makes it."));
        services.AddSingleton(host.GetRequiredService<IDbContextFactory<ClinicDb>>());
        return services.BuildServiceProvider();
    }
}
