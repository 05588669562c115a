using System.Security.Claims;
using HfClinic.Records.Access;
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
        var users = scope.ServiceProvider.GetRequiredService<UserManager<ClinicUser>>();
        var user = await users.GetUserAsync(authenticationState.User);
        return user is { IsActive: true }
            && authenticationState.User.FindFirstValue(options.Value.ClaimsIdentity.SecurityStampClaimType) == await users.GetSecurityStampAsync(user);
    }
}
