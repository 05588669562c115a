using HfClinic.SeedDemo;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using HfClinic.Web.Hosting;
using Microsoft.AspNetCore.Builder;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Hosting;

public class ClinicStartTests
{
    [Theory, BothDatabases]
    public async Task The_demo_is_refused_on_a_real_clinics_record(DatabaseEngine engine)
    {
        await using var database = await TestDatabases.CreateAsync(engine, Templates.Ready);
        Assert.Contains("holds a real clinic's record", await RefusalAsync(database.ConnectionString, "demo"));
    }

    [Theory, BothDatabases]
    public async Task A_real_clinic_is_refused_on_the_demos_record_and_the_demo_may_start_on_it_again(DatabaseEngine engine)
    {
        await using var database = await TestDatabases.CreateAsync(engine, DatabaseTemplate.Empty);
        await PrepareAsync(database.ConnectionString, "demo", "--patients", "40");
        Assert.Contains("holds the invented demo clinic", await RefusalAsync(database.ConnectionString));
        await PrepareAsync(database.ConnectionString, "demo");
        Assert.Equal(0, await VerifyAsync(database.ConnectionString));
    }

    [Theory, BothDatabases]
    public async Task A_demo_that_was_stopped_while_it_was_made_is_not_taken_for_a_whole_one(DatabaseEngine engine)
    {
        await using var database = await TestDatabases.CreateAsync(engine, DatabaseTemplate.Empty);
        await PrepareAsync(database.ConnectionString, "demo", "--patients", "40");
        await ExecuteAsync(database.ConnectionString, "DELETE FROM \"SweepRuns\"");
        Assert.Contains("demo --fresh", await RefusalAsync(database.ConnectionString, "demo"));
    }

    [Theory, BothDatabases]
    public async Task Starting_over_spares_a_database_named_by_its_connection(DatabaseEngine engine)
    {
        await using var database = await TestDatabases.CreateAsync(engine, Templates.Ready);
        Assert.Contains("own SQLite file only", await RefusalAsync(database.ConnectionString, "demo", "--fresh"));
    }

    [Theory, BothDatabases]
    public async Task A_changed_line_of_the_record_of_access_is_found(DatabaseEngine engine)
    {
        await using var database = await TestDatabases.CreateAsync(engine, Templates.Ready);
        Assert.Equal(0, await VerifyAsync(database.ConnectionString));
        await ExecuteAsync(database.ConnectionString, engine == DatabaseEngine.PostgreSql
            ? "ALTER TABLE \"AuditEntries\" DISABLE TRIGGER ALL"
            : "DROP TRIGGER \"AuditEntries_no_update\"");
        await ExecuteAsync(database.ConnectionString, "UPDATE \"AuditEntries\" SET \"ByName\" = 'somebody else'");
        Assert.Equal(1, await VerifyAsync(database.ConnectionString));
    }

    [Theory, BothDatabases]
    public async Task An_empty_database_has_no_record_of_access_to_check(DatabaseEngine engine)
    {
        await using var database = await TestDatabases.CreateAsync(engine, DatabaseTemplate.Empty);
        Assert.Contains("no clinic in this database", await RefusalAsync(database.ConnectionString, "verify-audit"));
    }

    [Theory]
    [InlineData("Host=127.0.0.1;Port=1;Database=hfclinic")]
    [InlineData("Data Source=/no/such/folder/clinic.db")]
    [InlineData("Host=localhost;Hoost=x")]
    [InlineData("Somewhere=x")]
    public async Task A_database_that_cannot_be_used_is_named_with_what_to_look_at(string connection) =>
        Assert.Contains("ConnectionStrings__Clinic", await RefusalAsync(connection));

    [Fact]
    public async Task Too_small_a_demo_is_refused()
    {
        await using var database = await TestDatabases.CreateAsync(DatabaseEngine.Sqlite, DatabaseTemplate.Empty);
        Assert.Contains("cannot be made", await RefusalAsync(database.ConnectionString, "demo", "--patients", "3"));
    }

    private static async Task<string> RefusalAsync(string connection, params string[] words) =>
        (await Assert.ThrowsAsync<CannotStartException>(() => PrepareAsync(connection, words))).Message;

    private static async Task PrepareAsync(string connection, params string[] words)
    {
        await using var app = Build(connection, words, out var start);
        await app.PrepareClinicAsync(start);
    }

    private static async Task<int> VerifyAsync(string connection)
    {
        await using var app = Build(connection, ["verify-audit"], out var start);
        await app.PrepareClinicAsync(start);
        return await app.VerifyAuditAsync();
    }

    private static WebApplication Build(string connection, string[] words, out StartOptions start)
    {
        start = StartOptions.Parse([.. words, $"--ConnectionStrings:Clinic={connection}", "--Logging:LogLevel:Default=None"]);
        Assert.Null(start.Fault);
        var builder = WebApplication.CreateBuilder(start.HostArguments);
        builder.AddClinic(start);
        return builder.Build();
    }

    private static async Task ExecuteAsync(string connection, string sql)
    {
        await using var services = new ServiceCollection().AddClinic(connection, TimeProvider.System).BuildServiceProvider();
        await using var db = await services.GetRequiredService<IDbContextFactory<Records.ClinicDb>>().CreateDbContextAsync(TestContext.Current.CancellationToken);
        await db.Database.ExecuteSqlRawAsync(sql, TestContext.Current.CancellationToken);
    }
}
