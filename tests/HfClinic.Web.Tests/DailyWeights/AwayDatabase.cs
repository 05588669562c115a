using HfClinic.Records;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Web.Tests.DailyWeights;

/// <summary>A clinic's database that can be taken away and brought back.</summary>
internal sealed class AwayDatabase(IDbContextFactory<ClinicDb> real) : IDbContextFactory<ClinicDb>
{
    public bool IsAway { get; set; }

    /// <summary>Puts it between the clinic and its database.</summary>
    public static void Install(IServiceCollection services)
    {
        var real = services.Last(service => service.ServiceType == typeof(IDbContextFactory<ClinicDb>));
        services.Remove(real);
        services.AddSingleton(provider => new AwayDatabase((IDbContextFactory<ClinicDb>)ActivatorUtilities.CreateInstance(provider, real.ImplementationType!)));
        services.AddSingleton<IDbContextFactory<ClinicDb>>(provider => provider.GetRequiredService<AwayDatabase>());
    }

    /// <summary>SQLite result code 14: unable to open database file.</summary>
    public ClinicDb CreateDbContext() => IsAway ? throw new SqliteException("unable to open database file", 14) : real.CreateDbContext();
}
