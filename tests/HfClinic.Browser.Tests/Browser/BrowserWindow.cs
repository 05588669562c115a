using System.Collections.Concurrent;
using Microsoft.Playwright;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>
/// One browser window. It watches while the test works: script errors, and requests to anywhere but the clinic itself
/// (which are refused), are kept in <see cref="Faults"/>.
/// </summary>
public sealed class BrowserWindow : IAsyncDisposable
{
    private readonly IBrowserContext _context;
    private readonly ConcurrentQueue<string> _faults = new();

    private BrowserWindow(IBrowserContext context, IPage page)
    {
        _context = context;
        Page = page;
    }

    public IPage Page { get; }

    /// <summary>What went wrong unseen so far; a page in order leaves this empty.</summary>
    public IReadOnlyCollection<string> Faults => _faults;

    internal static async Task<BrowserWindow> OpenAsync(IBrowserContext context, Uri address)
    {
        var window = new BrowserWindow(context, await context.NewPageAsync());
        window.Page.PageError += (_, error) => window._faults.Enqueue($"Script error: {error}");
        window.Page.Console += (_, message) =>
        {
            if (message.Type == "error")
            {
                window._faults.Enqueue($"Console error: {message.Text}");
            }
        };
        await context.RouteAsync("**/*", async route =>
        {
            if (new Uri(route.Request.Url) is { Scheme: "http" or "https" } url && url.Authority != address.Authority)
            {
                window._faults.Enqueue($"Request to another host: {url}");
                await route.AbortAsync();
                return;
            }

            await route.ContinueAsync();
        });
        return window;
    }

    public async ValueTask DisposeAsync() => await _context.DisposeAsync();
}
