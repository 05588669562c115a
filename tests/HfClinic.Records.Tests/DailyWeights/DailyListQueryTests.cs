using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.DailyWeights;

/// <summary>The list with what is drawn beside its rows (invented data: behaviour only).</summary>
public class DailyListQueryTests
{
    private static readonly DateOnly Today = PatientsAtHome.Today;

    [Theory, BothDatabases]
    public async Task Only_the_rows_asked_for_are_read_and_all_are_counted(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        for (var at = 1; at <= 4; at++)
        {
            await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = $"T-{at}" });
        }

        var list = await clinic.Get<DailyListQuery>().ReadAsync(new(Take: 3), TestContext.Current.CancellationToken);

        Assert.Equal((3, 4, Today), (list.Rows.Count, list.Total, list.Today));
    }

    [Theory, BothDatabases]
    public async Task A_strip_has_its_days_its_held_readings_and_the_target_that_held_at_its_start(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync(targetKilograms: null);
        var (prescriber, token) = (TestClinic.As(ClinicRole.Prescriber), TestContext.Current.CancellationToken);
        await clinic.Get<SetTargetWeight>().RunAsync(prescriber, patient, Weight.FromKilograms(82m), Today.AddDays(-55), null, token);
        await clinic.Get<SetTargetWeight>().RunAsync(prescriber, patient, Weight.FromKilograms(81m), Today.AddDays(-40), null, token);
        await clinic.Get<SetTargetWeight>().RunAsync(prescriber, patient, Weight.FromKilograms(80m), Today.AddDays(-5), null, token);
        await clinic.WeighAsync(patient, Today.AddDays(-28), 80.0m);
        await clinic.WeighAsync(patient, Today.AddDays(-27), 80.1m);
        await clinic.WeighAsync(patient, Today.AddDays(-1), 80.2m);
        await clinic.HoldWeightAsync(patient, Today, 176.8m, HoldReason.PoundsTakenAsKilograms);

        var strip = (await clinic.Get<DailyListQuery>().ReadAsync(new(), token)).Rows[0].Strip;

        Assert.Equal([Today.AddDays(-27), Today.AddDays(-1)], strip.Days.Select(day => day.Day));
        Assert.Equal([HoldReason.PoundsTakenAsKilograms], strip.Held.Select(held => held.Held!.Reason));
        Assert.Equal([81_000, 80_000], strip.Targets.Select(target => target.Weight.Grams));
    }

    [Theory, BothDatabases]
    public async Task The_filtered_line_runs_from_the_strips_first_day_to_the_last_weight_and_lies_among_the_weights(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        for (var back = 35; back >= 2; back--)
        {
            await clinic.WeighAsync(patient, Today.AddDays(-back), back % 2 == 0 ? 80.2m : 79.8m);
        }

        var trend = (await clinic.Get<DailyListQuery>().ReadAsync(new(), TestContext.Current.CancellationToken)).Rows[0].Strip.Trend;

        Assert.Equal((Today.AddDays(-27), Today.AddDays(-2), 26), (trend[0].Day, trend[^1].Day, trend.Count));
        Assert.All(trend, step => Assert.InRange(step.Grams, 79_700, 80_300));
    }

    [Theory, BothDatabases]
    public async Task Loop_diuretics_begun_changed_and_stopped_are_steps_and_other_medicines_are_not(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        var (courses, prescriber, token) = (clinic.Get<MedicineCourses>(), TestClinic.As(ClinicRole.Prescriber), TestContext.Current.CancellationToken);
        await courses.SetAsync(prescriber, patient, new("furosemide", 80, 1), Today.AddDays(-50), null, token);
        await courses.SetAsync(prescriber, patient, new("furosemide", 40, 1), Today.AddDays(-10), null, token);
        await courses.SetAsync(prescriber, patient, new("bisoprolol", 5, 1), Today.AddDays(-9), null, token);
        await courses.StopAsync(prescriber, patient, "furosemide", Today.AddDays(-2), "dry", token);

        var steps = (await clinic.Get<DailyListQuery>().ReadAsync(new(), token)).Rows[0].Strip.Diuretics;

        Assert.Equal(
            [new(Today.AddDays(-10), "furosemide 40 mg daily"), new DiureticStep(Today.AddDays(-2), "furosemide stopped")],
            steps);
    }

    [Theory, BothDatabases]
    public async Task A_row_knows_its_open_flags_and_the_readings_that_raised_them(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var gained = await db.Readings.Where(reading => reading.PatientId == patient && reading.Day == Today).Select(reading => reading.Id).SingleAsync(TestContext.Current.CancellationToken);
        var flagId = await db.Flags.Where(f => f.RuleId == new GainInThreeDays().Id).Select(f => f.Id).SingleAsync(TestContext.Current.CancellationToken);
        await clinic.Get<PutOffFlag>().RunAsync(TestClinic.As(ClinicRole.Nurse), flagId, Today.AddDays(2), "visit booked", TestContext.Current.CancellationToken);

        var flag = (await clinic.Get<DailyListQuery>().ReadAsync(new(), TestContext.Current.CancellationToken)).Rows[0].Flags
            .Single(f => f.RuleId == new GainInThreeDays().Id);

        Assert.Equal((true, Today.AddDays(2)), (flag.IsMet, flag.PutOffUntil));
        Assert.Equal([gained], flag.Evidence.Where(seen => seen.RaisedIt).Select(seen => seen.ReadingId!.Value));
    }
}
