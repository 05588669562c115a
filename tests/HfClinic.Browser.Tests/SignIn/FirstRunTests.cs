using HfClinic.Browser.Tests.Browser;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using HfClinic.Web.SignIn;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Playwright;
using static Microsoft.Playwright.Assertions;

namespace HfClinic.Browser.Tests.SignIn;

public class FirstRunTests(BrowserFixture browser)
{
    [Theory, BothDatabases]
    public async Task A_new_clinic_is_set_up_and_its_administrator_signs_in(DatabaseEngine engine)
    {
        await using var app = await ClinicApp.StartAsync(engine);
        await using var window = await browser.OpenAsync(app);
        var page = window.Page;

        await page.GotoAsync("/");
        await Expect(page.GetByRole(AriaRole.Heading, new() { Name = "Set up the clinic" })).ToBeVisibleAsync();
        await page.ShouldHaveNoSeriousBarriersAsync();
        await page.GetByLabel("First-run code").FillAsync("WRONG");
        await page.GetByLabel("Name of the clinic").FillAsync("O’Hara Heart Failure Clinic");
        await page.GetByLabel("Your name").FillAsync("Ada Example");
        await page.GetByLabel("Your sign-in name").FillAsync("ada");
        await page.GetByLabel("Your password").FillAsync("four words in a row");
        await page.GetByRole(AriaRole.Button, new() { Name = "Set up" }).ClickAsync();
        await Expect(page.GetByText("This is not the code.")).ToBeVisibleAsync();
        await Expect(page.GetByLabel("Name of the clinic")).ToHaveValueAsync("O’Hara Heart Failure Clinic");

        await page.GetByLabel("First-run code").FillAsync(app.Services.GetRequiredService<FirstRunCode>().Value);
        await page.GetByLabel("Your password").FillAsync("four words in a row");
        await page.GetByRole(AriaRole.Button, new() { Name = "Set up" }).ClickAsync();
        await Expect(page.GetByRole(AriaRole.Heading, new() { Name = "Sign in" })).ToBeVisibleAsync();

        await page.GetByLabel("Sign-in name").FillAsync("ada");
        await page.GetByLabel("Password").FillAsync("four words in a row");
        await page.GetByRole(AriaRole.Button, new() { Name = "Sign in" }).ClickAsync();
        await Expect(page.GetByText("Ada Example").First).ToBeVisibleAsync();
        Assert.Empty(window.Faults);
    }

    [Fact]
    public async Task A_clinic_that_is_set_up_cannot_be_set_up_again()
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite, Templates.Ready);
        await using var window = await browser.OpenAsync(app);
        await window.Page.GotoAsync("/first-run");
        await Expect(window.Page.GetByText("This clinic is set up.")).ToBeVisibleAsync();
    }
}
