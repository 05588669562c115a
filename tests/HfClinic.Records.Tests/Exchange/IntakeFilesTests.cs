using HfClinic.Clinical.Weights;
using HfClinic.Records.Exchange;
using HfClinic.Records.Patients;
using HfClinic.Records.Reassessment;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Exchange;

/// <summary>The roster and the home-scale file against what was computed from them apart from this program (expected.json).</summary>
public class IntakeFilesTests
{
    private static readonly ExpectedIntake Expected = ExpectedIntake.Read();

    [Theory, BothDatabases]
    public async Task Every_line_and_every_patient_comes_out_as_computed(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, now: ImportBench.EndOfIntake);
        var roster = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("patients.csv"));
        Assert.Equal((96, 96, ImportState.Done), (roster.Lines, roster.Accepted, roster.State));

        var run = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("home-readings.csv"));
        await AssertLinesAsync(clinic, run);
        await AssertPatientsAsync(clinic);
    }

    [Theory, BothDatabases]
    public async Task The_same_files_again_change_nothing(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine, now: ImportBench.EndOfIntake);
        await ImportBench.ReadInAsync(clinic, ImportBench.Intake("patients.csv"));
        var first = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("home-readings.csv"));
        var before = await ContentAsync(clinic);

        var roster = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("patients.csv"));
        var again = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("home-readings.csv"));

        Assert.Equal((96, 96), (roster.Lines, roster.Duplicates));
        Assert.All(await ImportBench.LinesAsync(clinic, roster), line => Assert.Equal("enrolled already", line.Reason));
        Assert.Equal((0, 0, first.Refused), (again.Accepted, again.Held, again.Refused));
        Assert.Equal(again.Lines - again.Refused, again.Duplicates);
        Assert.Equal(before, await ContentAsync(clinic));
    }

    [Theory]
    [BothDatabases(0)]
    [BothDatabases(1)]
    public async Task Stopped_on_the_way_and_read_in_again_it_comes_out_the_same(DatabaseEngine engine, int batchesBefore)
    {
        await using var clinic = await TestClinic.StartAsync(engine, now: ImportBench.EndOfIntake);
        await ImportBench.ReadInAsync(clinic, ImportBench.Intake("patients.csv"));
        using var stop = new CancellationTokenSource();
        var batches = 0;
        var stopped = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("home-readings.csv"),
            progress: new Now(step =>
            {
                if (!step.IsReassessing && batches++ == batchesBefore)
                {
                    stop.Cancel();
                }
            }), cancellation: stop.Token);
        Assert.Equal(ImportState.Stopped, stopped.State);
        Assert.InRange(stopped.Lines, 1, 5122);

        var rest = await ImportBench.ReadInAsync(clinic, ImportBench.Intake("home-readings.csv"));
        Assert.Equal(ImportState.Done, rest.State);
        Assert.Equal(5 - stopped.Held, rest.Held);
        await AssertPatientsAsync(clinic);
    }

    private static async Task AssertLinesAsync(TestClinic clinic, ImportRun run)
    {
        var lines = await ImportBench.LinesAsync(clinic, run);
        Assert.Equal(
            Expected.Lines.OrderBy(line => line.Key).Select(line => (line.Key, line.Value)),
            lines.Select(line => (line.LineNumber, WordOf(line))));
        Assert.All(lines.Where(line => line.Outcome is ImportLineOutcome.Held or ImportLineOutcome.Refused), line => Assert.NotEmpty(line.Mend));
        Assert.Equal(Expected.Counts["ok"] + Expected.Counts["later"], run.Accepted);
        Assert.Equal(Expected.Counts["later"], run.Later);
        Assert.Equal(Expected.Counts["duplicate"], run.Duplicates);
        Assert.Equal(Expected.Counts.Where(count => count.Key.StartsWith("held", StringComparison.Ordinal)).Sum(count => count.Value), run.Held);
        Assert.Equal(Expected.Counts.Where(count => count.Key.StartsWith("refused", StringComparison.Ordinal)).Sum(count => count.Value), run.Refused);
        Assert.Equal(Expected.Counts.Values.Sum(), run.Lines);
        Assert.Equal(ImportState.Done, run.State);
    }

    private static string WordOf(ImportLine line) => line.Outcome switch
    {
        ImportLineOutcome.Accepted => line.Reason == "later reading of the same day" ? "later" : line.Reason,
        ImportLineOutcome.Duplicate => "duplicate",
        _ => $"{ImportWords.Of(line.Outcome)}: {line.Reason}",
    };

    private static async Task AssertPatientsAsync(TestClinic clinic)
    {
        await using var db = clinic.OpenDb();
        var patients = await db.Patients.AsNoTracking().OrderBy(patient => patient.ClinicNumber).ToListAsync(TestContext.Current.CancellationToken);
        Assert.Equal(Expected.Patients.Keys.Order(), patients.Select(patient => patient.ClinicNumber));
        foreach (var patient in patients)
        {
            await AssertPatientAsync(clinic, db, patient);
        }
    }

    private static async Task AssertPatientAsync(TestClinic clinic, ClinicDb db, Patient patient)
    {
        var wanted = Expected.Patients[patient.ClinicNumber];
        var summary = await db.PatientSummaries.AsNoTracking().SingleAsync(row => row.PatientId == patient.Id, TestContext.Current.CancellationToken);
        Assert.Equal(
            (patient.ClinicNumber, wanted.LastDay, wanted.LastGrams, wanted.Gain1, wanted.Gain3, wanted.Gain7),
            (patient.ClinicNumber, summary.LastWeightDay, summary.LastGrams, summary.Gain1Day, summary.Gain3Days, summary.Gain7Days));
        Assert.Equal(wanted.GainOver2KgIn3Days, summary.Gain3Days > 2_000);
        Assert.Equal(wanted.Gain5LbIn7Days, summary.Gain7Days >= 2_268);

        var picture = await clinic.Get<PatientPictureLoader>().LoadAsync(db, patient, Expected.AsOf, TestContext.Current.CancellationToken);
        var weights = WeightSummary.Of(picture);
        Assert.Equal(
            (patient.ClinicNumber, wanted.Loss1, wanted.Loss3, wanted.Loss7, wanted.SilentDays),
            (patient.ClinicNumber, -weights.Loss(1)?.Difference.Grams, -weights.Loss(3)?.Difference.Grams, -weights.Loss(7)?.Difference.Grams, weights.SilentDays));
        Assert.Equal(wanted.NoWeight5Days, weights.SilentDays >= 5);
    }

    private static async Task<List<string>> ContentAsync(TestClinic clinic)
    {
        await using var db = clinic.OpenDb();
        var readings = await db.Readings.AsNoTracking().OrderBy(reading => reading.Id)
            .Select(reading => $"{reading.Id} {reading.PatientId} {reading.Kind} {reading.Value} {reading.State} {reading.ImportId}")
            .ToListAsync(TestContext.Current.CancellationToken);
        var summaries = await db.PatientSummaries.AsNoTracking().OrderBy(summary => summary.PatientId)
            .Select(summary => $"{summary.PatientId} {summary.LastGrams} {summary.Gain7Days} {summary.TargetGrams} {summary.HeldReadings}")
            .ToListAsync(TestContext.Current.CancellationToken);
        return [.. readings, .. summaries, $"{await db.TargetWeights.CountAsync(TestContext.Current.CancellationToken)} targets"];
    }

    /// <summary>Reports on the thread that works, so that a test can stop it there.</summary>
    private sealed class Now(Action<ImportProgress> onStep) : IProgress<ImportProgress>
    {
        public void Report(ImportProgress value) => onStep(value);
    }
}
