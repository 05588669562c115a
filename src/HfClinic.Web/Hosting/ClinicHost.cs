using System.Threading.RateLimiting;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Reassessment;
using HfClinic.Records.Storage;
using HfClinic.Web.Endpoints;
using HfClinic.Web.ReadingsIn;
using HfClinic.Web.Shell;
using HfClinic.Web.SignIn;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Identity;
using MudBlazor.Services;

namespace HfClinic.Web.Hosting;

/// <summary>Puts the web program together.</summary>
public static class ClinicHost
{
    private const int SignInTriesPerMinute = 20;

    /// <summary>Services.</summary>
    public static void AddClinic(this WebApplicationBuilder builder, StartOptions start)
    {
        builder.WebHost.UseStaticWebAssets();
        var services = builder.Services;
        services.AddSingleton(start);
        services.AddSingleton<DataFolder>();
        services.AddClinicRecords(provider => StorageOf(provider, start));
        services.AddHostedService<MorningSweepService>();
        services.AddReadingsIn();
        services.AddRazorComponents().AddInteractiveServerComponents();
        services.AddMudServices();
        services.AddScoped<Keys>();
        AddSignIn(services);
        services.AddHealthChecks().AddCheck<DatabaseCheck>("database", tags: [HealthEndpoints.Ready]);
        services.AddRateLimiter(options =>
        {
            options.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
            options.GlobalLimiter = PartitionedRateLimiter.Create<HttpContext, string>(LimitSignIns);
        });
    }

    /// <summary>The request pipeline.</summary>
    public static void UseClinic(this WebApplication app)
    {
        if (!app.Environment.IsDevelopment())
        {
            app.UseExceptionHandler("/fault", createScopeForErrors: true);
        }

        app.UsePlainAnswers();
        app.UsePageSafety();
        app.Use(FirstRunGate.Pass);
        app.UseRateLimiter();
        app.UseAuthentication();
        app.UseAuthorization();
        app.UseAntiforgery();
        app.MapStaticAssets().AllowAnonymous();
        app.MapHealth();
        app.MapSignIn();
        app.MapReadingsIn();
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(server => server.ContentSecurityFrameAncestorsPolicy = null);
    }

    private static StorageChoice StorageOf(IServiceProvider provider, StartOptions start)
    {
        var configured = provider.GetRequiredService<IConfiguration>().GetConnectionString("Clinic");
        if (!string.IsNullOrWhiteSpace(configured))
        {
            return StorageChoice.From(configured);
        }

        var folder = provider.GetRequiredService<DataFolder>();
        return StorageChoice.SqliteFile(start.Command == StartCommand.Demo ? folder.DemoFile : folder.ClinicFile);
    }

    private static void AddSignIn(IServiceCollection services)
    {
        services.AddAuthentication(IdentityConstants.ApplicationScheme).AddIdentityCookies();
        new IdentityBuilder(typeof(ClinicUser), typeof(IdentityRole<Guid>), services).AddSignInManager<ClinicSignIn>();
        services.ConfigureApplicationCookie(cookie =>
        {
            cookie.Cookie.Name = "hfclinic";
            cookie.Cookie.HttpOnly = true;
            cookie.Cookie.SameSite = SameSiteMode.Strict;
            cookie.Cookie.SecurePolicy = CookieSecurePolicy.SameAsRequest;
            cookie.LoginPath = "/sign-in";
            cookie.AccessDeniedPath = "/not-yours";
            cookie.ReturnUrlParameter = "back";
            cookie.ExpireTimeSpan = TimeSpan.FromHours(10);
            cookie.SlidingExpiration = true;
        });
        services.AddAuthorization(options =>
        {
            options.FallbackPolicy = new AuthorizationPolicyBuilder().RequireAuthenticatedUser().Build();
            foreach (var capability in Enum.GetValues<Capability>())
            {
                options.AddPolicy(capability.ToString(), policy => policy.RequireRole(Permissions.RolesWith(capability).Select(ClinicRoles.NameOf)));
            }
        });
        services.AddCascadingAuthenticationState();
        services.AddScoped<AuthenticationStateProvider, LiveAuthenticationState>();
        services.AddSingleton<FirstRunCode>();
        services.AddHttpContextAccessor();
    }

    /// <summary>Only posts to the sign-in pages are limited, by the address they come from.</summary>
    private static RateLimitPartition<string> LimitSignIns(HttpContext context) =>
        HttpMethods.IsPost(context.Request.Method)
            && (context.Request.Path.StartsWithSegments("/sign-in", StringComparison.OrdinalIgnoreCase)
                || context.Request.Path.StartsWithSegments("/first-run", StringComparison.OrdinalIgnoreCase))
            ? RateLimitPartition.GetFixedWindowLimiter(
                context.Connection.RemoteIpAddress?.ToString() ?? "unknown",
                _ => new FixedWindowRateLimiterOptions { PermitLimit = SignInTriesPerMinute, Window = TimeSpan.FromMinutes(1) })
            : RateLimitPartition.GetNoLimiter("");
}
