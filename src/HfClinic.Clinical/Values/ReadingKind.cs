namespace HfClinic.Clinical.Values;

/// <summary>What a reading measures. The stored unit is fixed by the kind.</summary>
public enum ReadingKind
{
    /// <summary>Body weight, grams.</summary>
    Weight = 1,

    /// <summary>Systolic blood pressure, mmHg.</summary>
    SystolicPressure = 2,

    /// <summary>Diastolic blood pressure, mmHg.</summary>
    DiastolicPressure = 3,

    /// <summary>Heart rate or pulse, beats per minute.</summary>
    HeartRate = 4,

    /// <summary>Oxygen saturation by pulse oximetry, percent.</summary>
    OxygenSaturation = 5,
}
