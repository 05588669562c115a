namespace HfClinic.Clinical.Calculations.RiskScores;

/// <summary>
/// MAGGIC integer score (Pocock, Eur Heart J 2013;34:1404): points only. No risk is given, because the published risk tables
/// could not be confirmed. The age points at EF 30 and above are from memory.
/// </summary>
/// <remarks>
/// Bands begin at their lower edge, so that a creatinine of 109.6 µmol/L is in "90 to 109"; EF is rounded to a whole number
/// first, as in <see cref="EjectionFractionClass"/>.
/// </remarks>
public static class Maggic
{
    private static readonly Formula Formula = new(
        "MAGGIC score",
        "points",
        0,
        "sum of points: EF, age and systolic pressure by EF, BMI, creatinine, NYHA class, sex, smoking, diabetes, COPD, time since diagnosis, no beta-blocker, no ACE inhibitor or ARB",
        ["maggic-2013", "maggic-2013-age-rows"])
    {
        Caution = "Points only. Age points at EF 30 and above are from memory.",
    };

    private static readonly Quantity<int> Nyha = Quantity.Whole("NYHA class", "", 1, 4);

    /// <summary>The sum; each input carries its own points.</summary>
    public static Computed<int> Points(MaggicPatient patient)
    {
        var ef = Accepted.EjectionFraction.Take(patient.EjectionFraction);
        var row = ef.IsUsable ? EfRow(EjectionFractionClass.Whole(ef.Value)) : (int?)null;
        return Formula.Score([
            Quantity.Sex(patient.Sex).Worth(sex => sex == Values.Sex.Male ? 1 : 0),
            Quantity.Answer("smoker", patient.Smoker).Worth(yes => yes ? 1 : 0),
            Quantity.Answer("diabetes", patient.Diabetes).Worth(yes => yes ? 3 : 0),
            Quantity.Answer("COPD", patient.Copd).Worth(yes => yes ? 2 : 0),
            Quantity.Answer("heart failure diagnosed 18 months ago or earlier", patient.DiagnosedEighteenMonthsAgo).Worth(yes => yes ? 2 : 0),
            Quantity.Answer("beta-blocker", patient.BetaBlocker).Worth(yes => yes ? 0 : 3),
            Quantity.Answer("ACE inhibitor or ARB", patient.AceInhibitorOrArb).Worth(yes => yes ? 0 : 1),
            ef.Worth(percent => Band.Points(EjectionFractionClass.Whole(percent), [20, 25, 30, 35, 40], [7, 6, 5, 3, 2, 0])),
            ByEf(Accepted.AdultAge.Take(patient.AgeYears), row, AgePoints),
            ByEf(Accepted.Systolic.Take(patient.SystolicMmHg), row, SystolicPoints),
            Accepted.BodyMassIndex.Take(patient.BodyMassIndex).Worth(index => Band.Points(index, [15, 20, 25, 30], [6, 5, 3, 2, 0])),
            Accepted.Creatinine.Take(patient.Creatinine).Worth(creatinine => Band.Points(
                (double)creatinine.MicromolPerLitre, [90, 110, 130, 150, 170, 210, 250], [0, 1, 2, 3, 4, 5, 6, 8])),
            Nyha.Take(patient.NyhaClass).Worth(nyha => nyha switch { 1 => 0, 2 => 2, 3 => 6, _ => 8 }),
        ]);
    }

    private static int EfRow(int wholePercent) => Band.Points(wholePercent, [30, 40], [0, 1, 2]);

    private static int AgePoints(double years, int row) => Band.Points(years, [55, 60, 65, 70, 75, 80], row switch
    {
        0 => [0, 1, 2, 4, 6, 8, 10],
        1 => [0, 2, 4, 6, 8, 10, 13],
        _ => [0, 3, 5, 7, 9, 12, 15],
    });

    private static int SystolicPoints(double mmHg, int row) => Band.Points(mmHg, [110, 120, 130, 140, 150], row switch
    {
        0 => [5, 4, 3, 2, 1, 0],
        1 => [3, 2, 1, 1, 0, 0],
        _ => [2, 1, 1, 0, 0, 0],
    });

    private static Input ByEf<T>(Input<T> input, int? row, Func<double, int, int> points)
        where T : struct => row is { } known ? input.Worth(_ => points(input.Number, known)) : input;
}
