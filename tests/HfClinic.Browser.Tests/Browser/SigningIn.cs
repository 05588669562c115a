using HfClinic.Records.Access;
using HfClinic.Testing;
using Microsoft.Playwright;
using static Microsoft.Playwright.Assertions;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>Signing in as a person of the ready clinic.</summary>
public static class SigningIn
{
    /// <summary>Signs in by name and password and waits until the circuit shows who is here.</summary>
    public static async Task SignInAsync(this IPage page, ClinicRole role)
    {
        await page.GotoAsync("/sign-in");
        await page.GetByLabel("Sign-in name").FillAsync(role.ToString().ToLowerInvariant());
        await page.GetByLabel("Password").FillAsync(Templates.Password);
        await page.GetByRole(AriaRole.Button, new() { Name = "Sign in" }).ClickAsync();
        await Expect(page.GetByText($"Test {role}").First).ToBeVisibleAsync();
    }
}
