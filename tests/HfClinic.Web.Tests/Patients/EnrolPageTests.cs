using Bunit;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Web.Patients;
using HfClinic.Web.Tests.Pages;
using Microsoft.EntityFrameworkCore;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Patients;

public class EnrolPageTests
{
    [Fact]
    public async Task Says_what_is_wrong_beside_each_field_and_keeps_what_was_typed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        await pages.Clinic.EnrolAsync();
        var page = pages.Render<EnrolPage>();
        page.WaitForElement("#family-name");
        await page.TypeAsync("family-name", "Tamsey");
        await page.TypeAsync("clinic-number", "t-100");
        await page.TypeAsync("birth-date", "03/04/1950");
        await page.TypeAsync("height", "tall");
        await page.SendAsync("family-name");
        Assert.Contains("03/04/1950", page.Problem("birth-date"));
        Assert.Contains("tall", page.Problem("height"));
        Assert.Contains("missing", page.Problem("given-name"));
        Assert.Equal(("Tamsey", "03/04/1950", "tall"), (page.Typed("family-name"), page.Typed("birth-date"), page.Typed("height")));

        await page.TypeAsync("given-name", "Bram");
        await page.TypeAsync("birth-date", "3 Apr 1950");
        await page.TypeAsync("height", "178");
        await page.SendAsync("family-name");
        page.WaitForAssertion(() => Assert.Contains("T-100 belongs to Elsmere, Oda", page.Problem("clinic-number")));

        await page.TypeAsync("clinic-number", "T-200");
        await page.SendAsync("family-name");
        await using var db = pages.Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.Equal(2, db.Patients.Count()));
        var saved = await db.Patients.SingleAsync(patient => patient.ClinicNumber == "T-200", TestContext.Current.CancellationToken);
        Assert.Equal((new DateOnly(1950, 4, 3), 178, true), (saved.BirthDate, saved.HeightCentimetres, saved.WeighsAtHome));
        page.WaitForAssertion(() => Assert.EndsWith($"patients/{saved.Id}", pages.Navigation.Uri));
    }

    [Fact]
    public async Task A_database_away_loses_nothing_typed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = pages.Render<EnrolPage>();
        page.WaitForElement("#family-name");
        await page.TypeAsync("family-name", "Tamsey");
        await page.TypeAsync("given-name", "Bram");
        await page.TypeAsync("clinic-number", "T-200");
        await pages.BreakAsync("Patients");
        await page.SendAsync("family-name");
        page.Says("Nothing was saved; what you typed is still here.");
        Assert.Equal("Tamsey", page.Typed("family-name"));
        await pages.BreakAsync("Patients", mend: true);
        await page.SendAsync("family-name");
        page.WaitForAssertion(() => Assert.Contains("/patients/", pages.Navigation.Uri));
    }
}
