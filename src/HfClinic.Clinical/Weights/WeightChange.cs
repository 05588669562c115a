using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>The weight of a day against the lowest or highest of the days before it.</summary>
/// <param name="Days">How many days before are looked at.</param>
/// <param name="Latest">The reading of the later day.</param>
/// <param name="Reference">The lowest or highest reading of the days before; of several alike the latest.</param>
public sealed record WeightChange(int Days, WeightReading Latest, WeightReading Reference)
{
    /// <summary>Latest less reference: positive for a gain, negative for a loss.</summary>
    public Weight Difference => Latest.Weight - Reference.Weight;
}
