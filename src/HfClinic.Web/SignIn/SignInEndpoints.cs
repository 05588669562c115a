using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc;

namespace HfClinic.Web.SignIn;

/// <summary>Signing out, and the demo clinic's sign-in by one click.</summary>
public static class SignInEndpoints
{
    public static void MapSignIn(this IEndpointRouteBuilder endpoints)
    {
        endpoints.MapPost("/sign-out", async (SignInManager<ClinicUser> signIn) =>
        {
            await signIn.SignOutAsync();
            return Results.LocalRedirect("~/sign-in");
        });
        endpoints.MapPost("/sign-in/demo", SignInToDemoAsync).AllowAnonymous();
    }

    /// <summary>Works only on a demo database: there is nothing real behind it.</summary>
    private static async Task<IResult> SignInToDemoAsync(
        [FromForm] string person, CurrentSettings settings, SignInManager<ClinicUser> signIn, UserManager<ClinicUser> users)
    {
        if (settings.OrNull is not { IsDemo: true })
        {
            return Results.NotFound();
        }

        var user = await users.FindByNameAsync(person);
        if (user is null || !await signIn.CanSignInAsync(user))
        {
            return Results.LocalRedirect("~/sign-in");
        }

        await signIn.SignInAsync(user, isPersistent: false);
        return Results.LocalRedirect("~/");
    }
}
