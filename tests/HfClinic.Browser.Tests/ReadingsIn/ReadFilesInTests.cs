using HfClinic.Browser.Tests.Browser;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Extensions.Time.Testing;
using Microsoft.Playwright;
using static Microsoft.Playwright.Assertions;

namespace HfClinic.Browser.Tests.ReadingsIn;

/// <summary>The roster and the home-scale file, read in by a nurse as she would; the counts were computed apart from this program.</summary>
public class ReadFilesInTests(BrowserFixture browser)
{
    private static readonly DateTimeOffset EndOfIntake = new(2026, 3, 31, 22, 30, 0, TimeSpan.Zero);

    [Theory, BothDatabases]
    public async Task Two_files_are_read_in_and_reported_line_by_line(DatabaseEngine engine)
    {
        await using var app = await ClinicApp.StartAsync(engine, Templates.Ready, new FakeTimeProvider(EndOfIntake));
        await using var window = await browser.OpenAsync(app);
        var page = window.Page;
        await page.SignInAsync(ClinicRole.Nurse);
        await page.GotoAsync("/readings-in");
        await ReadInAsync(page, "patients.csv");
        await Expect(page.GetByText("Of 96 lines, 96 went in")).ToBeVisibleAsync(new() { Timeout = 240_000 });

        await page.GetByRole(AriaRole.Link, new() { Name = "Readings in" }).First.ClickAsync();
        await ReadInAsync(page, "home-readings.csv");
        await Expect(page.GetByText("Of 5,123 lines, 5,094 went in")).ToBeVisibleAsync(new() { Timeout = 240_000 });
        await page.ShouldHaveNoSeriousBarriersAsync();
        await page.GetByRole(AriaRole.Link, new() { Name = "5 held" }).ClickAsync();
        await Expect(page.Locator(".report-lines tbody tr")).ToHaveCountAsync(5);
        await Expect(page.GetByText("Looks like pounds entered as kilograms.").First).ToBeVisibleAsync();

        var download = await page.RunAndWaitForDownloadAsync(() => page.GetByRole(AriaRole.Link, new() { Name = "Report as CSV" }).ClickAsync());
        Assert.Contains("unknown clinic number", await File.ReadAllTextAsync(await download.PathAsync(), TestContext.Current.CancellationToken));
        Assert.Empty(window.Faults);
    }

    private static async Task ReadInAsync(IPage page, string file)
    {
        await Expect(page.Locator("#file")).ToBeEnabledAsync(new() { Timeout = 60_000 });
        await page.Locator("#file").SetInputFilesAsync(Path.Combine(AppContext.BaseDirectory, "Files", "intake", file));
        var go = page.GetByRole(AriaRole.Button, new() { Name = "Read in" });
        await Expect(go).ToBeVisibleAsync(new() { Timeout = 60_000 });
        await page.ShouldHaveNoSeriousBarriersAsync();
        await go.ClickAsync();
    }
}
