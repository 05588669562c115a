namespace HfClinic.Clinical.Sources;

/// <summary>How well a figure or a source is confirmed.</summary>
public enum Standing
{
    /// <summary>Read in the source's own text.</summary>
    Confirmed,

    /// <summary>Seen quoted in another publication.</summary>
    SecondHand,

    /// <summary>From memory: a clinician must sign it off.</summary>
    Unconfirmed,

    /// <summary>An engineering or clinic default, to be signed off by the clinic.</summary>
    ClinicDefault,
}
