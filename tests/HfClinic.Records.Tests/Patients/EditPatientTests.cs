using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Patients;

public class EditPatientTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task Saves_what_was_typed_and_notes_before_and_after(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.Get<EditPatient>().RunAsync(Nurse, id, 0, ClinicSteps.Someone with { GivenName = "Odá", Household = "mill lane 4" }, Cancellation);
        await using var db = clinic.OpenDb();
        var patient = await db.Patients.SingleAsync(Cancellation);
        Assert.Equal(("Odá", "mill lane 4", 1), (patient.GivenName, patient.Household, patient.Version));
        var line = await db.AuditEntries.SingleAsync(entry => entry.What == "Patient changed", Cancellation);
        Assert.Contains("\"GivenName\":\"Oda\"", line.Before);
        Assert.Contains("\"GivenName\":\"Odá\"", line.After);
    }

    [Theory, BothDatabases]
    public async Task The_second_of_two_editors_is_shown_what_the_first_saved_and_nothing_of_theirs_is_kept(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var edit = clinic.Get<EditPatient>();
        await edit.RunAsync(Nurse, id, 0, ClinicSteps.Someone with { Phone = "555-0111" }, Cancellation);
        var conflict = await Assert.ThrowsAsync<ChangedMeanwhileException>(() =>
            edit.RunAsync(Nurse, id, 0, ClinicSteps.Someone with { Phone = "555-0222" }, Cancellation));
        var theirs = Assert.IsType<PatientVersion>(conflict.Theirs);
        Assert.Equal((1, "555-0111"), (theirs.Version, theirs.Details.Phone));
        await using var db = clinic.OpenDb();
        Assert.Equal("555-0111", (await db.Patients.SingleAsync(Cancellation)).Phone);
    }

    [Theory, BothDatabases]
    public async Task Names_every_field_that_does_not_hold_and_saves_nothing(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => clinic.Get<EditPatient>().RunAsync(Nurse, id, 0, ClinicSteps.Someone with
        {
            FamilyName = " ",
            GivenName = new string('a', 81),
            BirthDate = new DateOnly(2026, 4, 1),
            HeightCentimetres = 99,
            EnrolledOn = new DateOnly(2026, 4, 1),
            Phone = "555\0",
        }, Cancellation));
        Assert.Equal(
            ["BirthDate", "EnrolledOn", "FamilyName", "GivenName", "HeightCentimetres", "Phone"],
            refusal.Problems.Select(problem => problem.Field).Order());
        await using var db = clinic.OpenDb();
        Assert.Equal("Elsmere", (await db.Patients.SingleAsync(Cancellation)).FamilyName);
    }

    [Theory, BothDatabases]
    public async Task A_number_may_be_kept_but_not_taken_from_somebody_else(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-200", FamilyName = "Lorwick" });
        var edit = clinic.Get<EditPatient>();
        await edit.RunAsync(Nurse, id, 0, ClinicSteps.Someone with { ClinicNumber = "t-100" }, Cancellation);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            edit.RunAsync(Nurse, id, 1, ClinicSteps.Someone with { ClinicNumber = " t-200 " }, Cancellation));
        Assert.Contains("Lorwick", refusal.Message);
    }

    [Theory, BothDatabases]
    public async Task Home_weighing_switched_off_takes_the_person_from_the_daily_list(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.Get<EditPatient>().RunAsync(Nurse, id, 0, ClinicSteps.Someone with { WeighsAtHome = false }, Cancellation);
        await using var db = clinic.OpenDb();
        Assert.False((await db.PatientSummaries.SingleAsync(Cancellation)).OnDailyWeights);
    }

    [Theory, BothDatabases]
    public async Task An_unknown_number_is_not_found(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await Assert.ThrowsAsync<NotFoundException>(() => clinic.Get<EditPatient>().RunAsync(Nurse, 4711, 0, ClinicSteps.Someone, Cancellation));
    }
}
