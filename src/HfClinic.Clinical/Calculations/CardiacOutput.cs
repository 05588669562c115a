using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>Stroke volume by echo, cardiac output and index, and the resistance against which the heart works.</summary>
public static class CardiacOutput
{
    private static readonly Formula Stroke = new("stroke volume", "mL", 1, "π × (LVOT diameter / 2)² × LVOT VTI, in cm", ["lvot-doppler"])
    {
        Caution = "An error of the diameter counts twice. Average 3 beats, in atrial fibrillation 5 to 10.",
    };

    private static readonly Formula Output = new("cardiac output", "L/min", 2, "stroke volume in mL × heart rate / 1000", ["common-definitions"]);

    private static readonly Formula Index = new(
        "cardiac index", "L/min/m²", 2, "cardiac output / body surface area", ["common-definitions", "stevenson-perloff-1989"]);

    private static readonly Formula Resistance = new(
        "systemic vascular resistance", "dyn·s/cm⁵", 0, "80 × (mean arterial pressure − central venous pressure) / cardiac output", ["haemodynamics-texts"])
    {
        Caution = "80 is the customary factor; an exact conversion has 79.993. Customary range 800 to 1400.",
    };

    private static readonly Formula ResistanceIndex = new(
        "systemic vascular resistance index", "dyn·s·m²/cm⁵", 0, "80 × (mean arterial pressure − central venous pressure) / cardiac index", ["haemodynamics-texts"])
    {
        Caution = "80 is the customary factor; an exact conversion has 79.993.",
    };

    private static readonly Quantity<Length> OutflowDiameter = Quantity.Centimetres("LVOT diameter", 1.4, 3.0);
    private static readonly Quantity<Length> VelocityTimeIntegral = Quantity.Centimetres("LVOT VTI", 3, 40);
    private static readonly Quantity<double> StrokeMillilitres = Quantity.Of("stroke volume", "mL", 10, 200);
    private static readonly Quantity<double> LitresPerMinute = Quantity.Of("cardiac output", "L/min", 1, 15);
    private static readonly Quantity<double> LitresPerSquareMetre = Quantity.Of("cardiac index", "L/min/m²", 0.5, 10);
    private static readonly Quantity<double> MeanPressure = Quantity.Of("mean arterial pressure", "mmHg", 30, 200);
    private static readonly Quantity<double> VenousPressure = Quantity.Of("central venous pressure", "mmHg", 0, 40);

    /// <summary>A cardiac index below this, L/min/m², is low (Stevenson and Perloff 1989).</summary>
    public const double LowIndex = 2.2;

    /// <summary>Stroke volume, mL, through the outflow tract of the left ventricle. Diameter 1.4 to 3.0 cm, VTI 3 to 40 cm. From memory.</summary>
    public static Computed<double> StrokeVolume(Given<Length> outflowDiameter, Given<Length> velocityTimeIntegral)
    {
        var (diameter, distance) = (OutflowDiameter.Take(outflowDiameter), VelocityTimeIntegral.Take(velocityTimeIntegral));
        return Stroke.Compute([diameter, distance], () => Math.PI * Math.Pow(diameter.Number / 2, 2) * distance.Number);
    }

    /// <summary>Cardiac output, L/min. Stroke volume 10 to 200 mL, heart rate 25 to 220 beats/min.</summary>
    public static Computed<double> PerMinute(Given<double> strokeVolumeMillilitres, Given<double> heartRate)
    {
        var (volume, rate) = (StrokeMillilitres.Take(strokeVolumeMillilitres), Accepted.HeartRate.Take(heartRate));
        return Output.Compute([volume, rate], () => volume.Number * rate.Number / 1000);
    }

    /// <summary>Cardiac index, L/min/m². Output 1 to 15 L/min.</summary>
    public static Computed<double> PerSquareMetre(Given<double> outputLitresPerMinute, Given<double> surfaceAreaSquareMetres)
    {
        var (output, area) = (LitresPerMinute.Take(outputLitresPerMinute), Accepted.BodySurfaceArea.Take(surfaceAreaSquareMetres));
        return Index.Compute([output, area], () => output.Number / area.Number);
    }

    /// <summary>Strictly below <see cref="LowIndex"/>.</summary>
    public static bool IsLowIndex(double index) => index < LowIndex;

    /// <summary>
    /// Systemic vascular resistance, dyn·s/cm⁵. Output 1 to 15 L/min; mean pressure 30 to 200 mmHg, venous 0 to 40 mmHg,
    /// mean above venous.
    /// </summary>
    public static Computed<double> VascularResistance(
        Given<double> meanPressureMmHg, Given<double> venousPressureMmHg, Given<double> outputLitresPerMinute) =>
        Against(Resistance, meanPressureMmHg, venousPressureMmHg, LitresPerMinute.Take(outputLitresPerMinute));

    /// <summary>Systemic vascular resistance index, dyn·s·m²/cm⁵, from the cardiac index (0.5 to 10 L/min/m²).</summary>
    public static Computed<double> VascularResistanceIndex(
        Given<double> meanPressureMmHg, Given<double> venousPressureMmHg, Given<double> indexLitresPerMinutePerSquareMetre) =>
        Against(ResistanceIndex, meanPressureMmHg, venousPressureMmHg, LitresPerSquareMetre.Take(indexLitresPerMinutePerSquareMetre));

    private static Computed<double> Against(Formula formula, Given<double> meanPressureMmHg, Given<double> venousPressureMmHg, Input<double> flow)
    {
        var (mean, venous) = (MeanPressure.Take(meanPressureMmHg), VenousPressure.Take(venousPressureMmHg));
        return formula.Compute([mean, venous, flow], () => 80 * (mean.Number - venous.Number) / flow.Number, () =>
            mean.Number > venous.Number ? null : $"mean arterial pressure {mean.Shown} is not above central venous pressure {venous.Shown}");
    }
}
