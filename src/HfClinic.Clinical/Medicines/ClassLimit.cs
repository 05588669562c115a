using System.Collections.Immutable;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>What a limit or a condition means for a step of a medicine, mildest first.</summary>
public enum LimitEffect
{
    /// <summary>No step is expected now.</summary>
    Hold = 1,

    /// <summary>The medicine is not asked for at all.</summary>
    Bars = 2,

    /// <summary>The prescriber looks, next working day.</summary>
    Review = 3,

    /// <summary>Same-day contact with a prescriber.</summary>
    Urgent = 4,
}

/// <summary>When a limit is read.</summary>
public enum LimitWhen
{
    Always,

    /// <summary>Before the medicine is started.</summary>
    Start,

    /// <summary>While it is taken.</summary>
    Treatment,
}

/// <summary>What is measured.</summary>
public enum LimitMeasure
{
    /// <summary>mmol/L.</summary>
    Potassium,

    /// <summary>µmol/L.</summary>
    Creatinine,

    /// <summary>Percent above the baseline before the latest step.</summary>
    CreatinineRise,

    /// <summary>mL/min/1.73 m².</summary>
    Egfr,

    /// <summary>mmHg.</summary>
    SystolicPressure,

    /// <summary>Beats per minute.</summary>
    HeartRate,
}

/// <summary>In which rhythm a limit counts.</summary>
public enum LimitRhythm
{
    Any,
    NotAtrialFibrillation,
}

/// <summary>A measured limit on a step of some classes; its figure and operator are the protocol's.</summary>
/// <param name="Medicines">Names it is meant for only; empty for all of the classes.</param>
public sealed record ClassLimit(
    string Key,
    ImmutableArray<MedicineClass> Classes,
    LimitMeasure Measure,
    string ThresholdKey,
    LimitEffect Effect,
    LimitWhen When,
    DoseProfile? Profile,
    LimitRhythm Rhythm,
    ImmutableArray<string> Medicines,
    string Words,
    ImmutableArray<string> SourceKeys,
    Standing Standing) : IPublished
{
    private const string File = "class-limits.json";

    /// <summary>The limits built into the program.</summary>
    public static ImmutableArray<ClassLimit> All { get; } = Parse(StrictTable.Text(File), SourceTable.Load(), ProtocolDefaults.Load());

    /// <summary>Reads the table.</summary>
    /// <exception cref="TableFaultException">The table is faulty: file, row and reason.</exception>
    public static ImmutableArray<ClassLimit> Parse(string json, SourceTable sources, ClinicProtocol protocol) =>
        StrictTable.Read<ClassLimit>(File, json, row => row.Key, row =>
            row.Classes.IsDefaultOrEmpty ? "no class is named"
            : !protocol.Thresholds.ContainsKey(row.ThresholdKey) ? $"the protocol has no threshold '{row.ThresholdKey}'"
            : SourceCheck.WhyRefused(row.SourceKeys, sources));

    /// <summary>Whether it is meant for that medicine, starting or on treatment.</summary>
    public bool IsFor(MedicineClass medicineClass, string? medicine, bool starting, DoseProfile profile) =>
        Classes.Contains(medicineClass)
        && (Profile is null || Profile == profile)
        && (When == LimitWhen.Always || (When == LimitWhen.Start) == starting)
        && (Medicines.IsEmpty || (medicine is not null && Medicines.Contains(medicine)));
}
