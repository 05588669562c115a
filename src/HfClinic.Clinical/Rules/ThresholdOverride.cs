namespace HfClinic.Clinical.Rules;

/// <summary>A change to one threshold, by the clinic or by a prescriber for one patient.</summary>
/// <param name="Key">The threshold changed.</param>
/// <param name="Value">The new value in the threshold's unit; null leaves it.</param>
/// <param name="IsOn">Switched on or off; null leaves it.</param>
public sealed record ThresholdOverride(string Key, decimal? Value = null, bool? IsOn = null);
