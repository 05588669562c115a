namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>How the published clearance formulas ask for heart failure: it lowers the part of clearance outside the kidney.</summary>
public enum HeartFailureGrade
{
    /// <summary>No or mild heart failure (Koup and Jusko); no heart failure (Sheiner).</summary>
    NoneOrMild,

    /// <summary>Moderate to severe heart failure (Koup and Jusko); heart failure (Sheiner).</summary>
    ModerateToSevere,
}

/// <summary>The grades in words.</summary>
public static class HeartFailureGrades
{
    public static string Words(HeartFailureGrade grade) => grade == HeartFailureGrade.NoneOrMild ? "none or mild" : "moderate to severe";
}
