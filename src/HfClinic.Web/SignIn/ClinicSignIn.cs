using HfClinic.Records.Access;
using Microsoft.AspNetCore.Authentication;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;

namespace HfClinic.Web.SignIn;

/// <summary>Lets only people in who still belong to the clinic.</summary>
public sealed class ClinicSignIn(
    UserManager<ClinicUser> users,
    IHttpContextAccessor context,
    IUserClaimsPrincipalFactory<ClinicUser> claims,
    IOptions<IdentityOptions> options,
    ILogger<SignInManager<ClinicUser>> log,
    IAuthenticationSchemeProvider schemes,
    IUserConfirmation<ClinicUser> confirmation)
    : SignInManager<ClinicUser>(users, context, claims, options, log, schemes, confirmation)
{
    public override async Task<bool> CanSignInAsync(ClinicUser user) => user.IsActive && await base.CanSignInAsync(user);
}
