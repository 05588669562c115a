using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations.RiskScores;

/// <summary>What the MAGGIC score asks. What is left out is missing, never a "no".</summary>
public sealed record MaggicPatient
{
    public Given<int> AgeYears { get; init; }

    public Sex Sex { get; init; }

    /// <summary>Percent.</summary>
    public Given<decimal> EjectionFraction { get; init; }

    /// <summary>1 to 4.</summary>
    public Given<int> NyhaClass { get; init; }

    public Given<Creatinine> Creatinine { get; init; }

    /// <summary>kg/m².</summary>
    public Given<double> BodyMassIndex { get; init; }

    public Given<double> SystolicMmHg { get; init; }

    public Given<bool> Smoker { get; init; }

    public Given<bool> Diabetes { get; init; }

    /// <summary>Chronic obstructive pulmonary disease.</summary>
    public Given<bool> Copd { get; init; }

    /// <summary>Heart failure first diagnosed 18 months ago or earlier.</summary>
    public Given<bool> DiagnosedEighteenMonthsAgo { get; init; }

    public Given<bool> BetaBlocker { get; init; }

    /// <summary>ACE inhibitor or angiotensin receptor blocker.</summary>
    public Given<bool> AceInhibitorOrArb { get; init; }
}
