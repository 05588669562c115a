using System.Security.Claims;
using Bunit;
using Bunit.TestDoubles;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Storage;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Pages;

/// <summary>Renders pages over a real clinic on SQLite, signed in as one role.</summary>
public sealed class ClinicPages : BunitContext
{
    private ClinicPages(TestClinic clinic) => Clinic = clinic;

    /// <summary>The same clinic without a browser, for preparing and looking.</summary>
    public TestClinic Clinic { get; }

    public NavigationManager Navigation => Services.GetRequiredService<NavigationManager>();

    public static async Task<ClinicPages> StartAsync(ClinicRole role)
    {
        var pages = new ClinicPages(await TestClinic.StartAsync(DatabaseEngine.Sqlite));
        DefaultWaitTimeout = TimeSpan.FromSeconds(20);
        pages.JSInterop.Mode = JSRuntimeMode.Loose;
        pages.Services.AddClinic(pages.Clinic.ConnectionString, pages.Clinic.Clock);
        var signedIn = pages.AddAuthorization();
        signedIn.SetAuthorized($"Test {role}");
        signedIn.SetRoles(ClinicRoles.NameOf(role));
        signedIn.SetPolicies([.. Enum.GetNames<Capability>()]);
        signedIn.SetClaims(new Claim(ClaimTypes.NameIdentifier, Guid.Empty.ToString()), new Claim("hfclinic:name", $"Test {role}"));
        await pages.Services.GetRequiredService<ClinicStorage>().PrepareAsync(TestContext.Current.CancellationToken);
        return pages;
    }

    /// <summary>A page whose first read has not begun: nobody knows yet who is signed in.</summary>
    public IRenderedComponent<TPage> RenderWaiting<TPage>(Action<ComponentParameterCollectionBuilder<TPage>>? parameters = null)
        where TPage : IComponent =>
        Render<TPage>(builder =>
        {
            builder.AddCascadingValue(new TaskCompletionSource<AuthenticationState>().Task);
            parameters?.Invoke(builder);
        });

    /// <summary>Takes a table away, as if the database did not answer, or brings it back.</summary>
    public async Task BreakAsync(string table, bool mend = false)
    {
        await using var db = Clinic.OpenDb();
        var (from, to) = mend ? ($"{table}_away", table) : (table, $"{table}_away");
#pragma warning disable EF1002 // The names are the test's own.
        await db.Database.ExecuteSqlRawAsync($"ALTER TABLE \"{from}\" RENAME TO \"{to}\"", TestContext.Current.CancellationToken);
#pragma warning restore EF1002
    }

    protected override async ValueTask DisposeAsyncCore()
    {
        await base.DisposeAsyncCore();
        await Clinic.DisposeAsync();
    }
}
