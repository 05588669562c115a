using HfClinic.Clinical.Rules;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Protocol;

/// <summary>The clinic's thresholds in force, and what they are for one patient.</summary>
public sealed class ProtocolInForce(CurrentSettings settings)
{
    private static readonly ClinicProtocol Defaults = ProtocolDefaults.Load();

    /// <summary>The clinic's protocol.</summary>
    public ClinicProtocol Clinic => Defaults with { WeightUnit = settings.OrNull?.WeightUnit ?? Clinical.Values.WeightUnit.Kilograms };

    /// <summary>The clinic's protocol with the prescriber's own thresholds for this patient.</summary>
    public async Task<ClinicProtocol> ForAsync(ClinicDb db, long patientId, CancellationToken cancellation)
    {
        var own = await db.PatientThresholds.AsNoTracking()
            .Where(threshold => threshold.PatientId == patientId && threshold.EndedAt == null)
            .Select(threshold => new ThresholdOverride(threshold.Key, threshold.Value, threshold.IsOn))
            .ToListAsync(cancellation);
        return own.Count == 0 ? Clinic : Clinic.With(own);
    }
}
