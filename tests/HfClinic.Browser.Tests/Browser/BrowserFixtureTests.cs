using HfClinic.Testing.Databases;
using Xunit.Sdk;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>The watchers must see what they are there to see.</summary>
public class BrowserFixtureTests(BrowserFixture browser)
{
    private const string Sound =
        "<!doctype html><html lang='en'><title>Sound</title><main><h1>Weights</h1><p>70.5 kg</p></main></html>";

    [Fact]
    public async Task Axe_passes_a_sound_page_and_fails_a_nameless_button()
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite);
        await using var window = await browser.OpenAsync(app);

        await window.Page.SetContentAsync(Sound);
        await window.Page.ShouldHaveNoSeriousBarriersAsync();

        await window.Page.SetContentAsync(Sound.Replace("<p>", "<button></button><p>", StringComparison.Ordinal));
        var failure = await Assert.ThrowsAsync<TrueException>(window.Page.ShouldHaveNoSeriousBarriersAsync);
        Assert.Contains("button-name", failure.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_request_to_another_host_and_a_script_error_are_noticed()
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite);
        await using var window = await browser.OpenAsync(app);
        await window.Page.SetContentAsync(Sound);
        Assert.Empty(window.Faults);

        await window.Page.SetContentAsync(Sound.Replace("<p>", "<img alt='' src='https://elsewhere.invalid/x.png'><script>nothing.here()</script><p>", StringComparison.Ordinal));

        Assert.Contains(window.Faults, fault => fault.Contains("elsewhere.invalid", StringComparison.Ordinal));
        Assert.Contains(window.Faults, fault => fault.Contains("nothing is not defined", StringComparison.Ordinal));
    }

    [Fact]
    public async Task The_window_has_the_size_and_colours_asked_for()
    {
        await using var app = await ClinicApp.StartAsync(DatabaseEngine.Sqlite);
        await using var window = await browser.OpenAsync(app, WindowSize.Phone, Microsoft.Playwright.ColorScheme.Dark);

        Assert.Equal(390, await window.Page.EvaluateAsync<int>("innerWidth"));
        Assert.True(await window.Page.EvaluateAsync<bool>("matchMedia('(prefers-color-scheme: dark)').matches"));
        Assert.True(await window.Page.EvaluateAsync<bool>("matchMedia('(prefers-reduced-motion: reduce)').matches"));
    }
}
