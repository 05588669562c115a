using HfClinic.SeedDemo.Days;

namespace HfClinic.SeedDemo.Weights;

/// <summary>A weight for each day of the history, whether the person steps on the scale or not.</summary>
/// <param name="Mass">Body mass, kilograms; the last entry is day 0.</param>
/// <param name="Shown">What the scale would show, kilograms, unrounded.</param>
internal sealed record WeightCourse(double[] Mass, double[] Shown)
{
    public static WeightCourse Draw(Chance chance, WeightModel model, double kilograms)
    {
        var size = kilograms / 80;
        var drift = chance.Normal(0, model.MassDrift) * size;
        var fluidDeviation = model.FluidDeviation * size * Math.Exp(chance.Normal(0, model.FluidSpread));
        var readingDeviation = model.ReadingDeviation * size * Math.Exp(chance.Normal(0, model.ReadingSpread));
        var weekday = chance.Below(7);
        var mass = new double[DemoDays.History];
        var shown = new double[DemoDays.History];
        var fluid = chance.Normal(0, fluidDeviation);
        for (var i = 0; i < DemoDays.History; i++)
        {
            mass[i] = (i == 0 ? kilograms : mass[i - 1] + drift) + chance.Normal(0, model.MassStep * size);
            fluid = (WeightModel.FluidKept * fluid)
                + (Math.Sqrt(1 - (WeightModel.FluidKept * WeightModel.FluidKept)) * chance.Normal(0, fluidDeviation));
            var swing = model.WeeklySwing * size * Math.Sin(2 * Math.PI * (i + weekday) / 7);
            var clothing = chance.Happens(model.ClothingChance) ? chance.Between(0.5, 1.5) : 0;
            shown[i] = mass[i] + fluid + swing + clothing + chance.Normal(0, readingDeviation);
        }

        return new(mass, shown);
    }

    /// <summary>Body mass on a day of the demo, or of the first day for one before the history.</summary>
    public double MassOn(int day) => Mass[Math.Max(0, Mass.Length - 1 + day)];
}
