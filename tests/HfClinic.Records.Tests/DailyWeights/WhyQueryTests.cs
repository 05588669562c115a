using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Contacts;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Medicines;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;

namespace HfClinic.Records.Tests.DailyWeights;

/// <summary>What the panel beside the list says (invented data: behaviour only).</summary>
public class WhyQueryTests
{
    private static readonly DateOnly Today = PatientsAtHome.Today;
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);

    [Theory, BothDatabases]
    public async Task It_holds_the_open_flags_with_their_evidence_most_urgent_first(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolWithGainAsync();

        var why = await clinic.Get<WhyQuery>().ReadAsync(patient, TestContext.Current.CancellationToken);

        Assert.Equal(new GainInThreeDays().Id, why.Flags[0].Flag.RuleId);
        Assert.Contains(why.Flags[0].Evidence, seen => seen is { RaisedIt: true, Value: "74.6 kg" });
        Assert.Equal(why.Flags.OrderByDescending(flag => flag.Flag.Urgency).Select(flag => flag.Flag.Id), why.Flags.Select(flag => flag.Flag.Id));
    }

    [Theory, BothDatabases]
    public async Task What_was_measured_and_told_beside_the_weight_is_of_the_last_week(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAsync();
        var token = TestContext.Current.CancellationToken;
        await TakeAsync(Today.AddDays(-8), new() { HeartRate = 61 });
        await TakeAsync(Today.AddDays(-1), new() { SystolicPressure = 118, DiastolicPressure = 72, HeartRate = 88 });
        await TakeAsync(Today, new() { Symptoms = Symptoms.AnkleSwelling, Note = "left more than right" });
        await TakeAsync(Today, new() { AskedForSymptoms = true });

        var beside = (await clinic.Get<WhyQuery>().ReadAsync(patient, token)).Beside;

        Assert.Equal(
            [
                new WhyBeside(Today.AddDays(-1), "BP 118/72 mmHg"), new(Today.AddDays(-1), "pulse 88 per minute"),
                new(Today, "asked, no symptoms"), new(Today, "ankles swollen (“left more than right”)"),
            ],
            beside);

        Task TakeAsync(DateOnly day, TakenReadings taken) => clinic.Get<RecordReadings>().RunAsync(
            Nurse, patient, taken with { LocalTime = day.ToDateTime(new TimeOnly(7, 0)) }, token);
    }

    [Theory, BothDatabases]
    public async Task Held_readings_wait_with_their_likely_reason_and_local_time(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAsync();
        var reading = await clinic.HoldWeightAsync(patient, Today, 141.6m, HoldReason.PoundsTakenAsKilograms);

        var why = await clinic.Get<WhyQuery>().ReadAsync(patient, TestContext.Current.CancellationToken);

        Assert.Equal(
            [new WhyHeld(reading, Today.ToDateTime(new TimeOnly(7, 0)), new Weight(141_600), HoldReason.PoundsTakenAsKilograms, null)],
            why.Held);
    }

    [Theory, BothDatabases]
    public async Task Calls_doses_and_open_questions_stand_newest_day_first(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAsync();
        var token = TestContext.Current.CancellationToken;
        await clinic.Get<MedicineCourses>().SetAsync(TestClinic.As(ClinicRole.Prescriber), patient, new("furosemide", 40, 1), Today.AddDays(-3), "dry", token);
        await clinic.Get<RecordContact>().RunAsync(Nurse, patient, ContactOutcome.Spoke, "well, no swelling", [], token);
        await clinic.Get<AskQuestion>().RunAsync(Nurse, patient, "Lower the dose?", null, token);

        var why = await clinic.Get<WhyQuery>().ReadAsync(patient, token);

        Assert.Equal(["Spoken (Test Nurse): well, no swelling", "Test Prescriber set furosemide 40 mg daily: dry"], why.Before.Select(line => line.Words));
        Assert.Equal(["Lower the dose?"], why.Questions.Select(question => question.Text));
    }

    [Theory, BothDatabases]
    public async Task An_unknown_person_is_not_found(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await Assert.ThrowsAsync<NotFoundException>(() => clinic.Get<WhyQuery>().ReadAsync(999, TestContext.Current.CancellationToken));
    }
}
