using HfClinic.Clinical.Rules;
using HfClinic.Records.Access;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Reassessment;

/// <summary>The weight trend on the summary, the strip and the flags (invented data; the trend itself is checked against reference series elsewhere).</summary>
public class TrendOnRecordTests
{
    private const string Gain = "volume.fluid-gain";

    private static readonly decimal[] Gaining =
        [.. Enumerable.Range(0, 20).Select(day => day % 2 == 0 ? 80.2m : 79.8m), 80.3m, 80.8m, 81.2m, 81.6m, 82.0m, 82.3m];

    [Theory, BothDatabases]
    public async Task A_gain_is_told_in_plain_words_and_its_figures_stand_on_the_summary(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, Gaining);

        var (flag, summary) = await ReadAsync(clinic, patient);

        Assert.Matches(@"^\d\.\d kg above own baseline over \d days; day-to-day scatter 0\.\d kg$", flag.Statement);
        Assert.Equal(Urgency.ThisWeek, flag.Urgency);
        Assert.True(summary.FluidScore > 2);
        Assert.InRange(summary.FluidGrams!.Value, 800, 2_300);
        Assert.InRange(summary.FluidBandGrams!.Value, 200, 1_200);
        Assert.InRange(summary.ScatterGrams!.Value, 200, 700);
        Assert.InRange(summary.ExcessGrams!.Value, 1_000, 2_300);
        Assert.InRange(summary.ExcessErrorGrams!.Value, 100, 600);
        Assert.True(summary.SlopeGramsPerWeek > summary.SlopeBandGramsPerWeek);
        Assert.Equal((true, false, false), (summary.IsRising, summary.IsFalling, summary.IsLearning));
        Assert.Equal(PatientsAtHome.Today, summary.TrendDay);
    }

    [Theory, BothDatabases]
    public async Task A_trend_that_still_learns_has_no_figures_and_says_so(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, 80.0m, 81.0m, 82.0m);

        await using var db = clinic.OpenDb();
        var summary = await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken);

        Assert.True(summary.IsLearning);
        Assert.Null(summary.FluidGrams);
        Assert.Null(summary.ExcessGrams);
        Assert.Contains(
            "Fluid gain, Early fluid gain, Trend above target weight, Fluid loss and Target weight out of step: "
            + "still learning this person's own scatter: 3 of 7 weights in 14 days",
            summary.NotChecked);
    }

    [Theory, BothDatabases]
    public async Task The_strip_has_the_line_with_its_band_up_to_the_last_weight(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        var silent = await clinic.EnrolAtHomeAsync("T-2");
        await clinic.WeighDailyAsync(patient, Gaining);
        await clinic.WeighAsync(patient, PatientsAtHome.Today.AddDays(-40), 80.0m);

        var from = PatientsAtHome.Today.AddDays(-9);
        clinic.Clock.Advance(TimeSpan.FromDays(2));
        await clinic.Get<Records.Reassessment.MorningSweep>().RunIfDueAsync(TestContext.Current.CancellationToken);
        var strips = await clinic.Get<WeightStripQuery>().ReadAsync(
            [patient, silent], from, PatientsAtHome.Today.AddDays(2), TestContext.Current.CancellationToken);

        var line = strips[patient].Trend;
        Assert.Equal(Enumerable.Range(0, 10).Select(day => from.AddDays(day)), line.Select(point => point.Day));
        Assert.All(line, point => Assert.InRange(point.Grams, point.LowGrams + 100, point.HighGrams - 100));
        Assert.InRange(line[^1].Grams, 81_300, 82_300);
        Assert.Empty(strips[silent].Trend);
        await using var db = clinic.OpenDb();
        var kept = TrendLine.Read(await db.PatientSummaries.Where(s => s.PatientId == patient).Select(s => s.TrendLine).SingleAsync(TestContext.Current.CancellationToken));
        Assert.Equal(PatientsAtHome.Today.AddDays(2 - TrendLine.Days + 1), kept[0].Day);
    }

    [Theory, BothDatabases]
    public async Task A_corrected_weight_of_last_week_changes_today_s_trend_and_what_was_shown_then_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, Gaining);
        var (before, shown) = await ReadAsync(clinic, patient);
        await using var db = clinic.OpenDb();
        var cancellation = TestContext.Current.CancellationToken;
        var steps = await db.FlagSteps.AsNoTracking().Where(step => step.FlagId == before.Id).OrderBy(step => step.Id).ToListAsync(cancellation);
        var lastWeek = await db.Readings.Where(reading => reading.Day == PatientsAtHome.Today.AddDays(-5)).Select(reading => reading.Id).SingleAsync(cancellation);

        clinic.Clock.Advance(TimeSpan.FromDays(1));
        await clinic.Get<DecideReading>().CorrectAsync(
            TestClinic.As(ClinicRole.Nurse), lastWeek, 82_000, "82.0 kg", "misheard on the phone", cancellation);

        var (after, summary) = await ReadAsync(clinic, patient);
        Assert.NotEqual(shown.FluidScore, summary.FluidScore);
        Assert.NotEqual(shown.FluidGrams, summary.FluidGrams);
        Assert.NotEqual(TrendLine.Read(shown.TrendLine)[^1], TrendLine.Read(summary.TrendLine)[^1]);
        Assert.Equal(before.Id, after.Id);
        Assert.NotEqual(before.EvidenceJson, after.EvidenceJson);
        var stepsNow = await db.FlagSteps.AsNoTracking().Where(step => step.FlagId == before.Id).OrderBy(step => step.Id).ToListAsync(cancellation);
        Assert.True(stepsNow.Count > steps.Count);
        Assert.Equal(
            steps.Select(step => (step.Kind, step.At, step.Statement, step.EvidenceJson)),
            stepsNow.Take(steps.Count).Select(step => (step.Kind, step.At, step.Statement, step.EvidenceJson)));
        Assert.Equal(before.Statement, stepsNow[steps.Count - 1].Statement);
    }

    [Theory, BothDatabases]
    public async Task Late_corrected_and_repeated_weights_come_to_the_same_as_the_right_ones_in_order(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var cancellation = TestContext.Current.CancellationToken;
        var inOrder = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(inOrder, Gaining);
        var inDisorder = await clinic.EnrolAtHomeAsync("T-2");
        var days = Gaining.Index().Select(weight => (Day: PatientsAtHome.Today.AddDays(weight.Index - Gaining.Length + 1), weight.Item)).ToList();
        foreach (var (day, kilograms) in days.Where((_, at) => at % 3 == 0).Reverse())
        {
            await clinic.WeighAsync(inDisorder, day, kilograms);
        }

        foreach (var (day, kilograms) in days.Where((_, at) => at % 3 != 0))
        {
            await clinic.WeighAsync(inDisorder, day, kilograms + (day == days[10].Day ? 0.9m : 0));
        }

        await using var db = clinic.OpenDb();
        var misheard = await db.Readings.Where(r => r.PatientId == inDisorder && r.Day == days[10].Day).Select(r => r.Id).SingleAsync(cancellation);
        await clinic.Get<DecideReading>().CorrectAsync(
            TestClinic.As(ClinicRole.Nurse), misheard, (int)(days[10].Item * 1000), "as written down", "misheard on the phone", cancellation);
        await Assert.ThrowsAsync<RefusedException>(() => clinic.WeighAsync(inDisorder, days[4].Day, days[4].Item));

        var (_, right) = await ReadAsync(clinic, inOrder);
        var (_, replayed) = await ReadAsync(clinic, inDisorder);
        Assert.Equal(
            (right.TrendLine, right.FluidScore, right.ExcessGrams, right.SlopeGramsPerWeek, right.ScatterGrams),
            (replayed.TrendLine, replayed.FluidScore, replayed.ExcessGrams, replayed.SlopeGramsPerWeek, replayed.ScatterGrams));
    }

    private static async Task<(Flag Flag, PatientSummary Summary)> ReadAsync(TestClinic clinic, long patient)
    {
        await using var db = clinic.OpenDb();
        return (
            await db.Flags.AsNoTracking().SingleAsync(flag => flag.RuleId == Gain && flag.PatientId == patient, TestContext.Current.CancellationToken),
            await db.PatientSummaries.AsNoTracking().SingleAsync(summary => summary.PatientId == patient, TestContext.Current.CancellationToken));
    }
}
