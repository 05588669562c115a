using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// A new baseline set by a person: after discharge, dialysis or drained ascites, or with another scale of known offset.
/// </summary>
/// <param name="Day">The first day it holds; that day's weight is compared with it.</param>
/// <param name="Weight">The weight without excess fluid.</param>
public readonly record struct BaselineReset(DateOnly Day, Weight Weight);
