using System.Security.Claims;
using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Exchange;
using HfClinic.Records.Patients;
using HfClinic.Records.Settings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using HfClinic.Web.Hosting;
using HfClinic.Web.ReadingsIn;
using Microsoft.Extensions.Configuration;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Hosting;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.ReadingsIn;

/// <summary>The pages on a clinic of their own, with a nurse signed in and the reading-in at work behind them.</summary>
internal sealed class ReadingsInBench : IAsyncDisposable
{
    private readonly TestClinic clinic;
    private readonly IHostedService service;

    private ReadingsInBench(TestClinic clinic, BunitContext page, IHostedService service)
    {
        this.clinic = clinic;
        Page = page;
        this.service = service;
    }

    public BunitContext Page { get; }

    public TestClinic Clinic => clinic;

    /// <summary>The files waiting on disk.</summary>
    public string[] FilesOnDisk => Directory.GetFiles(Path.Combine(Page.Services.GetRequiredService<DataFolder>().Path, "files-in"));

    /// <summary>Starts a clinic in which T-1 is enrolled.</summary>
    public static async Task<ReadingsInBench> StartAsync(ImportLimits? limits = null)
    {
        var clinic = await TestClinic.StartAsync(DatabaseEngine.Sqlite);
        await clinic.Get<EnrolPatient>().RunAsync(TestClinic.As(ClinicRole.Nurse), new PatientDetails
        {
            ClinicNumber = "T-1",
            FamilyName = "Test",
            GivenName = "One",
            EnrolledOn = new(2026, 1, 1),
            WeighsAtHome = true,
        }, TestContext.Current.CancellationToken);
        var page = new BunitContext();
        page.JSInterop.Mode = JSRuntimeMode.Loose;
        page.Services.AddSingleton(clinic.Get<ImportReports>()).AddSingleton(clinic.Get<ImportFile>()).AddSingleton(clinic.Get<ImportAftermath>());
        page.Services.AddSingleton(clinic.Get<ClinicClock>()).AddSingleton(clinic.Get<CurrentSettings>()).AddSingleton(TimeProvider.System);
        page.Services.AddSingleton(limits ?? new ImportLimits()).AddSingleton<FilesIn>().AddSingleton<FilesInService>();
        page.Services.AddSingleton(new DataFolder(new ConfigurationBuilder().AddInMemoryCollection([
            new(DataFolder.Setting, Directory.CreateTempSubdirectory("hfclinic-").FullName)]).Build()));
        page.AddAuthorization().SetAuthorized("nurse").SetRoles(nameof(ClinicRole.Nurse))
            .SetPolicies(nameof(Capability.ImportFiles)).SetClaims(new Claim(ClaimTypes.NameIdentifier, Guid.NewGuid().ToString()));
        var service = page.Services.GetRequiredService<FilesInService>();
        await service.StartAsync(TestContext.Current.CancellationToken);
        return new(clinic, page, service);
    }

    public async ValueTask DisposeAsync()
    {
        await service.StopAsync(CancellationToken.None);
        var folder = Page.Services.GetRequiredService<DataFolder>().Path;
        await Page.DisposeAsync();
        await clinic.DisposeAsync();
        Directory.Delete(folder, recursive: true);
    }
}
