using HfClinic.Records.Access;
using HfClinic.Records.Work;

namespace HfClinic.Records.Patients;

/// <summary>Changes what is on record about a person.</summary>
public sealed class EditPatient(ClinicWork work)
{
    /// <summary>Saves the details, if the patient is still as the editor saw it.</summary>
    /// <param name="versionSeen">The version the form was opened with.</param>
    /// <exception cref="RefusedException">Something typed does not hold.</exception>
    /// <exception cref="ChangedMeanwhileException">Somebody else saved meanwhile; carries their <see cref="PatientDetails"/>.</exception>
    public Task RunAsync(Actor actor, long patientId, int versionSeen, PatientDetails details, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.EnrolPatients, async scope =>
        {
            var patient = await scope.TakePatientAsync(patientId, cancellation);
            if (patient.Version != versionSeen)
            {
                throw new ChangedMeanwhileException(
                    "Somebody else changed this person's details while you were typing. Nothing of yours was saved.",
                    new PatientVersion(patient.Version, PatientDetails.Of(patient)));
            }

            var problems = details.Problems(scope.Today).ToList();
            await ClinicNumbers.CheckFreeAsync(scope.Db, problems, details.ClinicNumber, patientId, cancellation);
            if (problems.Count > 0)
            {
                throw new RefusedException(problems);
            }

            details.CopyTo(patient);
            patient.Version++;
        }, cancellation);
}

/// <summary>A patient's details as they stand, with the version to save against.</summary>
public sealed record PatientVersion(int Version, PatientDetails Details);
