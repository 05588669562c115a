using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Web.RecordOfAccess;
using HfClinic.Web.Tests.Pages;
using HfClinic.Web.Ui;
using Microsoft.EntityFrameworkCore;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.RecordOfAccess;

public class RecordOfAccessPageTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Shows_who_changed_what_with_before_and_after_and_narrows_by_patient_and_person()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        var id = await pages.Clinic.EnrolAsync();
        await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-200", FamilyName = "Lorwick" });
        await pages.Clinic.Get<EditPatient>().RunAsync(TestClinic.As(ClinicRole.Coordinator), id, 0, ClinicSteps.Someone with { Phone = "555-0111" }, Cancellation);
        var page = pages.Render<RecordOfAccessPage>();
        page.Says("Phone: 555-0184 → 555-0111");
        page.Says("Lorwick, Oda");
        await page.TypeAsync("audit-patient", "elsmere");
        await page.TypeAsync("audit-person", "coordinator");
        await page.SendAsync("audit-patient");
        page.WaitForElements("tbody tr", 1);
        Assert.Contains("patient=elsmere", pages.Navigation.Uri);
        page.Says("1 line, the newest first");
    }

    [Fact]
    public async Task Narrows_by_days_and_asks_about_one_it_cannot_read()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        await pages.Clinic.EnrolAsync();
        pages.Navigation.NavigateTo("record-of-access?from=01%20Apr%202026");
        var page = pages.Render<RecordOfAccessPage>();
        page.Says("No line matches.");
        await page.TypeAsync("audit-from", "04/01/26");
        await page.SendAsync("audit-from");
        page.WaitForAssertion(() => Assert.Contains("04/01/26", page.Problem("audit-from")));
        Assert.Equal("04/01/26", page.Typed("audit-from"));
    }

    [Fact]
    public async Task Checks_the_chain_and_names_a_line_that_was_changed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        await pages.Clinic.EnrolAsync();
        var page = pages.Render<RecordOfAccessPage>();
        await page.Button("Check that no line was changed").ClickAsync();
        page.Says("lines are as they were written, and none is missing.");
        await using var db = pages.Clinic.OpenDb();
        await db.Database.ExecuteSqlRawAsync("DROP TRIGGER \"AuditEntries_no_update\"", Cancellation);
        await db.Database.ExecuteSqlRawAsync("UPDATE \"AuditEntries\" SET \"ByName\" = 'x' WHERE \"Id\" = 2", Cancellation);
        await page.Button("Check that no line was changed").ClickAsync();
        page.Says("The record does not hold: Line 2 ");
    }

    [Fact]
    public async Task Says_when_the_database_does_not_answer()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        await pages.BreakAsync("AuditEntries");
        var page = pages.Render<RecordOfAccessPage>();
        page.Says(DatabaseAway.WhileReading);
        await pages.BreakAsync("AuditEntries", mend: true);
        await page.Button("Try again").ClickAsync();
        page.WaitForElement("tbody tr");
    }
}
