using System.Security.Claims;
using Bunit;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using HfClinic.Web.DailyWeights;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Web.Tests.DailyWeights;

/// <summary>A Daily weights page on a clinic of its own (SQLite), with somebody of a role signed in.</summary>
public abstract class PageTest : BunitContext, IAsyncLifetime
{
    protected TestClinic Clinic { get; private set; } = null!;

    protected static CancellationToken Token => Xunit.TestContext.Current.CancellationToken;

    protected static DateOnly Today => PatientsAtHome.Today;

    public async ValueTask InitializeAsync()
    {
        Clinic = await TestClinic.StartAsync(DatabaseEngine.Sqlite, configure: AwayDatabase.Install);
        Services.AddFallbackServiceProvider(Clinic.Services);
        Services.AddScoped<Keys>();
        JSInterop.Mode = JSRuntimeMode.Loose;
        DefaultWaitTimeout = TimeSpan.FromSeconds(20);
    }

    public new async ValueTask DisposeAsync()
    {
        await DisposeComponentsAsync();
        await base.DisposeAsync();
        await Clinic.DisposeAsync();
        GC.SuppressFinalize(this);
    }

    private protected AwayDatabase Database => Clinic.Get<AwayDatabase>();

    /// <summary>Opens the page at the address, as somebody of the role, and waits until it has its list.</summary>
    protected IRenderedComponent<DailyWeightsPage> OpenPage(string address = "daily-weights", ClinicRole role = ClinicRole.Nurse)
    {
        AddAuthorization().SetAuthorized(role.ToString()).SetRoles(role.ToString())
            .SetClaims(new Claim(ClaimTypes.NameIdentifier, Guid.Empty.ToString()), new Claim("hfclinic:name", $"Test {role}"));
        Services.GetRequiredService<NavigationManager>().NavigateTo(address);
        var page = Render<DailyWeightsPage>();
        page.WaitForAssertion(() => Assert.DoesNotContain("Loading", page.Markup, StringComparison.Ordinal));
        return page;
    }

    /// <summary>Opens the panel of a row.</summary>
    protected static void OpenRow(IRenderedComponent<DailyWeightsPage> page, long patient)
    {
        page.Find($"tr[data-key-row='{patient}']").Click();
        page.WaitForElement(".panel h2");
    }
}
