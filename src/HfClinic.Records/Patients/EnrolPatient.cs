using HfClinic.Records.Access;
using HfClinic.Records.Flags;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Patients;

/// <summary>Enrols a person in the clinic.</summary>
public sealed class EnrolPatient(ClinicWork work)
{
    /// <summary>Enrols and returns the new patient's identifier.</summary>
    /// <exception cref="RefusedException">Something typed does not hold, or the clinic number is taken.</exception>
    public Task<long> RunAsync(Actor actor, PatientDetails details, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.EnrolPatients, scope => AddAsync(scope, details, cancellation), cancellation);

    /// <summary>The same inside a larger piece of work, such as a roster file.</summary>
    public static async Task<long> AddAsync(WorkScope scope, PatientDetails details, CancellationToken cancellation)
    {
        var problems = details.Problems(scope.Today).ToList();
        await ClinicNumbers.CheckFreeAsync(scope.Db, problems, details.ClinicNumber, null, cancellation);
        if (problems.Count > 0)
        {
            throw new RefusedException(problems);
        }

        var patient = new Patient { ClinicNumber = "", FamilyName = "", GivenName = "" };
        details.CopyTo(patient);
        scope.Db.Patients.Add(patient);
        await scope.SaveAsync(cancellation);
        scope.Db.PatientSummaries.Add(new PatientSummary { PatientId = patient.Id, AsOf = scope.Today });
        scope.Reassess(patient.Id);
        return patient.Id;
    }
}

/// <summary>Clinic numbers are unique.</summary>
internal static class ClinicNumbers
{
    public static async Task CheckFreeAsync(ClinicDb db, List<Problem> problems, string clinicNumber, long? exceptPatient, CancellationToken cancellation)
    {
        var number = clinicNumber.Trim().ToUpperInvariant();
        var holder = await db.Patients.AsNoTracking()
            .Where(patient => patient.ClinicNumber == number && patient.Id != exceptPatient)
            .Select(patient => patient.FamilyName + ", " + patient.GivenName)
            .FirstOrDefaultAsync(cancellation);
        if (holder is not null)
        {
            problems.Add(new(nameof(PatientDetails.ClinicNumber), $"{number} belongs to {holder}.", "Give another number, or open that person."));
        }
    }
}
