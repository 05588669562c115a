using System.Collections.Immutable;

namespace HfClinic.Clinical.Calculations.RiskScores;

/// <summary>
/// CHA2DS2-VASc (Lip, Chest 2010) and, without the point for sex, CHA2DS2-VA (ESC 2024). Both from memory. Every patient of
/// this clinic has heart failure, which counts 1.
/// </summary>
public static class Cha2ds2
{
    private const string Sum = "heart failure 1, hypertension 1, age 65 to 74 1 or 75 and above 2, diabetes 1, stroke, TIA or embolism 2, vascular disease 1";
    private const string ForFibrillation = "Made for atrial fibrillation.";

    private static readonly Formula Vasc = new("CHA2DS2-VASc", "points", 0, Sum + ", female 1", ["cha2ds2-vasc-2010"]) { Caution = ForFibrillation };

    private static readonly Formula Va = new("CHA2DS2-VA", "points", 0, Sum, ["esc-2024-cha2ds2-va"]) { Caution = ForFibrillation };

    /// <summary>1 to 9 points; not computed when the sex is not recorded.</summary>
    public static Computed<int> WithSex(StrokePatient patient) =>
        Vasc.Score([.. Common(patient), Quantity.Sex(patient.Sex).Worth(sex => sex == Values.Sex.Female ? 1 : 0)]);

    /// <summary>1 to 8 points.</summary>
    public static Computed<int> WithoutSex(StrokePatient patient) => Va.Score(Common(patient));

    private static ImmutableArray<Input> Common(StrokePatient patient) =>
    [
        Input.Choice("heart failure", "yes") with { Points = 1 },
        Quantity.Answer("hypertension", patient.Hypertension).Worth(yes => yes ? 1 : 0),
        Accepted.AdultAge.Take(patient.AgeYears).Worth(age => age >= 75 ? 2 : age >= 65 ? 1 : 0),
        Quantity.Answer("diabetes", patient.Diabetes).Worth(yes => yes ? 1 : 0),
        Quantity.Answer("stroke, TIA or embolism", patient.StrokeOrEmbolism).Worth(yes => yes ? 2 : 0),
        Quantity.Answer("vascular disease", patient.VascularDisease).Worth(yes => yes ? 1 : 0),
    ];
}
