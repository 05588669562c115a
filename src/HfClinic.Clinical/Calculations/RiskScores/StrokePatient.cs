using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations.RiskScores;

/// <summary>What the stroke scores ask of a patient with heart failure. What is left out is missing, never a "no".</summary>
public sealed record StrokePatient
{
    public Given<int> AgeYears { get; init; }

    public Sex Sex { get; init; }

    public Given<bool> Hypertension { get; init; }

    public Given<bool> Diabetes { get; init; }

    /// <summary>Earlier stroke, transient ischaemic attack or systemic embolism.</summary>
    public Given<bool> StrokeOrEmbolism { get; init; }

    /// <summary>Earlier myocardial infarction, peripheral artery disease or aortic plaque.</summary>
    public Given<bool> VascularDisease { get; init; }
}
