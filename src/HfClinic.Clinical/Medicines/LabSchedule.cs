using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>After which steps blood tests are due.</summary>
public enum LabAfter
{
    EachStep,

    /// <summary>After the start and after the step that reaches the target.</summary>
    StartAndTarget,
}

/// <summary>When potassium and creatinine are due after a step.</summary>
/// <param name="DueDays">Days after the step, ascending.</param>
/// <param name="ThenStable">Whether tests go on at the protocol's interval once all due days are past.</param>
public sealed record LabSchedule(
    string Key,
    ImmutableArray<MedicineClass> Classes,
    ImmutableArray<int> DueDays,
    bool ThenStable,
    LabAfter Only,
    ImmutableArray<string> SourceKeys,
    Standing Standing) : IPublished
{
    private const string File = "lab-schedule.json";

    private static readonly ImmutableArray<LabSchedule> All = Parse(StrictTable.Text(File), SourceTable.Load());

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<LabSchedule> Parse(string json, SourceTable sources) =>
        StrictTable.Read<LabSchedule>(File, json, row => row.Key, row =>
            row.Classes.IsDefaultOrEmpty ? "no class is named"
            : row.DueDays.IsDefaultOrEmpty || row.DueDays.Zip(row.DueDays.Skip(1)).Any(pair => pair.First >= pair.Second) ? "the due days are not sorted upwards"
            : SourceCheck.WhyRefused(row.SourceKeys, sources));

    /// <summary>The schedule of a class, or null when none is published.</summary>
    public static LabSchedule? For(MedicineClass medicineClass) => All.FirstOrDefault(row => row.Classes.Contains(medicineClass));
}
