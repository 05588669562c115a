using HfClinic.Records.Access;
using HfClinic.Records.Medicines;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Medicines;

public class MedicineCoursesTests
{
    private static readonly Actor Prescriber = TestClinic.As(ClinicRole.Prescriber);
    private static readonly PrescribedDose Forty = new("Furosemide ", 40, 1);
    private static readonly DateOnly Before = new(2026, 3, 1);
    private static readonly DateOnly Today = new(2026, 3, 31);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task A_new_dose_ends_the_course_before_and_both_stay(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var courses = clinic.Get<MedicineCourses>();
        await courses.SetAsync(Prescriber, id, Forty, Before, null, Cancellation);
        await courses.SetAsync(Prescriber, id, Forty with { TimesDaily = 2 }, Today, "weight up", Cancellation);
        await using var db = clinic.OpenDb();
        var rows = await db.DoseCourses.OrderBy(course => course.Id).ToListAsync(Cancellation);
        Assert.Equal([(Before, Today), (Today, null)], rows.Select(row => (row.From, row.Until)));
        Assert.Equal("furosemide 40 mg twice daily", (await db.PatientSummaries.SingleAsync(Cancellation)).LoopDiuretic);
    }

    [Theory, BothDatabases]
    public async Task A_stopped_medicine_is_taken_no_more(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var courses = clinic.Get<MedicineCourses>();
        await courses.SetAsync(Prescriber, id, Forty, Before, null, Cancellation);
        await courses.StopAsync(Prescriber, id, "furosemide", Today, "dry", Cancellation);
        await using var db = clinic.OpenDb();
        Assert.Equal("", (await db.PatientSummaries.SingleAsync(Cancellation)).LoopDiuretic);
        await Assert.ThrowsAsync<RefusedException>(() => courses.StopAsync(Prescriber, id, "furosemide", Today, "dry", Cancellation));
    }

    [Theory, BothDatabases]
    public async Task Striking_out_a_change_lets_the_course_before_hold_on(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var courses = clinic.Get<MedicineCourses>();
        await courses.SetAsync(Prescriber, id, Forty, Before, null, Cancellation);
        var wrong = await courses.SetAsync(Prescriber, id, Forty with { DoseMilligrams = 400 }, Today, null, Cancellation);
        await courses.StrikeOutAsync(Prescriber, wrong, "a zero too many", Cancellation);
        await using var db = clinic.OpenDb();
        Assert.Equal("furosemide 40 mg daily", (await db.PatientSummaries.SingleAsync(Cancellation)).LoopDiuretic);
        var struck = await db.DoseCourses.SingleAsync(course => course.Id == wrong, Cancellation);
        Assert.Equal(("a zero too many", 400m), (struck.StruckOutBecause, struck.DoseMilligrams));
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => courses.StrikeOutAsync(Prescriber, wrong, "again", Cancellation));
        await Assert.ThrowsAsync<NotFoundException>(() => courses.StrikeOutAsync(Prescriber, 4711, "none", Cancellation));
    }

    [Theory]
    [BothDatabases("0", "1", "2026-03-31", "DoseMilligrams")]
    [BothDatabases("5001", "1", "2026-03-31", "DoseMilligrams")]
    [BothDatabases("40", "0", "2026-03-31", "TimesDaily")]
    [BothDatabases("40", "7", "2026-03-31", "TimesDaily")]
    [BothDatabases("40", "1", "2026-04-01", "From")]
    [BothDatabases("40", "1", "2026-02-28", "From")]
    public async Task Refuses_what_cannot_be(DatabaseEngine engine, string milligrams, string times, string from, string field)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var courses = clinic.Get<MedicineCourses>();
        await courses.SetAsync(Prescriber, id, Forty, Before, null, Cancellation);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => courses.SetAsync(
            Prescriber, id, new("furosemide", decimal.Parse(milligrams, null), decimal.Parse(times, null)), DateOnly.Parse(from, null), null, Cancellation));
        Assert.Equal(field, refusal.Problems.Single().Field);
        await using var db = clinic.OpenDb();
        Assert.Null((await db.DoseCourses.SingleAsync(Cancellation)).Until);
    }
}
