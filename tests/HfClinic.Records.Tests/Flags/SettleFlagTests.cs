using HfClinic.Clinical.Flags;
using HfClinic.Records.Access;
using HfClinic.Records.Flags;
using HfClinic.Records.Reassessment;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Flags;

public class SettleFlagTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);
    private static readonly DateOnly Today = new(2026, 3, 31);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task An_answer_closes_the_flag_and_what_was_shown_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var flag = await GainAsync(db);
        await clinic.Get<AnswerFlag>().RunAsync(Nurse, flag.Id, "dose doubled by the prescriber yesterday", Cancellation);
        var answered = await GainAsync(db);
        Assert.Equal((FlagState.Answered, Today), (answered.State, answered.AnsweredOn));
        var steps = await db.FlagSteps.Where(step => step.FlagId == flag.Id).OrderBy(step => step.Id).ToListAsync(Cancellation);
        Assert.Equal([FlagStepKind.Raised, FlagStepKind.Answered], steps.Select(step => step.Kind));
        Assert.All(steps, step => Assert.Equal("Gained 2.6 kg in 3 days", step.Statement));
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => clinic.Get<AnswerFlag>().RunAsync(Nurse, flag.Id, "again", Cancellation));
    }

    [Theory]
    [BothDatabases(1)]
    [BothDatabases(PutOffFlag.LongestDays)]
    public async Task A_flag_put_off_leaves_the_list_until_its_day_and_then_comes_back(DatabaseEngine engine, int days)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        foreach (var open in await db.Flags.AsNoTracking().Where(f => f.State == FlagState.Open).ToListAsync(Cancellation))
        {
            await clinic.Get<PutOffFlag>().RunAsync(Nurse, open.Id, Today.AddDays(days), "on holiday, reachable later", Cancellation);
        }

        var summary = await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation);
        Assert.Null(summary.WorstUrgency);
        Assert.True(summary.PutOffFlags > 0);
        clinic.Clock.Advance(TimeSpan.FromDays(days));
        await clinic.Get<MorningSweep>().RunIfDueAsync(Cancellation);
        Assert.NotNull((await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation)).WorstUrgency);
    }

    [Theory]
    [BothDatabases(0)]
    [BothDatabases(-1)]
    [BothDatabases(PutOffFlag.LongestDays + 1)]
    public async Task Refuses_a_day_out_of_reach(DatabaseEngine engine, int days)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var flag = await GainAsync(db);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            clinic.Get<PutOffFlag>().RunAsync(Nurse, flag.Id, Today.AddDays(days), "later", Cancellation));
        Assert.Equal("Until", refusal.Problems.Single().Field);
        Assert.Null((await GainAsync(db)).PutOffUntil);
    }

    [Theory, BothDatabases]
    public async Task The_first_look_is_noted_once(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await clinic.Get<MarkFlagsSeen>().RunAsync(Nurse, id, Cancellation);
        await clinic.Get<MarkFlagsSeen>().RunAsync(TestClinic.As(ClinicRole.Prescriber), id, Cancellation);
        await using var db = clinic.OpenDb();
        var flag = await GainAsync(db);
        Assert.Equal("Test Nurse", flag.SeenByName);
        Assert.Equal(1, await db.FlagSteps.CountAsync(step => step.FlagId == flag.Id && step.Kind == FlagStepKind.Seen, Cancellation));
    }

    private static Task<Flag> GainAsync(HfClinic.Records.ClinicDb db) =>
        db.Flags.AsNoTracking().SingleAsync(flag => flag.RuleId == "volume.gain-3-days", Cancellation);
}
