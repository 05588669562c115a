using Microsoft.Playwright;

[assembly: AssemblyFixture(typeof(HfClinic.Browser.Tests.Browser.BrowserFixture))]

namespace HfClinic.Browser.Tests.Browser;

/// <summary>
/// One Chromium for all tests of this assembly, the one installed on the machine: nothing is downloaded.
/// Set <c>CHROMIUM</c> to use another. A missing Chromium fails the tests.
/// </summary>
public sealed class BrowserFixture : IAsyncLifetime
{
    private const string DebianChromium = "/usr/bin/chromium";

    private IPlaywright? _playwright;
    private IBrowser? _browser;

    public async ValueTask InitializeAsync()
    {
        var chromium = Environment.GetEnvironmentVariable("CHROMIUM") ?? DebianChromium;
        if (!File.Exists(chromium))
        {
            throw new InvalidOperationException(
                $"Chromium is needed for the browser tests and is not at {chromium}. "
                + "On Debian: apt-get install chromium (tests/run does this when run as root); or set CHROMIUM to its path.");
        }

        _playwright = await Playwright.CreateAsync();
        _browser = await _playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = chromium,
            Args =
            [
                "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run",
                "--disable-background-networking", "--disable-component-update", "--disable-sync",
            ],
        });
    }

    /// <summary>Opens a clean browser window on the clinic: no cookies, nothing remembered.</summary>
    /// <param name="app">The clinic to look at.</param>
    /// <param name="size">The window; <see cref="WindowSize.Desk"/> unless given.</param>
    /// <param name="scheme">The colours the person's system prefers.</param>
    public async Task<BrowserWindow> OpenAsync(ClinicApp app, WindowSize? size = null, ColorScheme scheme = ColorScheme.Light)
    {
        var browser = _browser ?? throw new InvalidOperationException("The browser has not started.");
        var context = await browser.NewContextAsync(new BrowserNewContextOptions
        {
            BaseURL = app.Address.ToString(),
            ViewportSize = (size ?? WindowSize.Desk).Viewport,
            ColorScheme = scheme,
            ReducedMotion = ReducedMotion.Reduce,
            Locale = "en-GB",
            TimezoneId = "Europe/London",
        });
        return await BrowserWindow.OpenAsync(context, app.Address);
    }

    public async ValueTask DisposeAsync()
    {
        if (_browser is not null)
        {
            await _browser.DisposeAsync();
        }

        _playwright?.Dispose();
    }
}
