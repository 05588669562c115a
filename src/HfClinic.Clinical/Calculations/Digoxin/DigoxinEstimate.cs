using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>
/// What the published methods expect of one patient, side by side. They disagree by about a third on the same patient: the
/// spread is the answer, and a measured level at the right time outweighs it. Never a dose advice.
/// </summary>
/// <param name="Weight">The weight used, with the adjusted one beside it where the patient is obese.</param>
/// <param name="CreatinineClearance">mL/min, by Cockcroft and Gault with that weight.</param>
/// <param name="ByAdjustedWeight">The same with the adjusted weight; null where there is none.</param>
/// <param name="Level">Average level at steady state, ng/mL: Koup and Jusko, Sheiner, Nomura.</param>
/// <param name="HalfLife">Days, each clearance with each volume.</param>
/// <param name="TimeToSteadyState">Days, five half-lives.</param>
public sealed record DigoxinEstimate(
    LeanWeight Weight,
    Computed<double> CreatinineClearance,
    Computed<double>? ByAdjustedWeight,
    MethodRange Level,
    MethodRange HalfLife,
    MethodRange TimeToSteadyState)
{
    /// <summary>Estimates for one patient on one daily dose.</summary>
    public static DigoxinEstimate For(
        Given<double> microgramsDaily,
        DigoxinForm form,
        Given<Weight> weight,
        Given<Length> height,
        Given<int> ageYears,
        Given<Creatinine> creatinine,
        Sex sex,
        HeartFailureGrade grade)
    {
        var lean = LeanWeight.Choose(weight, height, sex);
        var clearance = Renal.CreatinineClearance(ageYears, lean.Kilograms, creatinine, sex);
        var adjusted = lean.Adjusted is { } kilograms ? Renal.CreatinineClearance(ageYears, kilograms, creatinine, sex) : null;
        var halfLife = HalfLives(lean.Kilograms, clearance, grade);
        return new DigoxinEstimate(
            lean,
            clearance,
            adjusted,
            Levels(microgramsDaily, form, lean.Kilograms, clearance, grade),
            halfLife,
            new MethodRange([.. halfLife.Methods.Select(method => DigoxinSteadyState.TimeToReach(method))]));
    }

    /// <summary>Average level at steady state, ng/mL, by each method.</summary>
    public static MethodRange Levels(
        Given<double> microgramsDaily, DigoxinForm form, Given<double> weightKilograms, Given<double> creatinineClearance, HeartFailureGrade grade) =>
        new([
            DigoxinSteadyState.Level(microgramsDaily, form, DigoxinClearance.KoupJusko(creatinineClearance, grade)),
            DigoxinSteadyState.Level(microgramsDaily, form, DigoxinClearance.Sheiner(weightKilograms, creatinineClearance, grade)),
            DigoxinRegressions.Nomura(microgramsDaily, creatinineClearance),
        ]);

    /// <summary>Half-life, days, each clearance with each volume.</summary>
    public static MethodRange HalfLives(Given<double> weightKilograms, Given<double> creatinineClearance, HeartFailureGrade grade)
    {
        Computed<double>[] clearances =
            [DigoxinClearance.KoupJusko(creatinineClearance, grade), DigoxinClearance.Sheiner(weightKilograms, creatinineClearance, grade)];
        Computed<double>[] volumes =
            [DigoxinVolume.Reuning(weightKilograms, creatinineClearance), DigoxinVolume.Jusko(weightKilograms, creatinineClearance)];
        return new([.. from clearance in clearances from volume in volumes select DigoxinSteadyState.HalfLife(volume, clearance)]);
    }
}
