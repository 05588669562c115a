using System.Collections.Immutable;
using System.Security.Claims;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;

namespace HfClinic.Records.Access;

/// <summary>Carries the display name in the sign-in ticket.</summary>
public sealed class ClinicClaims(
    UserManager<ClinicUser> users, RoleManager<IdentityRole<Guid>> roles, IOptions<IdentityOptions> options)
    : UserClaimsPrincipalFactory<ClinicUser, IdentityRole<Guid>>(users, roles, options)
{
    internal const string DisplayName = "hfclinic:name";

    protected override async Task<ClaimsIdentity> GenerateClaimsAsync(ClinicUser user)
    {
        var identity = await base.GenerateClaimsAsync(user);
        identity.AddClaim(new Claim(DisplayName, user.DisplayName));
        return identity;
    }
}

/// <summary>Reads the actor from a signed-in principal.</summary>
public static class ActorClaims
{
    /// <summary>The actor, or null when nobody is signed in.</summary>
    public static Actor? ActorOrNull(this ClaimsPrincipal? principal) =>
        principal?.Identity?.IsAuthenticated == true && Guid.TryParse(principal.FindFirstValue(ClaimTypes.NameIdentifier), out var id)
            ? new Actor(id, principal.FindFirstValue(ClinicClaims.DisplayName) ?? principal.Identity.Name ?? "unnamed", RolesOf(principal))
            : null;

    private static ImmutableHashSet<ClinicRole> RolesOf(ClaimsPrincipal principal) =>
        [.. Enum.GetValues<ClinicRole>().Where(role => principal.IsInRole(ClinicRoles.NameOf(role)))];
}
