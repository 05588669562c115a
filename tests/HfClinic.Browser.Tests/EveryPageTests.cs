using HfClinic.Browser.Tests.Browser;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Playwright;
using static Microsoft.Playwright.Assertions;

namespace HfClinic.Browser.Tests;

/// <summary>Every page, on a desk in light and on a phone in dark: nothing serious for axe, and nothing wider than the window.</summary>
public class EveryPageTests(BrowserFixture browser)
{
    private static readonly (ClinicRole Role, string[] Addresses)[] Pages =
    [
        (ClinicRole.Nurse, ["/daily-weights", "/daily-weights?view=nonsense&sort=x", "/patients", "/patients/new", "/patients/1", "/patients/4711", "/no-such-page"]),
        (ClinicRole.Prescriber, ["/questions", "/patients/1", "/flag-behaviour"]),
        (ClinicRole.Coordinator, ["/readings-in", "/people"]),
        (ClinicRole.Administrator, ["/people", "/record-of-access"]),
    ];

    public static TheoryData<int, int, ColorScheme> Windows => new()
    {
        { WindowSize.Desk.Width, WindowSize.Desk.Height, ColorScheme.Light },
        { WindowSize.Phone.Width, WindowSize.Phone.Height, ColorScheme.Dark },
    };

    [Theory, MemberData(nameof(Windows))]
    public async Task Is_open_to_everybody_and_fits_its_window(int width, int height, ColorScheme scheme)
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite, Mornings.ThreeGains, new ShiftedClock(TestClinic.UsualStart));
        foreach (var (role, addresses) in Pages)
        {
            await using var window = await browser.OpenAsync(app, new WindowSize(width, height), scheme);
            await window.Page.SignInAsync(role);
            foreach (var address in addresses)
            {
                await window.Page.GotoAsync(address);
                await Expect(window.Page.Locator("h1").First).ToBeVisibleAsync();
                await Expect(window.Page.Locator(".state[role=status]")).ToHaveCountAsync(0);
                await window.Page.ShouldHaveNoSeriousBarriersAsync();
                var wider = await window.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
                Assert.True(wider <= 0, $"{address} is {wider} px wider than the {width} px window.");
            }
        }
    }
}
