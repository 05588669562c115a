using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Readings;

public class DecideReadingTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);
    private static readonly DateOnly Today = new(2026, 3, 31);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task A_correction_changes_todays_summary_and_the_wrong_value_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var wrong = await db.Readings.SingleAsync(reading => reading.Day == Today, Cancellation);
        await clinic.Get<DecideReading>().CorrectAsync(Nurse, wrong.Id, 72_100, "72.1 kg", "misheard", Cancellation);

        db.ChangeTracker.Clear();
        var summary = await db.PatientSummaries.SingleAsync(Cancellation);
        Assert.Equal((72_100, 100), (summary.LastGrams, summary.Gain3Days));
        var both = await db.Readings.Where(reading => reading.Day == Today).OrderBy(reading => reading.Id).ToListAsync(Cancellation);
        Assert.Equal((74_600, ReadingState.Superseded), (both[0].Value, both[0].State));
        Assert.Equal((72_100, ReadingState.Accepted, wrong.Id), (both[1].Value, both[1].State, both[1].SupersedesId));
        var decision = await db.ReadingDecisions.SingleAsync(Cancellation);
        Assert.Equal(("misheard", ReadingState.Accepted, ReadingState.Superseded, both[1].Id, "Test Nurse"),
            (decision.Reason, decision.From, decision.To, decision.ReplacementId, decision.ByName));
        Assert.Equal(id, decision.PatientId);
    }

    [Theory, BothDatabases]
    public async Task A_confirmed_held_reading_counts(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.WeighAsync(id, Today.AddDays(-2), 72.0m);
        var held = await clinic.HoldWeightAsync(id, Today, 76.0m, HoldReason.Unexplained);
        await using var db = clinic.OpenDb();
        Assert.Equal(72_000, (await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation)).LastGrams);
        await clinic.Get<DecideReading>().ConfirmAsync(Nurse, held, "weighed again: the same", Cancellation);
        var summary = await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation);
        Assert.Equal((76_000, 0), (summary.LastGrams, summary.HeldReadings));
        Assert.True(await db.Flags.AnyAsync(flag => flag.RuleId == "volume.gain-3-days" && flag.State == FlagState.Open, Cancellation));
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => clinic.Get<DecideReading>().ConfirmAsync(Nurse, held, "again", Cancellation));
    }

    [Theory, BothDatabases]
    public async Task A_reading_struck_out_counts_no_more_and_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.WeighAsync(id, Today.AddDays(-1), 72.0m);
        var wrong = await clinic.WeighAsync(id, Today, 80.0m);
        await clinic.Get<DecideReading>().StrikeOutAsync(Nurse, wrong, "his wife's weight", Cancellation);
        await using var db = clinic.OpenDb();
        Assert.Equal(72_000, (await db.PatientSummaries.SingleAsync(Cancellation)).LastGrams);
        Assert.Equal(ReadingState.StruckOut, (await db.Readings.SingleAsync(reading => reading.Id == wrong, Cancellation)).State);
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() =>
            clinic.Get<DecideReading>().CorrectAsync(Nurse, wrong, 71_000, null, "late", Cancellation));
    }

    [Theory]
    [BothDatabases(72_000)]
    [BothDatabases(24_999)]
    [BothDatabases(300_001)]
    public async Task Refuses_the_same_value_and_one_that_cannot_be(DatabaseEngine engine, int grams)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var reading = await clinic.WeighAsync(id, Today, 72.0m);
        await Assert.ThrowsAsync<RefusedException>(() =>
            clinic.Get<DecideReading>().CorrectAsync(Nurse, reading, grams, null, "misheard", Cancellation));
        await using var db = clinic.OpenDb();
        Assert.Equal(1, await db.Readings.CountAsync(Cancellation));
        Assert.Equal(0, await db.ReadingDecisions.CountAsync(Cancellation));
    }

    [Theory, BothDatabases]
    public async Task Refuses_without_a_reason(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var reading = await clinic.WeighAsync(await clinic.EnrolAsync(), Today, 72.0m);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => clinic.Get<DecideReading>().StrikeOutAsync(Nurse, reading, "", Cancellation));
        Assert.Equal("Reason", refusal.Problems.Single().Field);
    }

    [Theory]
    [BothDatabases("UPDATE \"ReadingDecisions\" SET \"Reason\" = 'other'")]
    [BothDatabases("DELETE FROM \"ReadingDecisions\"")]
    public async Task The_database_itself_refuses_to_change_a_decision(DatabaseEngine engine, string sql)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var reading = await clinic.WeighAsync(await clinic.EnrolAsync(), Today, 72.0m);
        await clinic.Get<DecideReading>().StrikeOutAsync(Nurse, reading, "another person", Cancellation);
        await using var db = clinic.OpenDb();
        var refusal = await Assert.ThrowsAnyAsync<System.Data.Common.DbException>(() => db.Database.ExecuteSqlRawAsync(sql, Cancellation));
        Assert.Contains("may only be added to", refusal.Message);
        Assert.Equal("another person", (await db.ReadingDecisions.SingleAsync(Cancellation)).Reason);
    }
}
