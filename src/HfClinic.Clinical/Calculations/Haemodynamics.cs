namespace HfClinic.Clinical.Calculations;

/// <summary>What can be told about the circulation from a cuff and a pulse. Pressures in mmHg, rates in beats per minute.</summary>
public static class Haemodynamics
{
    private static readonly Formula Mean = new(
        "mean arterial pressure", "mmHg", 0, "(systolic + 2 × diastolic) / 3", ["common-definitions"]);

    private static readonly Formula Pulse = new("pulse pressure", "mmHg", 0, "systolic − diastolic", ["common-definitions"]);

    private static readonly Formula Proportional = new(
        "proportional pulse pressure", "", 2, "(systolic − diastolic) / systolic", ["stevenson-perloff-1989"])
    {
        Caution = "Found at rest in severe heart failure with reduced EF (n = 50); not for atrial fibrillation with few beats averaged, aortic regurgitation or stiff arteries of old age.",
    };

    private static readonly Formula Product = new(
        "rate-pressure product", "mmHg × beats/min", 0, "heart rate × systolic", ["rate-pressure-product"]);

    private static readonly Quantity<double> Diastolic = Quantity.Of("diastolic pressure", "mmHg", 20, 160);

    /// <summary>
    /// A proportional pulse pressure below this went with a cardiac index below 2.2 L/min/m² (sensitivity 91 %, specificity
    /// 83 %; Stevenson and Perloff, JAMA 1989;261:884).
    /// </summary>
    public const double LowProportionalPulsePressure = 0.25;

    /// <summary>Mean arterial pressure, mmHg. Systolic 50 to 260, diastolic 20 to 160, systolic above diastolic.</summary>
    public static Computed<double> MeanArterialPressure(Given<double> systolicMmHg, Given<double> diastolicMmHg) =>
        FromCuff(Mean, systolicMmHg, diastolicMmHg, (systolic, diastolic) => (systolic + 2 * diastolic) / 3);

    /// <summary>Pulse pressure, mmHg. Ranges as for <see cref="MeanArterialPressure"/>.</summary>
    public static Computed<double> PulsePressure(Given<double> systolicMmHg, Given<double> diastolicMmHg) =>
        FromCuff(Pulse, systolicMmHg, diastolicMmHg, (systolic, diastolic) => systolic - diastolic);

    /// <summary>Pulse pressure as a share of the systolic one, 0 to 1. Ranges as for <see cref="MeanArterialPressure"/>.</summary>
    public static Computed<double> ProportionalPulsePressure(Given<double> systolicMmHg, Given<double> diastolicMmHg) =>
        FromCuff(Proportional, systolicMmHg, diastolicMmHg, (systolic, diastolic) => (systolic - diastolic) / systolic);

    /// <summary>Rate-pressure product, mmHg × beats/min, an index of the heart's oxygen demand (from memory). Rate 25 to 220.</summary>
    public static Computed<double> RatePressureProduct(Given<double> heartRate, Given<double> systolicMmHg)
    {
        var (rate, systolic) = (Accepted.HeartRate.Take(heartRate), Accepted.Systolic.Take(systolicMmHg));
        return Product.Compute([rate, systolic], () => rate.Number * systolic.Number);
    }

    /// <summary>Strictly below <see cref="LowProportionalPulsePressure"/>.</summary>
    public static bool IsLowProportion(double proportionalPulsePressure) => proportionalPulsePressure < LowProportionalPulsePressure;

    private static Computed<double> FromCuff(
        Formula formula, Given<double> systolicMmHg, Given<double> diastolicMmHg, Func<double, double, double> compute)
    {
        var (systolic, diastolic) = (Accepted.Systolic.Take(systolicMmHg), Diastolic.Take(diastolicMmHg));
        return formula.Compute([systolic, diastolic], () => compute(systolic.Number, diastolic.Number), () =>
            systolic.Number > diastolic.Number ? null : $"systolic pressure {systolic.Shown} is not above diastolic pressure {diastolic.Shown}");
    }
}
