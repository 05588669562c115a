using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Patients;

public class EnrolPatientTests
{
    private static readonly PatientDetails Details = new()
    {
        ClinicNumber = "t-1",
        FamilyName = "O'Brânnach",
        GivenName = "Síle",
        EnrolledOn = new DateOnly(2026, 1, 10),
        WeighsAtHome = true,
    };

    [Theory, BothDatabases]
    public async Task Enrols_a_person_with_a_summary_and_an_audit_line(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.Get<EnrolPatient>().RunAsync(TestClinic.As(ClinicRole.Nurse), Details, TestContext.Current.CancellationToken);

        await using var db = clinic.OpenDb();
        var patient = await db.Patients.SingleAsync(p => p.Id == id, TestContext.Current.CancellationToken);
        Assert.Equal("T-1", patient.ClinicNumber);
        Assert.Contains("sile", patient.SearchText);
        Assert.True((await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken)).OnDailyWeights);
        Assert.Contains(await db.AuditEntries.ToListAsync(TestContext.Current.CancellationToken),
            entry => entry.What == "Patient added" && entry.PatientId == id);
    }

    [Theory, BothDatabases]
    public async Task Refuses_a_number_that_is_taken_and_names_the_holder(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var enrol = clinic.Get<EnrolPatient>();
        await enrol.RunAsync(TestClinic.As(ClinicRole.Nurse), Details, TestContext.Current.CancellationToken);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            enrol.RunAsync(TestClinic.As(ClinicRole.Nurse), Details with { FamilyName = "Other" }, TestContext.Current.CancellationToken));
        Assert.Contains("O'Brânnach", refusal.Problems.Single().What);
    }

    [Theory, BothDatabases]
    public async Task Refuses_an_administrator(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await Assert.ThrowsAsync<NotAllowedException>(() =>
            clinic.Get<EnrolPatient>().RunAsync(TestClinic.As(ClinicRole.Administrator), Details, TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task A_called_in_weight_stands_in_the_summary(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var nurse = TestClinic.As(ClinicRole.Nurse);
        var id = await clinic.Get<EnrolPatient>().RunAsync(nurse, Details, TestContext.Current.CancellationToken);
        await clinic.Get<RecordReadings>().RunAsync(nurse, id, new TakenReadings
        {
            LocalTime = new DateTime(2026, 3, 31, 7, 0, 0),
            Weight = Weight.FromKilograms(81.4m),
            SystolicPressure = 118,
            DiastolicPressure = 72,
        }, TestContext.Current.CancellationToken);
        await using var db = clinic.OpenDb();
        var summary = await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken);
        Assert.Equal(81_400, summary.LastGrams);
        Assert.Equal(new DateOnly(2026, 3, 31), summary.LastWeightDay);
    }
}
