using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Web.Patients;
using HfClinic.Web.Tests.Pages;
using Microsoft.EntityFrameworkCore;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Patients;

public class EditPatientPageTests
{
    [Fact]
    public async Task The_second_of_two_editors_sees_both_versions_and_loses_nothing()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var id = await pages.Clinic.EnrolAsync();
        var page = pages.Render<EditPatientPage>(p => p.Add(x => x.Id, id));
        page.WaitForElement("#phone");
        await pages.Clinic.Get<EditPatient>().RunAsync(TestClinic.As(ClinicRole.Coordinator), id, 0,
            ClinicSteps.Someone with { Phone = "555-0111", Household = "mill lane 4" }, TestContext.Current.CancellationToken);

        await page.TypeAsync("phone", "555-0222");
        await page.SendAsync("phone");
        page.Says("Somebody else changed this person’s details".Replace('’', '\''));
        Assert.Equal("555-0222", page.Typed("phone"));
        var rows = page.FindAll(".two-versions tbody tr").Select(row => row.Children.Take(3).Select(cell => cell.TextContent.Trim()).ToArray()).ToList();
        Assert.Equal([["Phone", "555-0222", "555-0111"], ["Household", "–", "mill lane 4"]], rows);

        await page.FindAll(".two-versions button")[1].ClickAsync();
        page.WaitForAssertion(() => Assert.Equal("mill lane 4", page.Typed("household")));
        await page.SendAsync("phone");
        page.WaitForAssertion(() => Assert.EndsWith($"patients/{id}", pages.Navigation.Uri));
        await using var db = pages.Clinic.OpenDb();
        var saved = await db.Patients.SingleAsync(TestContext.Current.CancellationToken);
        Assert.Equal(("555-0222", "mill lane 4", 2), (saved.Phone, saved.Household, saved.Version));
    }

    [Fact]
    public async Task An_unknown_number_gives_a_plain_page()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        pages.Render<EditPatientPage>(p => p.Add(x => x.Id, 4711)).Says("There is no patient with the number 4711");
    }
}
