using MathNet.Numerics.Distributions;

namespace HfClinic.Benchmarks.Trend;

/// <summary>One simulated person: weights as entered, and the truth behind them.</summary>
/// <param name="StartKilograms">Weight on the first day, which is also the first target weight.</param>
/// <param name="Entered">Grams to 100 g as entered, errors included; null on a day without a reading.</param>
/// <param name="TrueKilograms">Weight without scatter, clothing and entry errors.</param>
/// <param name="GainKilograms">Fluid gained (or lost) before the event.</param>
internal sealed record SimulatedPatient(double StartKilograms, int?[] Entered, double[] TrueKilograms, double GainKilograms)
{
    private const double PoundsPerKilogram = 2.2046226218;

    public static SimulatedPatient Make(WeightDataModel model, WeightEvent happens, int days, int eventDay, int seed)
    {
        var random = new Random(seed);
        double start = Math.Clamp(Normal.Sample(random, 82, 18), 48, 150);
        double scale = start / 80;
        double drift = (Normal.Sample(random, 0, model.DriftSpread) * scale) + model.CommonDrift;
        double fluidSpread = model.FluidSpread * scale * Math.Exp(Normal.Sample(random, 0, 0.30));
        double errorSpread = model.ErrorSpread * scale * Math.Exp(Normal.Sample(random, 0, 0.25));
        double gain = scale * Gain(random, happens);
        int weekday = random.Next(7);
        double missAfterReading = Beta.Sample(random, model.MissAfterReading.A, model.MissAfterReading.B);
        bool missed = random.NextDouble() < missAfterReading / (missAfterReading + 1 - model.MissAfterMiss);

        var entered = new int?[days];
        var truth = new double[days];
        double mass = start;
        double fluid = Normal.Sample(random, 0, fluidSpread);
        for (int day = 0; day < days; day++)
        {
            mass += Normal.Sample(random, 0, model.MassStep) * scale;
            truth[day] = mass + (drift * day) + fluid + (gain * Share(happens, day - eventDay));
            double weekly = model.WeeklyWave * scale * Math.Sin(2 * Math.PI * (day + weekday) / 7);
            double clothing = random.NextDouble() < 0.02 ? 0.5 + random.NextDouble() : 0;
            double shown = truth[day] + weekly + Normal.Sample(random, 0, errorSpread) + clothing;
            double typed = Typed(random, shown, random.NextDouble() / model.EntryErrors);
            entered[day] = missed ? null : 100 * (int)Math.Round(10 * typed);
            missed = random.NextDouble() < (missed ? model.MissAfterMiss : missAfterReading);
            fluid = (model.FluidMemory * fluid) + (Math.Sqrt(1 - (model.FluidMemory * model.FluidMemory)) * Normal.Sample(random, 0, fluidSpread));
        }

        return new SimulatedPatient(start, entered, truth, gain);
    }

    private static double Gain(Random random, WeightEvent happens) => happens switch
    {
        WeightEvent.Decompensation => random.NextDouble() < 0.6 ? Gamma.Sample(random, 1.5, 1.5 / 2.7) : 0,
        WeightEvent.OverDiuresis => -Gamma.Sample(random, 4, 4 / 2.5),
        _ => 0,
    };

    /// <summary>How much of the gain is there, by days from the event: two fifths slowly, the rest in the last week.</summary>
    private static double Share(WeightEvent happens, int fromEvent) => happens switch
    {
        WeightEvent.Decompensation => (0.4 * Math.Clamp((fromEvent + 30) / 23.0, 0, 1)) + (0.6 * Math.Clamp((fromEvent + 7) / 7.0, 0, 1)),
        WeightEvent.OverDiuresis => Math.Clamp((fromEvent + 10) / 10.0, 0, 1),
        _ => 0,
    };

    /// <summary>The weight as it is typed: 0.2% in the wrong unit, 0.3% of another person, 0.3% with a slipped figure.</summary>
    private static double Typed(Random random, double shown, double luck) => luck switch
    {
        < 0.001 => shown * PoundsPerKilogram,
        < 0.002 => shown / PoundsPerKilogram,
        < 0.005 => Normal.Sample(random, 75, 15),
        < 0.008 => random.Next(4) switch
        {
            0 => shown + 10,
            1 => shown - 10,
            2 => shown * 10,
            _ => Math.Floor(shown / 10),
        },
        _ => shown,
    };
}
