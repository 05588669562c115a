using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Web.Patients;
using HfClinic.Web.Tests.Pages;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Patients;

public class PatientsPageTests
{
    [Fact]
    public async Task Says_that_it_is_loading()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        Assert.Contains("Loading the list of patients", pages.RenderWaiting<PatientsPage>().Text());
    }

    [Fact]
    public async Task Says_that_nobody_is_enrolled_yet()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        pages.Render<PatientsPage>().Says("Nobody is enrolled yet.");
    }

    [Fact]
    public async Task Shows_names_as_they_are_and_searches_as_one_types()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SM-1", FamilyName = "O'Brânnach", GivenName = "Síle" });
        await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SM-2", FamilyName = "الزهراني", GivenName = "كريم" });
        await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SM-3", FamilyName = new string('y', 80), GivenName = "Ada" });
        var page = pages.Render<PatientsPage>();
        page.WaitForElements("tbody tr", 3);
        page.Says("3 in the clinic’s care");
        Assert.All(page.FindAll("tbody a"), link => Assert.Equal("auto", link.GetAttribute("dir")));

        await page.Find("#patient-search").InputAsync(new ChangeEventArgs { Value = "obrann" });
        page.WaitForElements("tbody tr", 1);
        Assert.EndsWith("patients?q=obrann", pages.Navigation.Uri);
        page.Says("O'Brânnach, Síle");

        await page.Find("#patient-search").InputAsync(new ChangeEventArgs { Value = "nobody at all" });
        page.Says("Nobody matches “nobody at all”.");
    }

    [Fact]
    public async Task The_address_says_which_part_of_the_list_is_shown()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Coordinator);
        var id = await pages.Clinic.EnrolAsync();
        await pages.Clinic.Get<LeaveClinic>().RunAsync(
            TestClinic.As(ClinicRole.Nurse), id, new DateOnly(2026, 3, 30), "moved", TestContext.Current.CancellationToken);
        pages.Navigation.NavigateTo("patients?view=left");
        var page = pages.Render<PatientsPage>();
        page.WaitForElements("tbody tr", 1);
        page.Says("left 30 Mar 2026");
        Assert.Equal("1 left", page.Find(".sentence [aria-current]").TextContent);
    }

    [Fact]
    public async Task A_long_list_comes_in_pages()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        for (var number = 1; number <= 61; number++)
        {
            await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = $"L-{number:000}", FamilyName = $"Name{number:000}" });
        }

        var page = pages.Render<PatientsPage>();
        page.WaitForElements("tbody tr", 60);
        page.Says("1 to 60 of 61");
        pages.Navigation.NavigateTo(page.Find("[rel=next]").GetAttribute("href")!);
        page.WaitForElements("tbody tr", 1);
        page.Says("Name061");
    }

    [Fact]
    public async Task Says_when_the_database_does_not_answer_and_tries_again()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        await pages.Clinic.EnrolAsync();
        await pages.BreakAsync("Patients");
        var page = pages.Render<PatientsPage>();
        page.Says(DatabaseAway.WhileReading);
        await pages.BreakAsync("Patients", mend: true);
        await page.Button("Try again").ClickAsync();
        page.Says("Elsmere, Oda");
    }
}
