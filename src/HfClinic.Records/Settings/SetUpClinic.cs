using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Settings;

/// <summary>What the first-run page asks for.</summary>
public sealed record NewClinic(string ClinicName, string TimeZone, WeightUnit WeightUnit, bool IsDemo = false);

/// <summary>Sets up an empty database as a clinic's, once, with its first administrator.</summary>
public sealed class SetUpClinic(ClinicWork work, People people, CurrentSettings current, IDbContextFactory<ClinicDb> databases)
{
    /// <summary>Whether the database is still waiting for this.</summary>
    public bool IsNeeded => current.OrNull is null;

    /// <summary>Stores the settings and the first people.</summary>
    /// <exception cref="RefusedException">The clinic is set up already, or something typed does not hold.</exception>
    public async Task RunAsync(NewClinic clinic, IReadOnlyCollection<NewPerson> firstPeople, CancellationToken cancellation = default)
    {
        await work.RunAsync(Actor.Program("first run"), Capability.ChangeSettings, async scope =>
        {
            var name = TextRules.Required(nameof(NewClinic.ClinicName), "The clinic's name", clinic.ClinicName, 100);
            if (!TimeZoneInfo.TryFindSystemTimeZoneById(clinic.TimeZone, out _))
            {
                throw new RefusedException(new Problem(nameof(NewClinic.TimeZone),
                    $"There is no time zone '{clinic.TimeZone}'.", "Give an IANA name such as Europe/Dublin."));
            }

            if (await scope.Db.Settings.AnyAsync(cancellation))
            {
                throw new RefusedException(new Problem("", "This clinic is set up already.", "Sign in instead."));
            }

            scope.Db.Settings.Add(new ClinicSettings
            {
                ClinicName = name,
                TimeZone = clinic.TimeZone,
                WeightUnit = clinic.WeightUnit,
                IsDemo = clinic.IsDemo,
            });
            await scope.SaveAsync(cancellation);
            foreach (var person in firstPeople)
            {
                await people.AddAsync(scope, person);
            }
        }, cancellation);
        await using var db = await databases.CreateDbContextAsync(cancellation);
        await current.RefreshAsync(db, cancellation);
    }
}
