using HfClinic.Records.Access;
using HfClinic.Records.Work;

namespace HfClinic.Records.Patients;

/// <summary>Ends a person's care in this clinic, or takes the person back. The record stays.</summary>
public sealed class LeaveClinic(ClinicWork work)
{
    /// <summary>Discharges the person from the clinic on the given day.</summary>
    /// <exception cref="RefusedException">The day lies before the enrolment or in the future, or no reason is given.</exception>
    /// <exception cref="ChangedMeanwhileException">Somebody else ended the care meanwhile.</exception>
    public Task RunAsync(Actor actor, long patientId, DateOnly day, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.EnrolPatients, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            var patient = await scope.TakePatientAsync(patientId, cancellation);
            if (patient.LeftOn is { } left)
            {
                throw new ChangedMeanwhileException($"This person left the clinic already, on {TextRules.Day(left)}. Nothing of yours was saved.");
            }

            if (day < patient.EnrolledOn || day > scope.Today)
            {
                throw new RefusedException(new Problem("Day",
                    $"The day is not between the enrolment ({TextRules.Day(patient.EnrolledOn)}) and today.", "Give the day care ended."));
            }

            (patient.LeftOn, patient.LeftBecause) = (day, because);
            patient.Version++;
        }, cancellation);

    /// <summary>Takes the person back.</summary>
    /// <exception cref="ChangedMeanwhileException">Somebody else took the person back meanwhile.</exception>
    public Task ReturnAsync(Actor actor, long patientId, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.EnrolPatients, async scope =>
        {
            var patient = await scope.TakePatientAsync(patientId, cancellation);
            if (patient.LeftOn is null)
            {
                throw new ChangedMeanwhileException("This person is in the clinic's care already.");
            }

            (patient.LeftOn, patient.LeftBecause) = (null, null);
            patient.Version++;
        }, cancellation);
}
