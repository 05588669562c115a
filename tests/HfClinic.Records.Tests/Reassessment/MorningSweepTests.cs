using HfClinic.Records.Reassessment;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Reassessment;

public class MorningSweepTests
{
    [Theory, BothDatabases]
    public async Task Finds_the_silent_once_a_day(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighAsync(patient, PatientsAtHome.Today, 80m);
        var sweep = clinic.Get<MorningSweep>();
        Assert.True(await sweep.RunIfDueAsync(TestContext.Current.CancellationToken));
        Assert.False(await sweep.RunIfDueAsync(TestContext.Current.CancellationToken));

        clinic.Clock.Advance(TimeSpan.FromDays(5));
        Assert.True(await sweep.RunIfDueAsync(TestContext.Current.CancellationToken));
        await using var db = clinic.OpenDb();
        Assert.True((await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken)).IsSilent);
        Assert.Equal(2, await db.SweepRuns.CountAsync(run => run.FinishedAt != null, TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task Two_servers_share_one_sweep(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        for (var number = 1; number <= 60; number++)
        {
            await clinic.EnrolAtHomeAsync($"T-{number}", targetKilograms: null);
        }

        await using var other = await TestClinic.JoinAsync(clinic);
        var ran = await Task.WhenAll(
            clinic.Get<MorningSweep>().RunIfDueAsync(TestContext.Current.CancellationToken),
            other.Get<MorningSweep>().RunIfDueAsync(TestContext.Current.CancellationToken));
        Assert.Single(ran, done => done);
        await using var db = clinic.OpenDb();
        Assert.Equal(60, (await db.SweepRuns.SingleAsync(TestContext.Current.CancellationToken)).Patients);
    }
}
