using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>What may speak against a step without being a measured value.</summary>
public enum Against
{
    SymptomaticHypotension,
    Congestion,
    RecentDecompensation,
    NyhaFour,
    HighGradeAvBlock,
    SickSinus,
    CardiogenicShock,
    CriticalLimbIschaemia,
    Asthma,
    AngioedemaHistory,
    BilateralRenalArteryStenosis,
    Pregnancy,
    Type1Diabetes,
    VolumeDepletion,
}

/// <summary>A condition that holds or bars some classes.</summary>
/// <param name="Medicines">Names it is meant for only; empty for all of the classes.</param>
public sealed record ClassCondition(
    string Key,
    Against Condition,
    ImmutableArray<MedicineClass> Classes,
    LimitEffect Effect,
    LimitWhen When,
    ImmutableArray<string> Medicines,
    string Words,
    ImmutableArray<string> SourceKeys,
    Standing Standing) : IPublished
{
    private const string File = "class-conditions.json";

    /// <summary>The conditions built into the program.</summary>
    public static ImmutableArray<ClassCondition> All { get; } = Parse(StrictTable.Text(File), SourceTable.Load());

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<ClassCondition> Parse(string json, SourceTable sources) =>
        StrictTable.Read<ClassCondition>(File, json, row => row.Key, row =>
            row.Classes.IsDefaultOrEmpty ? "no class is named" : SourceCheck.WhyRefused(row.SourceKeys, sources));

    /// <inheritdoc cref="ClassLimit.IsFor"/>
    public bool IsFor(MedicineClass medicineClass, string? medicine, bool starting) =>
        Classes.Contains(medicineClass)
        && (When == LimitWhen.Always || (When == LimitWhen.Start) == starting)
        && (Medicines.IsEmpty || (medicine is not null && Medicines.Contains(medicine)));
}
