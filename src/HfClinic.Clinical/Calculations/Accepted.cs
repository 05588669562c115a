using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>
/// The inputs used by more than one formula, each with the range in which it is believed. The ranges are choices of this
/// program, to be signed off by the clinic: they refuse what a living adult in a clinic cannot have.
/// </summary>
internal static class Accepted
{
    public static readonly Quantity<int> AdultAge = Quantity.Whole("age", "years", 18, 110);
    public static readonly Quantity<Weight> Weight = new("weight", "kg", 30, 250, weight => (double)weight.Kilograms);
    public static readonly Quantity<Length> Height = Quantity.Centimetres("height", 120, 220);
    public static readonly Quantity<double> BodySurfaceArea = Quantity.Of("body surface area", "m²", 0.9, 4);
    public static readonly Quantity<double> BodyMassIndex = Quantity.Of("BMI", "kg/m²", 10, 100);
    public static readonly Quantity<double> Systolic = Quantity.Of("systolic pressure", "mmHg", 50, 260);
    public static readonly Quantity<double> HeartRate = Quantity.Of("heart rate", "beats/min", 25, 220);
    public static readonly Quantity<decimal> EjectionFraction = Quantity.Exact("EF", "%", 5, 90);
    public static readonly Quantity<double> CreatinineClearance = Quantity.Of("creatinine clearance", "mL/min", 0, 250);

    /// <summary>The weight taken for doses and clearance: measured, ideal or adjusted, in kilograms.</summary>
    public static readonly Quantity<double> DosingWeight = Quantity.Of("weight used", "kg", 25, 250);

    public static readonly Quantity<Creatinine> Creatinine =
        new("creatinine", "mg/dL", 0.2, 20, creatinine => (double)creatinine.MgPerDl, creatinine => creatinine.ToString());
}
