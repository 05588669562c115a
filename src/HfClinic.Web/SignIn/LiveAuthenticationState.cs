using System.Security.Claims;
using HfClinic.Records.Access;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Components.Server;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;

namespace HfClinic.Web.SignIn;

/// <summary>Checks every minute that the person of an open page may still be there: a changed role or password ends the page's rights.</summary>
public sealed class LiveAuthenticationState(
    ILoggerFactory loggers, IServiceScopeFactory scopes, IOptions<IdentityOptions> options)
    : RevalidatingServerAuthenticationStateProvider(loggers)
{
    private readonly ILogger log = loggers.CreateLogger<LiveAuthenticationState>();

    protected override TimeSpan RevalidationInterval => TimeSpan.FromMinutes(1);

    protected override async Task<bool> ValidateAuthenticationStateAsync(AuthenticationState authenticationState, CancellationToken cancellationToken)
    {
        AsyncServiceScope scope;
        try
        {
            scope = scopes.CreateAsyncScope();
        }
        catch (ObjectDisposedException)
        {
            return false; // The program is stopping, and the page with it.
        }

        await using var held = scope;
        try
        {
            return await StillBelongsAsync(scope.ServiceProvider.GetRequiredService<UserManager<ClinicUser>>(), authenticationState.User);
        }
        catch (Exception away) when (DatabaseAway.Is(away))
        {
            log.LogWarning(away, "Whether a person may still be there could not be looked up; this is tried again in a minute.");
            return true; // While the record is away nothing can be read or changed, and a page closed now would lose what was typed.
        }
    }

    private async Task<bool> StillBelongsAsync(UserManager<ClinicUser> users, ClaimsPrincipal person)
    {
        var user = await users.GetUserAsync(person);
        return user is { IsActive: true }
            && person.FindFirstValue(options.Value.ClaimsIdentity.SecurityStampClaimType) == await users.GetSecurityStampAsync(user);
    }
}
