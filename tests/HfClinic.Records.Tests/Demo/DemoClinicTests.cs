using HfClinic.Records.Access;
using HfClinic.Records.Audit;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Questions;
using HfClinic.Records.Settings;
using HfClinic.SeedDemo;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Records.Tests.Demo;

public class DemoClinicTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task Looks_like_a_morning(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, DemoTemplates.MadeInLateMorning, DemoTemplates.LateMorning);
        await using var db = clinic.OpenDb();
        var nurse = await db.Users.SingleAsync(user => user.UserName == "nurse", Cancellation);
        var counts = await clinic.Get<DailyWeightsQuery>().CountsAsync(nurse.Id, Cancellation);
        Assert.InRange(counts.OnList, 220, 235);
        Assert.InRange(counts.Today, 8, 12);
        Assert.InRange(counts.ThisWeek, 10, 20);
        Assert.InRange(counts.NextVisit, 10, 60);
        Assert.InRange(counts.Silent, 8, 12);
        Assert.InRange(counts.ToCheck, 3, 5);
        Assert.InRange(counts.NotYet, 30, 60);
        Assert.InRange(counts.Mine, 70, 85);
        Assert.Equal(1, counts.PutOff);
        Assert.Equal(DemoClinic.UsualPatients, await db.Patients.CountAsync(Cancellation));
        Assert.InRange(await db.Readings.CountAsync(Cancellation), 140_000, 190_000);
    }

    [Theory, BothDatabases]
    public async Task Is_marked_as_a_demo_with_one_person_for_each_role(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, DemoTemplates.MadeInLateMorning, DemoTemplates.LateMorning);
        Assert.True(clinic.Get<CurrentSettings>().Value.IsDemo);
        await using var scope = clinic.Services.CreateAsyncScope();
        var people = await scope.ServiceProvider.GetRequiredService<People>().ListAsync(Cancellation);
        Assert.Equal(
            ["administrator Administrator", "cardiologist Prescriber", "coordinator Coordinator", "nurse Nurse"],
            people.Select(person => $"{person.UserName} {Assert.Single(person.Roles)}").Order(StringComparer.Ordinal));
    }

    [Theory, BothDatabases]
    public async Task Has_an_open_question_and_an_unread_answer(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, DemoTemplates.MadeInLateMorning, DemoTemplates.LateMorning);
        var questions = clinic.Get<QuestionsQuery>();
        Assert.Equal("Jetty, Miriam", Assert.Single(await questions.RowsAsync(QuestionsView.Open, 0, 10, Cancellation)).PatientName);
        Assert.Equal("Sandbar, Cyril", Assert.Single(await questions.RowsAsync(QuestionsView.AnsweredUnread, 0, 10, Cancellation)).PatientName);
    }

    [Theory]
    [BothDatabases(nameof(DemoTemplates.MadeInLateMorning))]
    [BothDatabases(nameof(DemoTemplates.MadeAtNight))]
    public async Task Nothing_lies_in_the_future_and_the_record_of_access_runs_in_order(DatabaseEngine engine, string template)
    {
        var (made, now) = template == nameof(DemoTemplates.MadeAtNight)
            ? (DemoTemplates.MadeAtNight, DemoTemplates.Night)
            : (DemoTemplates.MadeInLateMorning, DemoTemplates.LateMorning);
        await using var clinic = await TestClinic.StartAsync(engine, made, now);
        await using var db = clinic.OpenDb();
        var limit = now.UtcDateTime;
        Assert.Equal(0, await db.Readings.CountAsync(row => row.MeasuredAt > limit || row.RecordedAt > limit, Cancellation));
        Assert.Equal(0, await db.Contacts.CountAsync(row => row.At > limit, Cancellation));
        Assert.Equal(0, await db.SymptomReports.CountAsync(row => row.RecordedAt > limit, Cancellation));
        Assert.Equal(0, await db.DoseCourses.CountAsync(row => row.RecordedAt > limit, Cancellation));
        Assert.Equal(0, await db.BloodTests.CountAsync(row => row.TakenAt > limit || row.RecordedAt > limit, Cancellation));
        Assert.Equal(0, await db.Visits.CountAsync(row => row.RecordedAt > limit, Cancellation));
        Assert.Equal(0, await db.FlagSteps.CountAsync(row => row.At > limit, Cancellation));
        var times = await db.AuditEntries.OrderBy(line => line.Id).Select(line => line.At).ToListAsync(Cancellation);
        Assert.Equal(times.Order(), times);
        Assert.True(times[^1] <= limit);
        Assert.Null((await clinic.Get<AuditVerification>().RunAsync(Cancellation)).Fault);
    }

    [Theory, BothDatabases]
    public async Task The_newest_readings_are_of_today(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, DemoTemplates.MadeInLateMorning, DemoTemplates.LateMorning);
        await using var db = clinic.OpenDb();
        Assert.Equal(new DateOnly(2026, 11, 10), await db.Readings.MaxAsync(reading => reading.Day, Cancellation));
        Assert.Equal(new DateOnly(2026, 11, 10).AddDays(-179), await db.Readings.MinAsync(reading => reading.Day, Cancellation));
    }

    [Theory, BothDatabases]
    public async Task Refuses_a_database_that_is_not_empty_and_leaves_it_alone(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => DemoClinic.SeedAsync(clinic.Services, cancellation: Cancellation));
        Assert.Contains("not empty", refusal.Message, StringComparison.Ordinal);
        await using var db = clinic.OpenDb();
        Assert.False(await db.Patients.AnyAsync(Cancellation));
        Assert.False((await db.Settings.SingleAsync(Cancellation)).IsDemo);
    }

    [Theory, BothDatabases]
    public async Task The_program_that_made_it_goes_on_with_it_at_once(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, Templates.Migrated);
        await DemoClinic.SeedAsync(clinic.Services, DemoTemplates.Few, Cancellation);
        Assert.Equal(DemoClinic.Name, clinic.Get<CurrentSettings>().Value.ClinicName);
    }

    [Theory]
    [BothDatabases(10)]
    [BothDatabases(100_001)]
    public async Task Refuses_a_number_of_patients_it_cannot_make(DatabaseEngine engine, int patients)
    {
        await using var clinic = await TestClinic.StartAsync(engine, Templates.Migrated);
        await Assert.ThrowsAsync<RefusedException>(() => DemoClinic.SeedAsync(clinic.Services, patients, Cancellation));
        Assert.Null(clinic.Get<CurrentSettings>().OrNull);
    }
}
