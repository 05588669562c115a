using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Medicines;

/// <summary>Which guideline family's doses the clinic goes by.</summary>
public enum DoseProfile
{
    Esc,
    Aha,
}

public static class DoseProfiles
{
    /// <summary>The profile of the clinic's protocol.</summary>
    public static DoseProfile DoseProfile(this ClinicProtocol protocol) =>
        protocol.Profile == "AHA" ? Medicines.DoseProfile.Aha : Medicines.DoseProfile.Esc;

    /// <summary>"ESC" or "AHA".</summary>
    public static string Words(DoseProfile profile) => profile == Medicines.DoseProfile.Aha ? "AHA" : "ESC";
}
