using HfClinic.Clinical.Flags;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Patients;

public class LeaveClinicTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);
    private static readonly DateOnly Day = new(2026, 3, 30);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task Takes_the_person_from_the_lists_but_keeps_the_record(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await clinic.Get<LeaveClinic>().RunAsync(Nurse, id, Day, "moved away", Cancellation);
        await using var db = clinic.OpenDb();
        Assert.False((await db.PatientSummaries.SingleAsync(Cancellation)).OnDailyWeights);
        Assert.Equal(2, await db.Readings.CountAsync(Cancellation));
        var patient = await db.Patients.SingleAsync(Cancellation);
        Assert.Equal((Day, "moved away"), (patient.LeftOn, patient.LeftBecause));
    }

    [Theory, BothDatabases]
    public async Task A_person_taken_back_is_assessed_again(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        var leave = clinic.Get<LeaveClinic>();
        await leave.RunAsync(Nurse, id, Day, "moved away", Cancellation);
        await leave.ReturnAsync(Nurse, id, Cancellation);
        await using var db = clinic.OpenDb();
        Assert.True((await db.PatientSummaries.SingleAsync(Cancellation)).OnDailyWeights);
        Assert.True(await db.Flags.AnyAsync(flag => flag.State == FlagState.Open && flag.RuleId == "volume.gain-3-days", Cancellation));
    }

    [Theory]
    [BothDatabases("2026-01-09")]
    [BothDatabases("2026-04-01")]
    public async Task Refuses_a_day_before_enrolment_or_in_the_future(DatabaseEngine engine, string day)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            clinic.Get<LeaveClinic>().RunAsync(Nurse, id, DateOnly.Parse(day, null), "moved away", Cancellation));
        Assert.Equal("Day", refusal.Problems.Single().Field);
    }

    [Theory, BothDatabases]
    public async Task Refuses_without_a_reason(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await Assert.ThrowsAsync<RefusedException>(() => clinic.Get<LeaveClinic>().RunAsync(Nurse, id, Day, "  ", Cancellation));
    }

    [Theory, BothDatabases]
    public async Task Says_so_when_somebody_else_did_it_first(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var leave = clinic.Get<LeaveClinic>();
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => leave.ReturnAsync(Nurse, id, Cancellation));
        await leave.RunAsync(Nurse, id, Day, "moved away", Cancellation);
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => leave.RunAsync(Nurse, id, Day, "died", Cancellation));
    }
}
