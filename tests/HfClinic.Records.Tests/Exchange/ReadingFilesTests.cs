using System.Globalization;
using System.Text;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Exchange;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Exchange;

public class ReadingFilesTests
{
    [Theory, BothDatabases]
    public async Task Each_line_has_its_outcome_reason_and_mend(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        (string Line, string Outcome)[] lines =
        [
            ("t-1;30/03/2026;07:00;72,7;kg;118;72;60;97;s", ""),
            ("T-1;29/03/2026;07:00;160.5 lb;;;;;;s", ""),
            ("T-1;28/03/2026;07:00;73;;118;72;;;", "refused: no unit"),
            ("T-1;28/03/2026;;73;kg;;;;;", "refused: no time of day"),
            ("T-1;28/03/2026;7:61;73;kg;;;;;", "refused: no such time of day"),
            ("T-1;28/03/26;07:00;73;kg;;;;;", "refused: year has two digits only"),
            ("T-1;;07:00;73;kg;;;;;", "refused: no date"),
            ("T-1;someday;07:00;73;kg;;;;;", "refused: date is not readable"),
            ("T-1;28/03/2026;07:00;1,072.5;kg;;;;;", "refused: weight is not a number"),
            ("T-1;28/03/2026;07:00;99999999999;kg;;;;;", "refused: weight outside 25 to 300 kg"),
            ("T-1;28/03/2026;07:00;73;kg;118;;;;", "refused: only one of the two pressures"),
            ("T-1;28/03/2026;07:00;73;kg;x;72;;;", "refused: systolic is not a whole number"),
            ("T-1;28/03/2026;07:00;73;kg;300;72;;;", "refused: A systolic pressure of 300 is outside 50 to 260 mmHg"),
            ("T-1;28/03/2001;07:00;73;kg;;;;;", "refused: measured more than 20 years ago"),
            ("T-1;28/03/2026;07:00;;;;;;;s", "refused: nothing measured on this line"),
            (";28/03/2026;07:00;73;kg;;;;;", "refused: no clinic number"),
            ("T-9;28/13/2026;07:00;73;st;;;;;", "refused: unknown clinic number; no such date; unit not known"),
            ("T-2;28/03/2026;07:00;73;kg;;;;;", "refused: measured after the person left the clinic"),
            ("T-1;28/03/2026;07:00;;;118;72;60;;", ""),
            ($"T-1;28/03/2026;07:01;73;kg;;;;;{new string('d', 61)}", "refused: device name is longer than 60 characters"),
        ];
        using var file = ImportBench.Write("number;date;time;weight;unit;sys;dia;pulse;spo2;device\n" + string.Join('\n', lines.Select(line => line.Line)));
        var run = await ImportBench.ReadInAsync(clinic, file.Path);

        var report = await ImportBench.LinesAsync(clinic, run);
        var expected = lines.Select((line, at) => (Number: at + 2, line.Outcome)).Where(line => line.Outcome.Length > 0);
        Assert.Equal(expected, report.Select(line => (line.LineNumber, $"{ImportWords.Of(line.Outcome)}: {line.Reason}")));
        Assert.All(report, line => Assert.NotEmpty(line.Mend));
        await using var db = clinic.OpenDb();
        var weights = await db.Readings.Where(reading => reading.Kind == ReadingKind.Weight).OrderBy(reading => reading.MeasuredAt)
            .ToListAsync(TestContext.Current.CancellationToken);
        Assert.Equal([(72_802, "160.5 lb"), (72_700, "72,7 kg")], weights.Select(weight => (weight.Value, weight.AsTyped)));
        Assert.Equal(new DateTime(2026, 3, 30, 6, 0, 0), weights[1].MeasuredAt);
    }

    [Theory, BothDatabases]
    public async Task Dates_that_can_be_read_two_ways_are_asked_about_and_then_read_as_told(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        using var file = ImportBench.Write("number;date;weight kg\nT-1;03/02/2026 07:00;72.0\nT-1;25/02/2026 07:00;72.1\n");
        var look = await ImportBench.LookAsync(file.Path);
        var guess = FileMapping.Guess(look);
        Assert.Equal("03/02/2026 07:00", look.Columns[1].EitherWayExample);
        Assert.Equal(DateOrder.DayFirst, look.Columns[1].SuggestedOrder);
        Assert.Contains("two ways", guess.Problems(look).Single().What);
        await Assert.ThrowsAsync<RefusedException>(() => clinic.Get<ImportFile>().RunAsync(
            TestClinic.As(ClinicRole.Nurse), look, guess, cancellation: TestContext.Current.CancellationToken));

        var run = await ImportBench.ReadInAsync(clinic, file.Path, mapping => mapping with
        {
            DateOrders = mapping.DateOrders.Add(ImportField.MeasuredAt, DateOrder.MonthFirst),
        });
        Assert.Equal((1, 1), (run.Accepted, run.Refused));
        await using var db = clinic.OpenDb();
        Assert.Equal(new DateOnly(2026, 3, 2), (await db.Readings.SingleAsync(TestContext.Current.CancellationToken)).Day);
    }

    [Theory, BothDatabases]
    public async Task The_order_of_lines_does_not_matter(DatabaseEngine engine)
    {
        var lines = Enumerable.Range(0, 40).Select(day => (Day: new DateOnly(2026, 2, 15).AddDays(day), Grams: day == 30 ? 158_000 : 72_000 + (day * 37 % 500)))
            .Select(entry => $"T-1;{entry.Day:yyyy-MM-dd} 07:00;{(entry.Grams / 1000m).ToString(CultureInfo.InvariantCulture)}").ToList();
        await using var clinic = await StartAsync(engine);
        using var file = ImportBench.Write("number;date;weight kg\n" + string.Join('\n', lines.AsEnumerable().Reverse()));
        var run = await ImportBench.ReadInAsync(clinic, file.Path);
        var line = Assert.Single(await ImportBench.LinesAsync(clinic, run));
        Assert.Equal((ImportLineOutcome.Held, 11, "looks like pounds entered as kilograms"), (line.Outcome, line.LineNumber, line.Reason));

        await using var db = clinic.OpenDb();
        var held = await db.Readings.SingleAsync(reading => reading.State == ReadingState.Held, TestContext.Current.CancellationToken);
        Assert.Equal((HoldReason.PoundsTakenAsKilograms, ReadingState.Held, 158_000), (held.HoldReason, held.FirstState, held.Value));
        Assert.Equal(1, (await db.PatientSummaries.OrderBy(row => row.PatientId).FirstAsync(TestContext.Current.CancellationToken)).HeldReadings);
    }

    [Theory, BothDatabases]
    public async Task A_weight_called_in_is_screened_by_what_a_file_brought(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        using var file = ImportBench.Write("number;date;weight kg\n" + string.Join('\n',
            Enumerable.Range(1, 25).Select(day => $"T-1;2026-03-{day:00} 07:00;72.{day % 4}")));
        await ImportBench.ReadInAsync(clinic, file.Path);
        await using var db = clinic.OpenDb();
        var patient = await db.Patients.SingleAsync(row => row.ClinicNumber == "T-1", TestContext.Current.CancellationToken);

        Assert.Null((await CallInAsync(clinic, patient.Id, 72.4m, 26)).Held);
        Assert.Equal(HoldReason.PoundsTakenAsKilograms, (await CallInAsync(clinic, patient.Id, 159.2m, 27)).Held);
        Assert.NotNull((await CallInAsync(clinic, patient.Id, 82.3m, 28)).Held);
    }

    [Theory, BothDatabases]
    public async Task A_struck_out_reading_stays_struck_out_when_the_file_comes_again(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        using var file = ImportBench.Write("number;date;weight kg\nT-1;2026-03-30 07:00;72.0\n");
        await ImportBench.ReadInAsync(clinic, file.Path);
        await using (var db = clinic.OpenDb())
        {
            var id = (await db.Readings.SingleAsync(TestContext.Current.CancellationToken)).Id;
            await clinic.Get<DecideReading>().StrikeOutAsync(TestClinic.As(ClinicRole.Nurse), id, "Somebody else stood on the scale.", TestContext.Current.CancellationToken);
        }

        var again = await ImportBench.ReadInAsync(clinic, file.Path);
        Assert.Equal(1, again.Duplicates);
        await using var after = clinic.OpenDb();
        Assert.Equal(ReadingState.StruckOut, (await after.Readings.SingleAsync(TestContext.Current.CancellationToken)).State);
    }

    [Theory, BothDatabases]
    public async Task The_report_as_CSV_runs_nothing_in_a_spreadsheet(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        using var file = ImportBench.Write("number,date,weight kg\n=HYPERLINK(\"x\"),2026-03-30 07:00,72\n@SUM(1),2026-03-30 07:00,72\n");
        var run = await ImportBench.ReadInAsync(clinic, file.Path);
        using var csv = new MemoryStream();
        await clinic.Get<ImportReports>().WriteCsvAsync(run.Id, csv, TestContext.Current.CancellationToken);
        var text = Encoding.UTF8.GetString(csv.ToArray());
        Assert.StartsWith("\uFEFFline,outcome,reason,mend,text\r\n2,refused,unknown clinic number,", text);
        Assert.Contains("'=HYPERLINK", text);
        Assert.Contains("'@SUM", text);
    }

    [Theory, BothDatabases]
    public async Task Who_may_not_read_files_in_is_refused_before_anything_is_stored(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        using var file = ImportBench.Write("number;date;weight kg\nT-1;2026-03-30 07:00;72.0\n");
        var look = await ImportBench.LookAsync(file.Path);
        await Assert.ThrowsAsync<NotAllowedException>(() => clinic.Get<ImportFile>().RunAsync(
            TestClinic.As(ClinicRole.Prescriber), look, FileMapping.Guess(look), cancellation: TestContext.Current.CancellationToken));
        Assert.Empty(await clinic.Get<ImportReports>().RunsAsync(10, TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task A_reading_in_whose_server_stopped_is_settled_later(DatabaseEngine engine)
    {
        await using var clinic = await StartAsync(engine);
        await using (var db = clinic.OpenDb())
        {
            var patient = await db.Patients.SingleAsync(row => row.ClinicNumber == "T-1", TestContext.Current.CancellationToken);
            var run = new ImportRun { FileName = "x.csv", ByName = "Test", Kind = ImportKind.HomeReadings, HeartbeatAt = clinic.Clock.GetUtcNow().UtcDateTime };
            db.Add(run);
            await db.SaveChangesAsync(TestContext.Current.CancellationToken);
            db.Add(new Reading
            {
                PatientId = patient.Id,
                Kind = ReadingKind.Weight,
                Value = 72_000,
                Day = new(2026, 3, 31),
                MeasuredAt = new(2026, 3, 31, 6, 0, 0, DateTimeKind.Utc),
                Source = ReadingSource.HomeFile,
                ImportId = run.Id,
                RecordedAt = run.HeartbeatAt,
            });
            await db.SaveChangesAsync(TestContext.Current.CancellationToken);
        }

        var aftermath = clinic.Get<ImportAftermath>();
        Assert.Equal(0, await aftermath.SettleInterruptedAsync(TestContext.Current.CancellationToken));
        clinic.Clock.Advance(TimeSpan.FromMinutes(3));
        Assert.Equal(1, await aftermath.SettleInterruptedAsync(TestContext.Current.CancellationToken));
        Assert.Equal(0, await aftermath.SettleInterruptedAsync(TestContext.Current.CancellationToken));

        await using var after = clinic.OpenDb();
        Assert.Equal(72_000, (await after.PatientSummaries.OrderBy(row => row.PatientId).FirstAsync(TestContext.Current.CancellationToken)).LastGrams);
        Assert.Equal(ImportState.Interrupted, (await after.ImportRuns.SingleAsync(TestContext.Current.CancellationToken)).State);
    }

    private static Task<RecordedReadings> CallInAsync(TestClinic clinic, long patientId, decimal kilograms, int day) =>
        clinic.Get<RecordReadings>().RunAsync(TestClinic.As(ClinicRole.Nurse), patientId, new TakenReadings
        {
            LocalTime = new DateTime(2026, 3, day, 7, 0, 0),
            Weight = Weight.FromKilograms(kilograms),
        }, TestContext.Current.CancellationToken);

    /// <summary>T-1 is enrolled, T-2 left on 01 Mar 2026.</summary>
    private static async Task<TestClinic> StartAsync(DatabaseEngine engine)
    {
        var clinic = await TestClinic.StartAsync(engine);
        var nurse = TestClinic.As(ClinicRole.Nurse);
        var details = new PatientDetails { ClinicNumber = "T-1", FamilyName = "Test", GivenName = "One", EnrolledOn = new(2026, 1, 1), WeighsAtHome = true };
        await clinic.Get<EnrolPatient>().RunAsync(nurse, details, TestContext.Current.CancellationToken);
        var left = await clinic.Get<EnrolPatient>().RunAsync(nurse, details with { ClinicNumber = "T-2" }, TestContext.Current.CancellationToken);
        await clinic.Get<LeaveClinic>().RunAsync(nurse, left, new DateOnly(2026, 3, 1), "Moved away.", TestContext.Current.CancellationToken);
        return clinic;
    }
}
