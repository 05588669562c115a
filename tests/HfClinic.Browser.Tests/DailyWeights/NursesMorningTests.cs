using HfClinic.Browser.Tests.Browser;
using HfClinic.Clinical.Flags;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Playwright;
using static Microsoft.Playwright.Assertions;

namespace HfClinic.Browser.Tests.DailyWeights;

/// <summary>The nurse clears her list with the keyboard alone, and the record of access shows it.</summary>
public class NursesMorningTests(BrowserFixture browser)
{
    private const int People = 3;

    [Theory, BothDatabases]
    public async Task Three_people_are_phoned_and_settled_without_the_mouse(DatabaseEngine engine)
    {
        await using var app = await ClinicApp.StartAsync(engine, Mornings.ThreeGains, new ShiftedClock(TestClinic.UsualStart));
        await using var window = await browser.OpenAsync(app);
        var page = window.Page;
        await page.SignInAsync(ClinicRole.Nurse);
        await Expect(page.GetByRole(AriaRole.Heading, new() { Name = "Daily weights" })).ToBeVisibleAsync();
        await Expect(page.Locator("[data-key-row]")).ToHaveCountAsync(4);
        await page.ShouldHaveNoSeriousBarriersAsync();

        await page.Keyboard.PressAsync("j");
        for (var person = 1; person <= People; person++)
        {
            await page.Keyboard.PressAsync("Enter");
            await Expect(page.Locator("aside.panel").GetByText("in 3 days").First).ToBeVisibleAsync();
            if (person == 1)
            {
                await page.ShouldHaveNoSeriousBarriersAsync();
            }

            await page.Keyboard.PressAsync("c");
            await Expect(page.GetByLabel("Outcome")).ToBeFocusedAsync();
            await page.Keyboard.PressAsync("Tab");
            await page.Keyboard.TypeAsync("Spoken: extra tablet as the prescriber wrote on the plan, weighs again tomorrow");
            await page.Keyboard.PressAsync("Control+Enter");
            await Expect(page.Locator(".sentence")).ToContainTextAsync($"{People - person} for today");
        }

        await using (var db = app.Services.GetRequiredService<IDbContextFactory<ClinicDb>>().CreateDbContext())
        {
            Assert.Equal(People, await db.Flags.CountAsync(
                flag => flag.RuleId == "volume.gain-3-days" && flag.State == FlagState.Answered, TestContext.Current.CancellationToken));
            Assert.Equal(People, await db.Contacts.CountAsync(TestContext.Current.CancellationToken));
        }

        await using var office = await browser.OpenAsync(app);
        await office.Page.SignInAsync(ClinicRole.Administrator);
        await office.Page.GotoAsync("/record-of-access");
        await Expect(office.Page.GetByText("Flag changed").First).ToBeVisibleAsync();
        await Expect(office.Page.GetByText("Contact added").First).ToBeVisibleAsync();
        await office.Page.ShouldHaveNoSeriousBarriersAsync();
        Assert.Empty(window.Faults);
        Assert.Empty(office.Faults);
    }
}
