namespace HfClinic.Clinical.Calculations.RiskScores;

/// <summary>H2FPEF score (Reddy, Circulation 2018;138:861; points seen on several pages). Every limit is strict: a BMI of 30.0 counts nothing.</summary>
public static class H2fpef
{
    private static readonly Formula Formula = new(
        "H2FPEF score",
        "points",
        0,
        "BMI above 30: 2; two or more antihypertensives: 1; atrial fibrillation: 3; PASP above 35 mmHg: 1; age above 60: 1; E/e′ above 9: 1",
        ["h2fpef-2018"])
    {
        Caution = "0 to 1 low, 2 to 5 intermediate, 6 to 9 high probability of heart failure with preserved EF in unexplained breathlessness.",
    };

    private static readonly Quantity<int> Antihypertensives = Quantity.Whole("antihypertensive medicines", "", 0, 12);
    private static readonly Quantity<double> PulmonaryPressure = Quantity.Of("PASP", "mmHg", 10, 120);
    private static readonly Quantity<double> FillingRatio = Quantity.Of("E/e′", "", 2, 50);

    /// <summary>0 to 9 points.</summary>
    /// <param name="bodyMassIndex">kg/m², 10 to 100.</param>
    /// <param name="antihypertensives">How many medicines, 0 to 12.</param>
    /// <param name="atrialFibrillation">Paroxysmal or persistent.</param>
    /// <param name="pulmonaryPressureMmHg">Systolic pulmonary artery pressure by Doppler, 10 to 120 mmHg.</param>
    /// <param name="ageYears">18 to 110.</param>
    /// <param name="fillingRatio">E/e′, 2 to 50.</param>
    public static Computed<int> Points(
        Given<double> bodyMassIndex,
        Given<int> antihypertensives,
        Given<bool> atrialFibrillation,
        Given<double> pulmonaryPressureMmHg,
        Given<int> ageYears,
        Given<double> fillingRatio) => Formula.Score([
            Accepted.BodyMassIndex.Take(bodyMassIndex).Worth(index => index > 30 ? 2 : 0),
            Antihypertensives.Take(antihypertensives).Worth(number => number >= 2 ? 1 : 0),
            Quantity.Answer("atrial fibrillation", atrialFibrillation).Worth(yes => yes ? 3 : 0),
            PulmonaryPressure.Take(pulmonaryPressureMmHg).Worth(pressure => pressure > 35 ? 1 : 0),
            Accepted.AdultAge.Take(ageYears).Worth(age => age > 60 ? 1 : 0),
            FillingRatio.Take(fillingRatio).Worth(ratio => ratio > 9 ? 1 : 0),
        ]);

    /// <summary>The published groups: 0 to 1 low, 2 to 5 intermediate, 6 to 9 high.</summary>
    public static string Group(int points) => points < 2 ? "low" : points < 6 ? "intermediate" : "high";
}
