using HfClinic.Browser.Tests.Browser;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Playwright;
using static Microsoft.Playwright.Assertions;

namespace HfClinic.Browser.Tests.SignIn;

public class SignInTests(BrowserFixture browser)
{
    [Theory, BothDatabases]
    public async Task A_person_signs_in_sees_their_pages_and_signs_out(DatabaseEngine engine)
    {
        await using var app = await ClinicApp.StartAsync(engine, Templates.Ready);
        await using var window = await browser.OpenAsync(app);
        var page = window.Page;
        await page.SignInAsync(ClinicRole.Administrator);
        var nav = page.GetByRole(AriaRole.Navigation, new() { Name = "Main" });
        await Expect(nav.GetByText("People")).ToBeVisibleAsync();
        await Expect(nav.GetByText("Daily weights")).ToHaveCountAsync(0);

        await page.GetByRole(AriaRole.Button, new() { Name = "Sign out" }).ClickAsync();
        await Expect(page.GetByRole(AriaRole.Heading, new() { Name = "Sign in" })).ToBeVisibleAsync();
        await page.GotoAsync("/people");
        await Expect(page.GetByRole(AriaRole.Heading, new() { Name = "Sign in" })).ToBeVisibleAsync();
        Assert.Empty(window.Faults);
    }

    [Theory, BothDatabases]
    public async Task A_wrong_password_says_so_and_five_lock_the_name(DatabaseEngine engine)
    {
        await using var app = await ClinicApp.StartAsync(engine, Templates.Ready);
        await using var window = await browser.OpenAsync(app);
        var page = window.Page;
        await page.GotoAsync("/sign-in");
        await page.ShouldHaveNoSeriousBarriersAsync();
        for (var attempt = 1; attempt <= 5; attempt++)
        {
            await page.GetByLabel("Sign-in name").FillAsync("nurse");
            await page.GetByLabel("Password").FillAsync($"wrong password {attempt}");
            await page.GetByRole(AriaRole.Button, new() { Name = "Sign in" }).ClickAsync();
            await Expect(page.GetByText(attempt < 5 ? "do not go together" : "locked for 15 minutes")).ToBeVisibleAsync();
            await Expect(page.GetByLabel("Sign-in name")).ToHaveValueAsync("nurse");
        }

        await page.GetByLabel("Password").FillAsync(Templates.Password);
        await page.GetByRole(AriaRole.Button, new() { Name = "Sign in" }).ClickAsync();
        await Expect(page.GetByText("locked for 15 minutes")).ToBeVisibleAsync();
    }

    [Fact]
    public async Task A_real_clinic_offers_no_sign_in_by_one_click()
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite, Templates.Ready);
        using var client = app.CreateClient();
        var page = await client.GetStringAsync(new Uri("/sign-in", UriKind.Relative), TestContext.Current.CancellationToken);
        Assert.DoesNotContain("sign-in/demo", page);
    }

    [Theory]
    [InlineData("/health/live")]
    [InlineData("/health/ready")]
    public async Task Health_needs_no_sign_in(string address)
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite, Templates.Ready);
        using var client = app.CreateClient();
        Assert.Equal("Healthy", await client.GetStringAsync(new Uri(address, UriKind.Relative), TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Every_answer_carries_the_safety_headers()
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite, Templates.Ready);
        using var client = app.CreateClient();
        using var answer = await client.GetAsync(new Uri("/sign-in", UriKind.Relative), TestContext.Current.CancellationToken);
        Assert.Contains("script-src 'self';", answer.Headers.GetValues("Content-Security-Policy").Single());
        Assert.Equal("nosniff", answer.Headers.GetValues("X-Content-Type-Options").Single());
    }
}
