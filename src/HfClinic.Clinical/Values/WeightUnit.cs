namespace HfClinic.Clinical.Values;

/// <summary>The unit in which a clinic reads and types weights. Stored weights are grams.</summary>
public enum WeightUnit
{
    Kilograms = 0,
    Pounds = 1,
}
