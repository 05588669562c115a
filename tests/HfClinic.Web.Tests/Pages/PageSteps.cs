using AngleSharp.Dom;
using Bunit;
using Microsoft.AspNetCore.Components;

namespace HfClinic.Web.Tests.Pages;

/// <summary>What a person does on a page, by the words they see.</summary>
public static class PageSteps
{
    /// <summary>Waits until the page says it.</summary>
    public static void Says<T>(this IRenderedComponent<T> page, string words)
        where T : IComponent => page.WaitForAssertion(() => Assert.Contains(words, page.Text()));

    /// <summary>The page's text with single blanks.</summary>
    public static string Text<T>(this IRenderedComponent<T> page)
        where T : IComponent => Plain(string.Concat(page.Nodes.Select(node => node.TextContent)));

    /// <summary>A button by the words it begins with; the first one where there are several.</summary>
    public static IElement Button<T>(this IRenderedComponent<T> page, string words)
        where T : IComponent => page.FindAll("button").First(button => Plain(button.TextContent).StartsWith(words, StringComparison.Ordinal));

    public static bool HasButton<T>(this IRenderedComponent<T> page, string words)
        where T : IComponent => page.FindAll("button").Any(button => Plain(button.TextContent).StartsWith(words, StringComparison.Ordinal));

    public static Task TypeAsync<T>(this IRenderedComponent<T> page, string id, string text)
        where T : IComponent => page.Find($"#{id}").ChangeAsync(new ChangeEventArgs { Value = text });

    /// <summary>Sends the form the field stands in.</summary>
    public static Task SendAsync<T>(this IRenderedComponent<T> page, string id)
        where T : IComponent => page.Find($"#{id}").Closest("form")!.SubmitAsync();

    public static string Typed<T>(this IRenderedComponent<T> page, string id)
        where T : IComponent => page.Find($"#{id}").GetAttribute("value") ?? "";

    /// <summary>What stands beside a field as wrong.</summary>
    public static string Problem<T>(this IRenderedComponent<T> page, string id)
        where T : IComponent => Plain(page.Find($"#{id}-problem").TextContent);

    private static string Plain(string text) => string.Join(' ', text.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));
}
