using HfClinic.Clinical.Values;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Patients;

/// <summary>Which patients the list shows.</summary>
public enum PatientsView
{
    Enrolled = 0,
    Left = 1,
    All = 2,
}

/// <summary>One row of the list of patients.</summary>
public sealed record PatientRow(
    long Id, string ClinicNumber, string FamilyName, string GivenName, DateOnly? BirthDate, Sex Sex, string? Phone,
    DateOnly EnrolledOn, DateOnly? LeftOn, bool WeighsAtHome)
{
    public string FullName => $"{FamilyName}, {GivenName}";
}

/// <summary>Finds patients by name or clinic number.</summary>
public sealed class PatientSearch(IDbContextFactory<ClinicDb> databases)
{
    /// <summary>A page of patients by name.</summary>
    public async Task<IReadOnlyList<PatientRow>> RowsAsync(
        string search, PatientsView view, int skip, int take, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Filtered(db, search, view)
            .OrderBy(patient => patient.SearchText).ThenBy(patient => patient.Id).Skip(skip).Take(take)
            .Select(patient => new PatientRow(
                patient.Id, patient.ClinicNumber, patient.FamilyName, patient.GivenName, patient.BirthDate, patient.Sex, patient.Phone,
                patient.EnrolledOn, patient.LeftOn, patient.WeighsAtHome))
            .ToListAsync(cancellation);
    }

    /// <summary>How many there are in all.</summary>
    public async Task<int> CountAsync(string search, PatientsView view, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Filtered(db, search, view).CountAsync(cancellation);
    }

    /// <summary>The details as they stand, with the version to save against; null for an unknown number.</summary>
    public async Task<PatientVersion?> VersionOrNullAsync(long patientId, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var patient = await db.Patients.AsNoTracking().SingleOrDefaultAsync(p => p.Id == patientId, cancellation);
        return patient is null ? null : new PatientVersion(patient.Version, PatientDetails.Of(patient));
    }

    private static IQueryable<Patient> Filtered(ClinicDb db, string search, PatientsView view)
    {
        var patients = db.Patients.AsNoTracking();
        patients = view switch
        {
            PatientsView.Enrolled => patients.Where(patient => patient.LeftOn == null),
            PatientsView.Left => patients.Where(patient => patient.LeftOn != null),
            _ => patients,
        };
        foreach (var word in SearchFolding.Fold(search).Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            patients = patients.Where(patient => patient.SearchText.Contains(word));
        }

        return patients;
    }
}
