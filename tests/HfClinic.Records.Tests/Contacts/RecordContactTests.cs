using HfClinic.Clinical.Flags;
using HfClinic.Records.Access;
using HfClinic.Records.Contacts;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Contacts;

public class RecordContactTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task A_call_settles_the_flags_named_with_its_note(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var open = await db.Flags.AsNoTracking().Where(flag => flag.State == FlagState.Open).ToListAsync(Cancellation);
        await clinic.Get<RecordContact>().RunAsync(
            Nurse, id, ContactOutcome.Spoke, "ate out twice; weighs again tomorrow", [.. open.Select(flag => flag.Id)], Cancellation);

        var flags = await db.Flags.AsNoTracking().Where(flag => flag.State != FlagState.Cleared).ToListAsync(Cancellation);
        Assert.NotEmpty(flags);
        Assert.All(flags, flag => Assert.Equal(
            (FlagState.Answered, "ate out twice; weighs again tomorrow", "Test Nurse"), (flag.State, flag.Answer!, flag.AnsweredByName!)));
        var summary = await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation);
        Assert.Equal((null, 0, "spoken 31 Mar"), (summary.WorstUrgency, summary.OpenFlags, summary.LastContact));
    }

    [Theory, BothDatabases]
    public async Task Without_a_word_no_flag_is_settled_and_no_contact_kept(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var flag = await db.Flags.AsNoTracking().FirstAsync(f => f.State == FlagState.Open, Cancellation);
        await Assert.ThrowsAsync<RefusedException>(() =>
            clinic.Get<RecordContact>().RunAsync(Nurse, id, ContactOutcome.Spoke, " ", [flag.Id], Cancellation));
        Assert.Equal(0, await db.Contacts.CountAsync(Cancellation));
        Assert.Equal(FlagState.Open, (await db.Flags.AsNoTracking().SingleAsync(f => f.Id == flag.Id, Cancellation)).State);
    }

    [Theory, BothDatabases]
    public async Task A_flag_settled_meanwhile_or_of_another_patient_stops_the_whole(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        var other = await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-200" });
        await using var db = clinic.OpenDb();
        var flags = await db.Flags.AsNoTracking().Where(flag => flag.PatientId == id && flag.State == FlagState.Open).Select(flag => flag.Id).ToListAsync(Cancellation);
        var record = clinic.Get<RecordContact>();
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => record.RunAsync(Nurse, other, ContactOutcome.Spoke, "well", flags, Cancellation));
        await record.RunAsync(Nurse, id, ContactOutcome.Spoke, "well", flags, Cancellation);
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => record.RunAsync(Nurse, id, ContactOutcome.Spoke, "again", flags, Cancellation));
        Assert.Equal(1, await db.Contacts.CountAsync(Cancellation));
    }

    [Theory, BothDatabases]
    public async Task A_coordinator_may_record_a_call_but_not_settle_a_flag(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        var coordinator = TestClinic.As(ClinicRole.Coordinator);
        await using var db = clinic.OpenDb();
        var flags = await db.Flags.AsNoTracking().Select(flag => flag.Id).ToListAsync(Cancellation);
        var record = clinic.Get<RecordContact>();
        await record.RunAsync(coordinator, id, ContactOutcome.NoAnswer, null, [], Cancellation);
        await Assert.ThrowsAsync<NotAllowedException>(() => record.RunAsync(coordinator, id, ContactOutcome.Spoke, "well", flags, Cancellation));
        Assert.Equal(1, await db.Contacts.CountAsync(Cancellation));
    }
}
