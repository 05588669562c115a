using Bunit;
using HfClinic.Records.Access;
using HfClinic.Web.People;
using HfClinic.Web.Tests.Pages;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.People;

public class PeoplePageTests
{
    [Fact]
    public async Task Says_that_it_is_loading()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        Assert.Contains("Loading the people", pages.RenderWaiting<PeoplePage>().Text());
    }

    [Fact]
    public async Task Adds_a_person_and_a_refusal_keeps_what_was_typed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        var page = pages.Render<PeoplePage>();
        page.WaitForElements(".person", 4);
        await page.TypeAsync("new-name", "Mo O'Kafor");
        await page.TypeAsync("new-user", "m.okafor");
        await page.TypeAsync("new-password", "short");
        await page.SendAsync("new-name");
        Assert.Contains("No role is chosen", page.Problem("new-roles"));
        await page.FindAll("section fieldset input")[0].ChangeAsync(new ChangeEventArgs { Value = true });
        await page.SendAsync("new-name");
        page.WaitForAssertion(() => Assert.Contains("12", page.Problem("new-password")));
        Assert.Equal(("Mo O'Kafor", "m.okafor"), (page.Typed("new-name"), page.Typed("new-user")));
        await page.TypeAsync("new-password", "correct horse battery");
        await page.SendAsync("new-name");
        page.WaitForElements(".person", 5);
        page.Says("Mo O'Kafor was added.");
        Assert.Equal("", page.Typed("new-password"));
    }

    [Fact]
    public async Task The_last_administrator_cannot_be_switched_off_and_the_page_says_why()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        var page = pages.Render<PeoplePage>();
        page.WaitForElements(".person", 4);
        await page.Button("May sign in no more: Test Administrator").ClickAsync();
        page.Says("This is the last administrator.");
        await page.Button("May sign in no more: Test Nurse").ClickAsync();
        page.Says("may not sign in");
        page.Says("3 people may sign in.");
    }

    [Fact]
    public async Task Roles_are_changed_in_place()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        var page = pages.Render<PeoplePage>();
        page.WaitForElements(".person", 4);
        await page.Button("Change roles of Test Nurse").ClickAsync();
        await page.FindAll(".person fieldset input")[2].ChangeAsync(new ChangeEventArgs { Value = true });
        await page.Find(".person form").SubmitAsync();
        page.Says("Roles changed.");
        await using var db = pages.Clinic.OpenDb();
        var nurse = await db.Users.SingleAsync(user => user.UserName == "nurse", TestContext.Current.CancellationToken);
        Assert.Equal(2, await db.UserRoles.CountAsync(link => link.UserId == nurse.Id, TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Says_when_the_database_does_not_answer()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Administrator);
        await pages.BreakAsync("AspNetUserRoles");
        var page = pages.Render<PeoplePage>();
        page.Says(DatabaseAway.WhileReading);
        await pages.BreakAsync("AspNetUserRoles", mend: true);
        await page.Button("Try again").ClickAsync();
        page.WaitForElements(".person", 4);
    }
}
