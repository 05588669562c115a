using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Audit;
using HfClinic.Records.Chart;
using HfClinic.Records.Contacts;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Chart;

public class ChartQueryTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);
    private static readonly Actor Prescriber = TestClinic.As(ClinicRole.Prescriber);
    private static readonly DateOnly Today = new(2026, 3, 31);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task Opening_is_noted_once_and_reading_again_is_not(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.Get<ChartQuery>().OpenAsync(Nurse, id, Cancellation);
        await clinic.Get<ChartQuery>().ReadAgainAsync(id, Cancellation);
        var audit = clinic.Get<AuditQuery>();
        var opened = Assert.Single(await audit.RowsAsync(new(PatientId: id), Cancellation), row => row.Entry.What == ChartQuery.Opened);
        Assert.Equal(("Test Nurse", "Elsmere, Oda"), (opened.Entry.ByName, opened.PatientName));
        Assert.DoesNotContain(await audit.RowsAsync(new(PatientId: id, ChangesOnly: true), Cancellation), row => row.Entry.What == ChartQuery.Opened);
    }

    [Theory, BothDatabases]
    public async Task An_unknown_number_is_not_found_and_leaves_no_line(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var before = await clinic.Get<AuditQuery>().CountAsync(new(), Cancellation);
        await Assert.ThrowsAsync<NotFoundException>(() => clinic.Get<ChartQuery>().OpenAsync(Nurse, 4711, Cancellation));
        await Assert.ThrowsAsync<NotFoundException>(() => clinic.Get<ChartQuery>().ReadAgainAsync(4711, Cancellation));
        Assert.Equal(before, await clinic.Get<AuditQuery>().CountAsync(new(), Cancellation));
    }

    [Theory, BothDatabases]
    public async Task Holds_everything_known_and_nothing_of_another_patient(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await FillAsync(clinic, await clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "T-200" }));
        await FillAsync(clinic, id);
        var chart = await clinic.Get<ChartQuery>().OpenAsync(Prescriber, id, Cancellation);

        Assert.Equal(("T-100", 74_600), (chart.Patient.ClinicNumber, chart.Summary.LastGrams));
        Assert.Equal([71_500, 72_000], chart.TargetWeights.Select(target => target.Grams));
        Assert.Equal("slip", chart.TargetWeights[0].StruckOutBecause);
        Assert.Equal([(40m, null), (20m, Today)], chart.DoseCourses.Select(course => (course.DoseMilligrams, course.Until)));
        Assert.Equal(Symptoms.AnkleSwelling, Assert.Single(chart.SymptomReports).Symptoms);
        Assert.Equal(ContactOutcome.LeftMessage, Assert.Single(chart.Contacts).Outcome);
        Assert.Equal("may she come?", Assert.Single(chart.Questions).Text);
        Assert.Equal(("silence.days", 4m), chart.OwnThresholds.Select(own => (own.Key, own.Value)).Single());
        Assert.All(chart.Flags, flag => Assert.All(flag.Steps, step => Assert.Equal(id, step.PatientId)));
        var gain = chart.Flags.Single(flag => flag.Flag.RuleId == "volume.gain-3-days");
        Assert.Equal([FlagStepKind.Raised, FlagStepKind.Answered], gain.Steps.Select(step => step.Kind));
        Assert.True(chart.Flags.Select(flag => flag.Flag.State == FlagState.Open).SequenceEqual(
            chart.Flags.Select(flag => flag.Flag.State == FlagState.Open).OrderDescending()), "open flags come first");
    }

    [Theory, BothDatabases]
    public async Task Readings_come_in_pages_with_their_decisions(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        for (var day = Today.AddDays(-4); day <= Today; day = day.AddDays(1))
        {
            await clinic.WeighAsync(id, day, 70 + (day.DayNumber % 5 / 10m));
        }

        var held = await clinic.HoldWeightAsync(id, Today.AddDays(-9), 155, HoldReason.PoundsTakenAsKilograms);
        await clinic.Get<DecideReading>().CorrectAsync(Nurse, held, 70_300, "155 lb", "pounds", Cancellation);
        await clinic.Get<RecordReadings>().RunAsync(Nurse, id, new() { LocalTime = Today.ToDateTime(new(8, 0)), HeartRate = 70 }, Cancellation);
        var chart = clinic.Get<ChartQuery>();
        Assert.Equal(8, await chart.ReadingCountAsync(id, null, Cancellation));
        Assert.Equal(7, await chart.ReadingCountAsync(id, ReadingKind.Weight, Cancellation));
        Assert.Equal(ReadingKind.HeartRate, (await chart.ReadingsAsync(id, null, 0, 1, Cancellation)).Single().Reading.Kind);
        var last = await chart.ReadingsAsync(id, ReadingKind.Weight, 5, 10, Cancellation);
        Assert.Equal([(70_300, ReadingState.Accepted), (155_000, ReadingState.Superseded)], last.Select(row => (row.Reading.Value, row.Reading.State)));
        Assert.Equal(["pounds"], last[1].Decisions.Select(decision => decision.Reason));
        Assert.Empty(last[0].Decisions);
    }

    private static async Task FillAsync(TestClinic clinic, long id)
    {
        var targets = clinic.Get<SetTargetWeight>();
        await targets.RunAsync(Prescriber, id, new(72_000), Today.AddDays(-60), null, Cancellation);
        await targets.StrikeOutAsync(Prescriber, await targets.RunAsync(Prescriber, id, new(71_500), Today, null, Cancellation), "slip", Cancellation);
        await clinic.Get<MedicineCourses>().SetAsync(Prescriber, id, new("furosemide", 20, 1), Today.AddDays(-60), null, Cancellation);
        await clinic.Get<MedicineCourses>().SetAsync(Prescriber, id, new("furosemide", 40, 1), Today, "weight up", Cancellation);
        await clinic.Get<RecordReadings>().RunAsync(Nurse, id, new() { LocalTime = Today.ToDateTime(new(8, 0)), Symptoms = Symptoms.AnkleSwelling }, Cancellation);
        await clinic.Get<RecordContact>().RunAsync(Nurse, id, ContactOutcome.LeftMessage, null, [], Cancellation);
        await clinic.Get<AskQuestion>().RunAsync(Nurse, id, "may she come?", null, Cancellation);
        await clinic.Get<SetPatientThreshold>().RunAsync(Prescriber, id, "silence.days", 4, true, "lives alone", Cancellation);
        await using var db = clinic.OpenDb();
        var gain = await db.Flags.SingleAsync(flag => flag.PatientId == id && flag.RuleId == "volume.gain-3-days", Cancellation);
        await clinic.Get<AnswerFlag>().RunAsync(Nurse, gain.Id, "known", Cancellation);
    }
}
