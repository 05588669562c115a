namespace HfClinic.Clinical.Weights;

/// <summary>A local linear trend: level and slope of the weight, with their covariance.</summary>
/// <param name="Level">kg.</param>
/// <param name="Slope">kg/day.</param>
public readonly record struct SlopeFilter(double Level, double Slope, double LevelVariance, double LevelSlope, double SlopeVariance)
{
    /// <summary>Standard error of the slope, kg/day.</summary>
    public double SlopeError => Math.Sqrt(SlopeVariance);

    /// <summary>Before the first reading: the level within 1 kg, the slope within 0.1 kg/day.</summary>
    public static SlopeFilter Start(double kilograms) => new(kilograms, 0, 1.0, 0, 0.01);

    /// <summary>One day on, nothing weighed yet.</summary>
    public SlopeFilter NextDay(in SlopeModel model) => new(
        Level + Slope,
        Slope,
        LevelVariance + (2 * LevelSlope) + SlopeVariance + model.LevelStep,
        LevelSlope + SlopeVariance,
        SlopeVariance + model.SlopeStep);

    /// <summary>What a reading of the given kilograms would tell.</summary>
    public Innovation Compare(in SlopeModel model, double kilograms) =>
        Innovation.Of(kilograms - Level, LevelVariance + model.ReadingVariance, model.Robust);

    /// <summary>Takes in a reading (covariance in Joseph's form).</summary>
    public SlopeFilter Take(in SlopeModel model, in Innovation reading)
    {
        double noise = model.ReadingVariance / reading.Weight;
        double inverse = 1 / (LevelVariance + noise);
        double kLevel = LevelVariance * inverse;
        double kSlope = LevelSlope * inverse;
        double restLevel = LevelVariance - (kLevel * LevelVariance);
        double restSlope = LevelSlope - (kSlope * LevelVariance);
        return new SlopeFilter(
            Level + (kLevel * reading.Kilograms),
            Slope + (kSlope * reading.Kilograms),
            LevelVariance - (kLevel * LevelVariance) - (kLevel * restLevel) + (noise * kLevel * kLevel),
            LevelSlope - (kLevel * LevelSlope) - (kSlope * restLevel) + (noise * kLevel * kSlope),
            SlopeVariance - (kSlope * LevelSlope) - (kSlope * restSlope) + (noise * kSlope * kSlope));
    }

    /// <summary>Takes in a weight known to be true although far off: the level moves there, the slope stays.</summary>
    public SlopeFilter TakeStep(in SlopeModel model, double kilograms) =>
        new(kilograms, Slope, model.ReadingVariance, 0, SlopeVariance);
}
