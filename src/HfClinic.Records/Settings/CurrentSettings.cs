using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Settings;

/// <summary>The settings in force, read once and again after each change. Null until the clinic is set up.</summary>
public sealed class CurrentSettings
{
    private volatile ClinicSettings? settings;

    /// <summary>The settings, or null before the first-run page was filled in.</summary>
    public ClinicSettings? OrNull => settings;

    /// <summary>The settings.</summary>
    /// <exception cref="InvalidOperationException">The clinic is not set up yet.</exception>
    public ClinicSettings Value => settings ?? throw new InvalidOperationException("The clinic is not set up yet: open the first-run page.");

    /// <summary>Reads them from the database.</summary>
    public async Task RefreshAsync(ClinicDb db, CancellationToken cancellation) =>
        settings = await db.Settings.AsNoTracking().SingleOrDefaultAsync(cancellation);
}
