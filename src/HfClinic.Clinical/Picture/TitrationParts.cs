using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;

namespace HfClinic.Clinical.Picture;

/// <summary>Something found on a day.</summary>
public sealed record Seen<T>(DateOnly Day, T What);

/// <summary>The heart's rhythm.</summary>
public enum Rhythm
{
    Sinus = 1,

    /// <summary>Atrial fibrillation or flutter.</summary>
    AtrialFibrillation = 2,

    Paced = 3,
    Other = 4,
}

/// <summary>Why a prescriber stopped short of target.</summary>
/// <param name="Expires">The last day it stands, where one was set; else the clinic's number of days from <paramref name="On"/>.</param>
/// <param name="EndedOn">The day it was withdrawn.</param>
public sealed record TitrationLimit(
    long Id, TitrationClass Class, string Reason, string By, DateOnly On, DateOnly? Expires = null, DateOnly? EndedOn = null);

/// <summary>Why a class of medicine, or one medicine, is not given.</summary>
public enum NotGivenBecause
{
    Contraindication = 1,
    Intolerance = 2,
    Allergy = 3,
    Refusal = 4,
}

/// <summary>A documented reason against a class of medicine or against one medicine.</summary>
/// <param name="Classes">The medicine classes it speaks of; empty when it speaks of one medicine only.</param>
/// <param name="Medicine">The one medicine it speaks of, as recorded; null for whole classes.</param>
public sealed record NotGiven(
    long Id, NotGivenBecause Because, ImmutableArray<MedicineClass> Classes, string? Medicine, string Reason, DateOnly On);

/// <summary>Lasting facts of a patient that speak for or against a medicine.</summary>
public enum PatientCondition
{
    HighGradeAvBlock = 1,
    SickSinus = 2,
    Pacemaker = 3,
    CardiogenicShock = 4,
    CriticalLimbIschaemia = 5,
    Asthma = 6,
    ChronicObstructivePulmonaryDisease = 7,
    AngioedemaHistory = 8,
    BilateralRenalArteryStenosis = 9,
    Pregnancy = 10,
    Type1Diabetes = 11,
    Type2Diabetes = 12,
    VolumeDepletion = 13,
}

/// <summary>A safety flag that is open for a class of medicine.</summary>
public sealed record OpenSafetyFlag(string RuleId, TitrationClass Class);
