using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>Body surface area, body mass index, ideal and adjusted weight of an adult.</summary>
public static class BodySize
{
    private const decimal CentimetresPerInch = 2.54m;

    private static readonly Formula Mosteller = new("body surface area", "m²", 2, "√(height in cm × weight in kg / 3600)", ["mosteller-1987"])
    {
        Method = "Mosteller",
    };

    private static readonly Formula DuBois = new(
        "body surface area", "m²", 2, "0.007184 × (weight in kg)^0.425 × (height in cm)^0.725", ["du-bois-1916"])
    {
        Method = "Du Bois",
    };

    private static readonly Formula MassIndex = new("BMI", "kg/m²", 1, "weight in kg / (height in m)²", ["common-definitions"]);

    private static readonly Formula Ideal = new(
        "ideal weight", "kg", 1, "50 (women 45.5) + 2.3 for each inch of height above 60 inches", ["devine-1974"])
    {
        Method = "Devine",
        Caution = "Meant for people taller than 60 inches (152.4 cm); below that the same line is drawn on.",
    };

    private static readonly Formula Adjusted = new(
        "adjusted weight", "kg", 1, "ideal weight + 0.4 × (measured weight − ideal weight)", ["adjusted-weight-texts"]);

    private static readonly Quantity<Length> HeightForIdeal = Quantity.Centimetres("height", 140, 220);
    private static readonly Quantity<double> IdealKilograms = Quantity.Of("ideal weight", "kg", 20, 120);

    /// <summary>Body surface area, m², by Mosteller (N Engl J Med 1987;317:1098). Weight 30 to 250 kg, height 120 to 220 cm.</summary>
    public static Computed<double> SurfaceAreaMosteller(Given<Weight> weight, Given<Length> height)
    {
        var (kilograms, centimetres) = (Accepted.Weight.Take(weight), Accepted.Height.Take(height));
        return Mosteller.Compute([kilograms, centimetres], () => Math.Sqrt(centimetres.Number * kilograms.Number / 3600));
    }

    /// <summary>Body surface area, m², by Du Bois and Du Bois (1916; constants from memory). Weight 30 to 250 kg, height 120 to 220 cm.</summary>
    public static Computed<double> SurfaceAreaDuBois(Given<Weight> weight, Given<Length> height)
    {
        var (kilograms, centimetres) = (Accepted.Weight.Take(weight), Accepted.Height.Take(height));
        return DuBois.Compute(
            [kilograms, centimetres], () => 0.007184 * Math.Pow(kilograms.Number, 0.425) * Math.Pow(centimetres.Number, 0.725));
    }

    /// <summary>Body mass index, kg/m². Decimal arithmetic: 86.7 kg at 170 cm is 30 and not its neighbour above.</summary>
    public static Computed<double> BodyMassIndex(Given<Weight> weight, Given<Length> height)
    {
        var (kilograms, metres) = (Accepted.Weight.Take(weight), Accepted.Height.Take(height));
        return MassIndex.Compute(
            [kilograms, metres], () => (double)(kilograms.Value.Kilograms / (metres.Value.Metres * metres.Value.Metres)));
    }

    /// <summary>Ideal weight, kg, by Devine (1974; from memory). Height 140 to 220 cm; not computed when the sex is not recorded.</summary>
    public static Computed<double> IdealWeight(Given<Length> height, Sex sex)
    {
        var (centimetres, who) = (HeightForIdeal.Take(height), Quantity.Sex(sex));
        return Ideal.Compute(
            [centimetres, who],
            () => (double)((sex == Sex.Female ? 45.5m : 50m) + 2.3m * (centimetres.Value.Centimetres / CentimetresPerInch - 60m)));
    }

    /// <summary>Adjusted weight, kg, between ideal and measured, for an obese person.</summary>
    /// <param name="weight">Measured, 30 to 250 kg.</param>
    /// <param name="idealKilograms">From <see cref="IdealWeight"/>.</param>
    public static Computed<double> AdjustedWeight(Given<Weight> weight, Given<double> idealKilograms)
    {
        var (measured, ideal) = (Accepted.Weight.Take(weight), IdealKilograms.Take(idealKilograms));
        return Adjusted.Compute([measured, ideal], () => ideal.Number + 0.4 * (measured.Number - ideal.Number));
    }
}
