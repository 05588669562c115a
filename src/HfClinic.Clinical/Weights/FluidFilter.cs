namespace HfClinic.Clinical.Weights;

/// <summary>
/// What is known of body mass, its drift and fluid after some days: means and their covariance (symmetric, so stored once).
/// </summary>
/// <param name="Mass">M, kg.</param>
/// <param name="Drift">D, kg/day.</param>
/// <param name="Fluid">F, kg, against the person's own baseline.</param>
public readonly record struct FluidFilter(
    double Mass,
    double Drift,
    double Fluid,
    double MassVariance,
    double MassDrift,
    double MassFluid,
    double DriftVariance,
    double DriftFluid,
    double FluidVariance)
{
    /// <summary>The weight expected without weighing noise, kg.</summary>
    public double Expected => Mass + Fluid;

    /// <summary>Variance of <see cref="Expected"/>, kg².</summary>
    public double ExpectedVariance => MassVariance + (2 * MassFluid) + FluidVariance;

    /// <summary>Before the first reading.</summary>
    public static FluidFilter Start(TrendModel model) =>
        new(model.ReferenceKilograms, 0, 0, model.StartMassVariance, 0, 0, model.StartDriftVariance, 0, model.FluidVariance);

    /// <summary>From a baseline set by a person: known to half a kilogram, no fluid, no drift.</summary>
    public static FluidFilter Baseline(TrendModel model, double kilograms) =>
        new(kilograms, 0, 0, 0.25, 0, 0, model.StartDriftVariance, 0, model.FluidVariance);

    /// <summary>One day on, nothing weighed yet.</summary>
    public FluidFilter NextDay(TrendModel model)
    {
        const double Memory = TrendModel.FluidMemory;
        return new FluidFilter(
            Mass + Drift,
            Drift,
            Memory * Fluid,
            MassVariance + (2 * MassDrift) + DriftVariance + model.MassStep,
            MassDrift + DriftVariance,
            Memory * (MassFluid + DriftFluid),
            DriftVariance + model.DriftStep,
            Memory * DriftFluid,
            (Memory * Memory * FluidVariance) + model.FluidStep);
    }

    /// <summary>What a reading of the given kilograms would tell.</summary>
    public Innovation Compare(TrendModel model, double kilograms) =>
        Innovation.Of(kilograms - Expected, ExpectedVariance + model.ReadingVariance, model.Robust);

    /// <summary>Takes in a reading (covariance in Joseph's form, symmetric by construction).</summary>
    public FluidFilter Take(TrendModel model, in Innovation reading)
    {
        double noise = model.ReadingVariance / reading.Weight;
        double hMass = MassVariance + MassFluid;
        double hDrift = MassDrift + DriftFluid;
        double hFluid = MassFluid + FluidVariance;
        double spread = hMass + hFluid;
        double inverse = 1 / (spread + noise);
        double kMass = hMass * inverse;
        double kDrift = hDrift * inverse;
        double kFluid = hFluid * inverse;
        double restMass = hMass - (kMass * spread);
        double restDrift = hDrift - (kDrift * spread);
        double restFluid = hFluid - (kFluid * spread);
        return new FluidFilter(
            Mass + (kMass * reading.Kilograms),
            Drift + (kDrift * reading.Kilograms),
            Fluid + (kFluid * reading.Kilograms),
            MassVariance - (kMass * hMass) - (kMass * restMass) + (noise * kMass * kMass),
            MassDrift - (kMass * hDrift) - (kDrift * restMass) + (noise * kMass * kDrift),
            MassFluid - (kMass * hFluid) - (kFluid * restMass) + (noise * kMass * kFluid),
            DriftVariance - (kDrift * hDrift) - (kDrift * restDrift) + (noise * kDrift * kDrift),
            DriftFluid - (kDrift * hFluid) - (kFluid * restDrift) + (noise * kDrift * kFluid),
            FluidVariance - (kFluid * hFluid) - (kFluid * restFluid) + (noise * kFluid * kFluid));
    }

    /// <summary>
    /// Takes in a weight known to be true although far off: the whole step is fluid until later readings tell otherwise.
    /// </summary>
    public FluidFilter TakeStep(TrendModel model, double kilograms) => this with
    {
        Fluid = kilograms - Mass,
        MassFluid = 0,
        DriftFluid = 0,
        FluidVariance = model.ReadingVariance,
    };
}
