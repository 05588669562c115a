using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Weights;

/// <summary>
/// The numbers of the daily weight model: body mass that drifts slowly, fluid that comes and goes, and the noise of one weighing.
/// </summary>
/// <remarks>
/// Day by day, M is body mass in kg, D its drift in kg/day and F fluid in kg:
/// M(t) = M(t−1) + D(t−1) + u, D(t) = D(t−1) + u, F(t) = φ F(t−1) + u, reading = M + F + e. All noise is a fraction of the
/// reference weight. The daily form: a day without a reading is a day of prediction, and times within a day do not count.
/// The fractions are choices of this program, to be signed off by the clinic. They give one weighing a scatter near 0.6% of
/// weight and 14-day changes a spread near 1.1 kg, as in patients without worsening (Zhang et al., Eur J Heart Fail
/// 2009;11:420, read in a summary).
/// </remarks>
public sealed record TrendModel
{
    private TrendModel(double kilograms)
    {
        ReferenceKilograms = kilograms;
        ReadingVariance = Square(0.0055 * kilograms);
        MassStep = Square(0.0006 * kilograms);
        DriftStep = Square(0.00001 * kilograms);
        FluidVariance = Square(0.009 * kilograms);
        FluidStep = (1 - (FluidMemory * FluidMemory)) * FluidVariance;
        StartMassVariance = Square(kilograms / 80);
        StartDriftVariance = Square(0.0002 * kilograms);
        Slope = SlopeModel.For(kilograms);
    }

    /// <summary>φ: the share of fluid gain still there a day later.</summary>
    public const double FluidMemory = 0.85;

    /// <summary>W: the weight the fractions are taken of, kg.</summary>
    public double ReferenceKilograms { get; }

    /// <summary>R: of one weighing, kg².</summary>
    public double ReadingVariance { get; }

    /// <summary>Of body mass in a day, kg².</summary>
    public double MassStep { get; }

    /// <summary>Of the drift in a day, (kg/day)².</summary>
    public double DriftStep { get; }

    /// <summary>V: of fluid in the long run, kg².</summary>
    public double FluidVariance { get; }

    /// <summary>Of fluid in a day, kg².</summary>
    public double FluidStep { get; }

    /// <summary>Of body mass before the first reading, kg².</summary>
    public double StartMassVariance { get; }

    /// <summary>Of the drift before the first reading and after a new baseline, (kg/day)².</summary>
    public double StartDriftVariance { get; }

    /// <summary>The second filter, which gives the slope.</summary>
    public SlopeModel Slope { get; init; }

    /// <summary>Whether outliers count less. Off gives the textbook Kalman filter.</summary>
    public bool Robust { get; init; } = true;

    /// <summary>Whether the person's own scatter is learnt; off keeps it at 1.</summary>
    public bool LearnsScale { get; init; } = true;

    /// <summary>Whether the cumulative sums start again after an alarm.</summary>
    public bool CusumRestarts { get; init; } = true;

    /// <summary>The model for a person of the given reference weight: the target weight where one is set.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The weight is outside 25 to 300 kg.</exception>
    public static TrendModel For(Weight reference) => reference.IsInEntryRange
        ? new TrendModel(reference.Grams / 1000.0)
        : throw new ArgumentOutOfRangeException(nameof(reference), reference, "The reference weight of a trend must be 25 to 300 kg.");

    /// <summary>The least distance from expectation that counts as far, kg: 3 kg or 3.5% of the reference weight.</summary>
    public double SmallestGate => Math.Max(3.0, 0.035 * ReferenceKilograms);

    /// <summary>
    /// How far from the expectation a reading may lie before it is set aside, kg: the largest of five standard deviations,
    /// 3 kg and 3.5% of the reference weight.
    /// </summary>
    /// <param name="variance">Variance of the expected reading, kg².</param>
    public double Gate(double variance) => Math.Max(5 * Math.Sqrt(variance), SmallestGate);

    /// <summary>The usual coming and going of fluid as far as readings can tell it, one standard deviation in kg.</summary>
    /// <param name="variance">Variance of the fluid part after the day's reading, kg².</param>
    public double UsualFluid(double variance) => Math.Sqrt(Math.Max(FluidVariance - variance, 0.04 * FluidVariance));

    private static double Square(double value) => value * value;
}
