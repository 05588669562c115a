using System.Data.Common;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Readings;

public class ReadingBulkTests
{
    private static readonly DateTime Morning = new(2026, 3, 30, 6, 15, 30, 250, DateTimeKind.Utc);

    [Theory, BothDatabases]
    public async Task Keeps_every_column_as_the_model_reads_and_finds_it(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await EnrolAsync(clinic);
        var full = new Reading
        {
            PatientId = patient,
            Kind = ReadingKind.Weight,
            MeasuredAt = Morning,
            Day = new DateOnly(2026, 3, 30),
            Value = 74_616,
            AsTyped = "164,5 lb",
            Source = ReadingSource.HomeFile,
            Device = "scale-é",
            State = ReadingState.StruckOut,
            FirstState = ReadingState.Held,
            HoldReason = HoldReason.PoundsTakenAsKilograms,
            RecordedAt = Morning.AddMinutes(2),
            RecordedById = Guid.NewGuid(),
            SupersedesId = 41,
            ImportId = 42,
        };
        var sparse = new Reading
        {
            PatientId = patient,
            Kind = ReadingKind.HeartRate,
            MeasuredAt = Morning,
            Day = full.Day,
            Value = 71,
            Source = ReadingSource.Phone,
            RecordedAt = Morning,
        };
        Assert.Equal(2, await InsertAsync(clinic, [full, sparse]));

        await using var db = clinic.OpenDb();
        var stored = await db.Readings.OrderBy(reading => reading.Id).ToListAsync(TestContext.Current.CancellationToken);
        var columns = db.Model.FindEntityType(typeof(Reading))!.GetProperties().Where(property => property.Name != nameof(Reading.Id)).ToList();
        Assert.All(columns, column =>
        {
            Assert.Equal(column.PropertyInfo!.GetValue(full), column.PropertyInfo.GetValue(stored[0]));
            Assert.Equal(column.PropertyInfo.GetValue(sparse), column.PropertyInfo.GetValue(stored[1]));
        });
        Assert.All(stored, reading => Assert.True(reading.Id > 0));
        Assert.Equal(1, await db.Readings.CountAsync(
            reading => reading.MeasuredAt == full.MeasuredAt && reading.Day == full.Day && reading.RecordedById == full.RecordedById
                && reading.RecordedAt > Morning && reading.RecordedAt < Morning.AddHours(1),
            TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task Numbers_go_on_for_readings_added_otherwise(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await EnrolAsync(clinic);
        await InsertAsync(clinic, Weights(patient, 5000));
        await using var db = clinic.OpenDb();
        db.Readings.Add(Weights(patient, 5001).Last());
        await db.SaveChangesAsync(TestContext.Current.CancellationToken);
        Assert.Equal(5001, await db.Readings.CountAsync(TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task Nothing_stays_when_the_transaction_is_not_committed(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await EnrolAsync(clinic);
        await InsertAsync(clinic, Weights(patient, 100), commit: false);
        await using var db = clinic.OpenDb();
        Assert.Equal(0, await db.Readings.CountAsync(TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task The_database_refuses_a_row_that_is_there_already(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await EnrolAsync(clinic);
        await InsertAsync(clinic, Weights(patient, 3));
        await Assert.ThrowsAnyAsync<DbException>(() => InsertAsync(clinic, Weights(patient, 1)));
        await using var db = clinic.OpenDb();
        Assert.Equal(3, await db.Readings.CountAsync(TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task Refuses_to_work_without_a_transaction(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var db = clinic.OpenDb();
        await Assert.ThrowsAsync<InvalidOperationException>(() => ReadingBulk.InsertAsync(db, [], TestContext.Current.CancellationToken));
    }

    private static Task<long> EnrolAsync(TestClinic clinic) => clinic.Get<EnrolPatient>().RunAsync(
        TestClinic.As(ClinicRole.Nurse),
        new PatientDetails { ClinicNumber = "T-1", FamilyName = "Test", GivenName = "One", EnrolledOn = new DateOnly(2026, 1, 1) });

    private static IEnumerable<Reading> Weights(long patient, int count) => Enumerable.Range(0, count).Select(i => new Reading
    {
        PatientId = patient,
        Kind = ReadingKind.Weight,
        MeasuredAt = Morning.AddMinutes(-i),
        Day = DateOnly.FromDateTime(Morning.AddMinutes(-i)),
        Value = 70_000 + i,
        Source = ReadingSource.HomeFile,
        RecordedAt = Morning,
    });

    private static async Task<int> InsertAsync(TestClinic clinic, IEnumerable<Reading> readings, bool commit = true)
    {
        await using var db = clinic.OpenDb();
        await using var transaction = await db.Database.BeginTransactionAsync();
        var added = await ReadingBulk.InsertAsync(db, readings, TestContext.Current.CancellationToken);
        if (commit)
        {
            await transaction.CommitAsync(TestContext.Current.CancellationToken);
        }

        return added;
    }
}
