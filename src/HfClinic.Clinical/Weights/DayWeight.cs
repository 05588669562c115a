namespace HfClinic.Clinical.Weights;

/// <summary>The one weight that stands for a clinic day in the day series.</summary>
/// <param name="Day">The clinic day, in the clinic's time zone.</param>
/// <param name="Grams">Mass in whole grams.</param>
public readonly record struct DayWeight(DateOnly Day, int Grams);
