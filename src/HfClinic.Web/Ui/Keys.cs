using Microsoft.JSInterop;

namespace HfClinic.Web.Ui;

/// <summary>
/// The page's keyboard: rows by arrows or J and K, Enter opens, Escape closes, letters press what carries <c>data-key</c>.
/// The markup's side is described at the head of <c>wwwroot/keys.js</c>.
/// </summary>
/// <remarks>Letters can be switched off by the person, as WCAG 2.2 success criterion 2.1.4 (character key shortcuts) asks.</remarks>
public sealed class Keys(IJSRuntime js) : IAsyncDisposable
{
    private Task<IJSObjectReference>? module;

    /// <summary>Begins to listen; the layout calls it once per circuit.</summary>
    public async Task StartAsync() => await (await ModuleAsync()).InvokeVoidAsync("start");

    /// <summary>Puts the focus on a row, or on the row that took its place when it has left the list.</summary>
    /// <returns>False when there is no row to focus.</returns>
    public async Task<bool> FocusRowAsync(string rowId) => await (await ModuleAsync()).InvokeAsync<bool>("focusRow", rowId);

    /// <summary>Puts the focus on the row after the given one: where work goes on when a row has been dealt with.</summary>
    /// <returns>False when there is no row to focus.</returns>
    public async Task<bool> FocusRowAfterAsync(string rowId) => await (await ModuleAsync()).InvokeAsync<bool>("focusRowAfter", rowId);

    public async Task<bool> LettersOnAsync() => await (await ModuleAsync()).InvokeAsync<bool>("lettersOn");

    public async Task SetLettersAsync(bool on) => await (await ModuleAsync()).InvokeVoidAsync("setLetters", on);

    public async ValueTask DisposeAsync()
    {
        if (module is null)
        {
            return;
        }

        try
        {
            await (await module).DisposeAsync();
        }
        catch (JSDisconnectedException)
        {
            // The browser has gone and took the module with it.
        }
    }

    private Task<IJSObjectReference> ModuleAsync() => module ??= js.InvokeAsync<IJSObjectReference>("import", "./keys.js").AsTask();
}
