using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>Checks of a page against the axe accessibility rules (axe-core, WCAG 2.2 AA).</summary>
public static class Accessibility
{
    /// <summary>Fails when axe finds anything serious or critical; the message names the rule, its help page and the elements.</summary>
    public static async Task ShouldHaveNoSeriousBarriersAsync(this IPage page)
    {
        var result = await page.RunAxe();
        var serious = result.Violations.Where(violation => violation.Impact is "serious" or "critical").Select(Describe).ToList();
        Assert.True(serious.Count == 0, $"axe on {page.Url}:\n{string.Join('\n', serious)}");
    }

    private static string Describe(AxeResultItem violation) =>
        $"{violation.Impact} {violation.Id}: {violation.Help} ({violation.HelpUrl})\n"
        + string.Join('\n', violation.Nodes.Select(node => $"    {node.Html}"));
}
