using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>
/// Stress in the wall of the left ventricle, kdyn/cm². Figures of different formulas cannot be compared, and no normal range
/// is given: published ones differ threefold by formula and by the pressure put in.
/// </summary>
public static class WallStress
{
    /// <summary>kdyn/cm² in one mmHg (conventional millimetre of mercury, 133.322387415 Pa, UCUM).</summary>
    public const double KilodynesPerMmHg = 1.33322387415;

    private static readonly Formula Sphere = new(
        "wall stress", "kdyn/cm²", 0, "1.33322 × pressure in mmHg × radius / (2 × wall thickness), in cm", ["laplace-texts", "ucum"])
    {
        Method = "Laplace, sphere",
    };

    private static readonly Formula Meridional = new(
        "end-systolic wall stress",
        "kdyn/cm²",
        0,
        "0.334 × end-systolic pressure × LVIDs / (PWTs × (1 + PWTs / LVIDs)), mmHg and cm, all at end-systole",
        ["reichek-1982"])
    {
        Method = "meridional",
        Caution = "Grossman's form with 1.35/4 instead of 0.334 gives 1 % more.",
    };

    private static readonly Formula Cuff = new("end-systolic pressure", "mmHg", 0, "0.9 × systolic pressure by cuff", ["end-systolic-cuff"]);

    private static readonly Quantity<double> Pressure = Quantity.Of("pressure", "mmHg", 40, 260);
    private static readonly Quantity<double> EndSystolicPressure = Quantity.Of("end-systolic pressure", "mmHg", 40, 260);
    private static readonly Quantity<Length> Radius = Quantity.Centimetres("radius", 0.5, 5);
    private static readonly Quantity<Length> Wall = Quantity.Centimetres("wall thickness", 0.4, 2.5);
    private static readonly Quantity<Length> SystolicDiameter = Quantity.Centimetres("LVIDs", 1, 9);
    private static readonly Quantity<Length> SystolicWall = Quantity.Centimetres("PWTs", 0.4, 2.5);

    /// <summary>Wall stress of a thin sphere. Pressure 40 to 260 mmHg, radius 0.5 to 5 cm, wall 0.4 to 2.5 cm.</summary>
    public static Computed<double> Laplace(Given<double> pressureMmHg, Given<Length> radius, Given<Length> wallThickness)
    {
        var (pressure, r, wall) = (Pressure.Take(pressureMmHg), Radius.Take(radius), Wall.Take(wallThickness));
        return Sphere.Compute([pressure, r, wall], () => KilodynesPerMmHg * pressure.Number * r.Number / (2 * wall.Number));
    }

    /// <summary>Meridional end-systolic wall stress (Reichek, Circulation 1982;65:99; from memory).</summary>
    /// <param name="endSystolicPressureMmHg">40 to 260; <see cref="EndSystolicPressureByCuff"/> where none was measured.</param>
    /// <param name="systolicDiameter">LVIDs, 1 to 9 cm.</param>
    /// <param name="systolicWall">Posterior wall at end-systole, 0.4 to 2.5 cm.</param>
    public static Computed<double> EndSystolicMeridional(
        Given<double> endSystolicPressureMmHg, Given<Length> systolicDiameter, Given<Length> systolicWall)
    {
        var (pressure, diameter, wall) =
            (EndSystolicPressure.Take(endSystolicPressureMmHg), SystolicDiameter.Take(systolicDiameter), SystolicWall.Take(systolicWall));
        return Meridional.Compute(
            [pressure, diameter, wall],
            () => 0.334 * pressure.Number * diameter.Number / (wall.Number * (1 + wall.Number / diameter.Number)));
    }

    /// <summary>An estimate of end-systolic pressure, mmHg, from the systolic pressure by cuff (50 to 260).</summary>
    public static Computed<double> EndSystolicPressureByCuff(Given<double> systolicMmHg)
    {
        var systolic = Accepted.Systolic.Take(systolicMmHg);
        return Cuff.Compute([systolic], () => 0.9 * systolic.Number);
    }
}
