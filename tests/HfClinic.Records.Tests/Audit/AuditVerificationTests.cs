using HfClinic.Records.Audit;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Audit;

public class AuditVerificationTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task An_untouched_record_holds(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        var verdict = await clinic.Get<AuditVerification>().RunAsync(Cancellation);
        Assert.Null(verdict.Fault);
        await using var db = clinic.OpenDb();
        Assert.Equal(await db.AuditEntries.CountAsync(Cancellation), verdict.Lines);
        Assert.True(verdict.Lines > 3);
    }

    [Theory]
    [BothDatabases("UPDATE \"AuditEntries\" SET \"ByName\" = 'Somebody Else' WHERE \"Id\" = 3", "Line 3 ")]
    [BothDatabases("UPDATE \"AuditEntries\" SET \"After\" = '{}' WHERE \"Id\" = 2", "Line 2 ")]
    [BothDatabases("DELETE FROM \"AuditEntries\" WHERE \"Id\" = 2", "Line 2 is missing")]
    [BothDatabases("DELETE FROM \"AuditEntries\" WHERE \"Id\" = (SELECT MAX(\"Id\") FROM \"AuditEntries\")", "The last line should be")]
    public async Task Finds_the_line_that_was_tampered_with(DatabaseEngine engine, string sql, string fault)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        foreach (var drop in engine == DatabaseEngine.Sqlite
            ? new[] { "DROP TRIGGER \"AuditEntries_no_update\"", "DROP TRIGGER \"AuditEntries_no_delete\"" }
            : ["DROP TRIGGER \"AuditEntries_append_only\" ON \"AuditEntries\""])
        {
            await db.Database.ExecuteSqlRawAsync(drop, Cancellation);
        }

        Assert.Equal(1, await db.Database.ExecuteSqlRawAsync(sql.Replace("{", "{{").Replace("}", "}}"), Cancellation));
        var verdict = await clinic.Get<AuditVerification>().RunAsync(Cancellation);
        Assert.StartsWith(fault, verdict.Fault);
    }

    [Theory]
    [BothDatabases("UPDATE \"AuditEntries\" SET \"ByName\" = 'x'")]
    [BothDatabases("DELETE FROM \"AuditEntries\"")]
    [BothDatabases("UPDATE \"FlagSteps\" SET \"Statement\" = 'x'")]
    [BothDatabases("DELETE FROM \"FlagSteps\"")]
    public async Task The_database_itself_refuses_to_change_the_record(DatabaseEngine engine, string sql)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var refusal = await Assert.ThrowsAnyAsync<System.Data.Common.DbException>(() => db.Database.ExecuteSqlRawAsync(sql, Cancellation));
        Assert.Contains("may only be added to", refusal.Message);
    }
}
