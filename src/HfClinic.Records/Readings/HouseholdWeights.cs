using HfClinic.Clinical.Values;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Readings;

/// <summary>The latest weights of the people who share a scale with a patient, from the stored summaries.</summary>
internal static class HouseholdWeights
{
    /// <summary>By patient, the latest weight of each other member of the household.</summary>
    public static async Task<ILookup<long, Weight>> OfAsync(ClinicDb db, IReadOnlyCollection<long> patientIds, CancellationToken cancellation) =>
        (await (from patient in db.Patients
                where patientIds.Contains(patient.Id) && patient.Household != null
                join other in db.Patients on patient.Household equals other.Household
                where other.Id != patient.Id && other.LeftOn == null
                join summary in db.PatientSummaries on other.Id equals summary.PatientId
                where summary.LastGrams != null
                select new { patient.Id, summary.LastGrams }).ToListAsync(cancellation))
        .ToLookup(found => found.Id, found => new Weight(found.LastGrams!.Value));
}
