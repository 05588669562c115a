using HfClinic.Records;
using HfClinic.Records.Audit;
using HfClinic.Records.Settings;
using HfClinic.Records.Storage;
using HfClinic.SeedDemo;
using HfClinic.Web.SignIn;
using HfClinic.Web.Ui;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Web.Hosting;

/// <summary>What happens before the first request: migrate, seed the demo if asked, refuse what must not be mixed.</summary>
public static class ClinicStart
{
    /// <summary>Prepares the database.</summary>
    /// <exception cref="CannotStartException">The database does not answer, or is not the kind the command asks for.</exception>
    public static async Task PrepareClinicAsync(this WebApplication app, StartOptions start)
    {
        if (start is { Command: StartCommand.Demo, Fresh: true })
        {
            StartOver(app);
        }

        await OpenAsync(app);
        var settings = app.Services.GetRequiredService<CurrentSettings>();
        var isDemo = start.Command == StartCommand.Demo;
        if (isDemo && settings.OrNull is null)
        {
            app.Logger.LogInformation("Making the demo clinic: {Patients} invented patients.", start.DemoPatients);
            await SeedAsync(app, start.DemoPatients);
        }

        if (settings.OrNull is { } known && start.Command != StartCommand.VerifyAudit && known.IsDemo != isDemo)
        {
            throw new CannotStartException(known.IsDemo
                ? "This database holds the invented demo clinic, so it cannot be run as a real one. Start with 'demo', or name another database in ConnectionStrings__Clinic."
                : "This database holds a real clinic's record, so no demo data go into it. Start without 'demo', or name another database in ConnectionStrings__Clinic.");
        }

        if (isDemo && !await IsWholeDemoAsync(app))
        {
            throw new CannotStartException("The demo clinic was not finished when it was made. Start it over with: demo --fresh");
        }

        if (settings.OrNull is null && start.Command == StartCommand.VerifyAudit)
        {
            throw new CannotStartException(
                $"There is no clinic in this database, so there is no record of access to check. Name the database in ConnectionStrings__Clinic, or its folder in {DataFolder.Setting}.");
        }

        if (settings.OrNull is null && start.Command == StartCommand.Serve)
        {
            app.Lifetime.ApplicationStarted.Register(() => Console.WriteLine(
                $"This clinic is not set up yet. Open the address above; the first-run code is {app.Services.GetRequiredService<FirstRunCode>().Value}"));
        }
    }

    /// <summary>Checks the record of access and says what it found.</summary>
    /// <returns>0 when the chain holds, 1 when it does not.</returns>
    public static async Task<int> VerifyAuditAsync(this WebApplication app)
    {
        var verdict = await app.Services.GetRequiredService<AuditVerification>().RunAsync(CancellationToken.None);
        Console.WriteLine(verdict.Fault is null
            ? $"The record of access holds: {verdict.Lines} lines, each linked to the one before."
            : $"The record of access does NOT hold. {verdict.Fault} Lines before it: {verdict.Lines}.");
        return verdict.Fault is null ? 0 : 1;
    }

    private static async Task OpenAsync(WebApplication app)
    {
        try
        {
            await app.Services.GetRequiredService<ClinicStorage>().PrepareAsync(CancellationToken.None);
        }
        catch (Exception fault) when (DatabaseAway.Is(fault) || fault is ArgumentException or IOException or UnauthorizedAccessException)
        {
            var said = fault is ArgumentException ? fault.Message : fault.GetBaseException().Message;
            throw new CannotStartException(
                $"The database cannot be used. Look whether it runs and whether ConnectionStrings__Clinic, or without it the folder {DataFolder.Setting}, is right. What was said: {said}");
        }
    }

    private static async Task SeedAsync(WebApplication app, int patients)
    {
        try
        {
            await DemoClinic.SeedAsync(app.Services, patients, CancellationToken.None);
        }
        catch (RefusedException refusal)
        {
            throw new CannotStartException(refusal.Message);
        }
    }

    /// <summary>The last step of making the demo clinic notes its first day as swept.</summary>
    private static async Task<bool> IsWholeDemoAsync(WebApplication app)
    {
        await using var db = await app.Services.GetRequiredService<IDbContextFactory<ClinicDb>>().CreateDbContextAsync();
        return await db.SweepRuns.AnyAsync();
    }

    private static void StartOver(WebApplication app)
    {
        if (!string.IsNullOrWhiteSpace(app.Configuration.GetConnectionString("Clinic")))
        {
            throw new CannotStartException("--fresh removes the demo's own SQLite file only. Empty the database named in ConnectionStrings__Clinic yourself.");
        }

        app.Services.GetRequiredService<DataFolder>().RemoveDemo();
    }
}
