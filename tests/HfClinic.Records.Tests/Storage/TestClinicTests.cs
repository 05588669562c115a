using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Storage;

public class TestClinicTests
{
    [Theory, BothDatabases]
    public async Task A_test_clinic_has_this_version_s_tables_and_nobody_in_it(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var db = await clinic.OpenDbAsync();

        Assert.Equal(engine == DatabaseEngine.PostgreSql, db.Database.IsNpgsql());
        Assert.Empty(await db.Database.GetPendingMigrationsAsync(TestContext.Current.CancellationToken));
        Assert.NotEmpty(await db.Database.GetAppliedMigrationsAsync(TestContext.Current.CancellationToken));
        Assert.False(await db.Patients.AnyAsync(TestContext.Current.CancellationToken));
    }
}
