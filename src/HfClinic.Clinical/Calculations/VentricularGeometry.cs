using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>Mass and shape of the left ventricle from linear echo measures at end-diastole. Arithmetic is decimal, so that limits are met exactly.</summary>
public static class VentricularGeometry
{
    private static readonly Formula MassFormula = new(
        "LV mass", "g", 0, "0.8 × 1.04 × ((IVSd + LVIDd + PWTd)³ − LVIDd³) + 0.6, in cm", ["lv-mass-linear", "ase-eacvi-2015"]);

    private static readonly Formula MassIndexFormula = new("LV mass index", "g/m²", 0, "LV mass / body surface area", ["ase-eacvi-2015"]);

    private static readonly Formula ThicknessFormula = new(
        "relative wall thickness", "", 2, "2 × PWTd / LVIDd", ["ase-eacvi-2015"]);

    private static readonly Formula ShapeFormula = new(
        "LV geometry", "", 0, "LV mass index above the limit for the sex or not, and relative wall thickness above 0.42 or not", ["ase-eacvi-2015"]);

    private static readonly Quantity<Length> Septum = Quantity.Centimetres("IVSd", 0.4, 2.5);
    private static readonly Quantity<Length> PosteriorWall = Quantity.Centimetres("PWTd", 0.4, 2.5);
    private static readonly Quantity<Length> Cavity = Quantity.Centimetres("LVIDd", 2.5, 9);
    private static readonly Quantity<double> Grams = Quantity.Of("LV mass", "g", 20, 1500);
    private static readonly Quantity<double> GramsPerSquareMetre = Quantity.Of("LV mass index", "g/m²", 10, 600);
    private static readonly Quantity<double> Thickness = Quantity.Of("relative wall thickness", "", 0.1, 2);

    /// <summary>A relative wall thickness above this is concentric (ASE/EACVI 2015; from memory).</summary>
    public const double ConcentricAbove = 0.42;

    /// <summary>Left ventricular mass, g, by the linear (cube) method. Walls 0.4 to 2.5 cm, cavity 2.5 to 9 cm.</summary>
    public static Computed<double> Mass(Given<Length> septum, Given<Length> cavity, Given<Length> posteriorWall)
    {
        var (ivs, lvid, pw) = (Septum.Take(septum), Cavity.Take(cavity), PosteriorWall.Take(posteriorWall));
        return MassFormula.Compute([ivs, lvid, pw], () =>
        {
            var (inner, outer) = (lvid.Value.Centimetres, ivs.Value.Centimetres + lvid.Value.Centimetres + pw.Value.Centimetres);
            return (double)(0.8m * 1.04m * (outer * outer * outer - inner * inner * inner) + 0.6m);
        });
    }

    /// <summary>Left ventricular mass index, g/m².</summary>
    public static Computed<double> MassIndex(Given<double> massGrams, Given<double> surfaceAreaSquareMetres)
    {
        var (mass, area) = (Grams.Take(massGrams), Accepted.BodySurfaceArea.Take(surfaceAreaSquareMetres));
        return MassIndexFormula.Compute([mass, area], () => mass.Number / area.Number);
    }

    /// <summary>Relative wall thickness, a ratio.</summary>
    public static Computed<double> RelativeWallThickness(Given<Length> posteriorWall, Given<Length> cavity)
    {
        var (pw, lvid) = (PosteriorWall.Take(posteriorWall), Cavity.Take(cavity));
        return ThicknessFormula.Compute([pw, lvid], () => (double)(2m * pw.Value.Millimetres / lvid.Value.Millimetres));
    }

    /// <summary>The shape of the ventricle; both limits are strict. Says which mass limit was used.</summary>
    public static Computed<VentricleShape> Shape(Given<double> massIndex, Given<double> relativeWallThickness, Sex sex, MassLimit limit)
    {
        var (index, thickness, who) = (GramsPerSquareMetre.Take(massIndex), Thickness.Take(relativeWallThickness), Quantity.Sex(sex));
        return ShapeFormula.Compute(
            [index, thickness, who, Input.Choice("limit of LV mass index", limit.Words)],
            () => (index.Number > limit.GramsPerSquareMetre(sex), thickness.Number > ConcentricAbove) switch
            {
                (false, false) => VentricleShape.Normal,
                (false, true) => VentricleShape.ConcentricRemodelling,
                (true, true) => VentricleShape.ConcentricHypertrophy,
                (true, false) => VentricleShape.EccentricHypertrophy,
            },
            VentricleShapes.Words);
    }
}
