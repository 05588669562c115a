using HfClinic.Clinical.Rules;
using HfClinic.Records.BloodTests;
using HfClinic.Records.Contacts;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Records.Visits;

namespace HfClinic.Records.Chart;

/// <summary>Everything on record of one patient, except the readings, which come page by page. Struck-out entries are included.</summary>
public sealed record PatientChart
{
    public required Patient Patient { get; init; }

    /// <summary>The responsible nurse's name, or null.</summary>
    public string? NurseName { get; init; }

    public required PatientSummary Summary { get; init; }

    /// <summary>The latest day first.</summary>
    public required IReadOnlyList<TargetWeight> TargetWeights { get; init; }

    /// <summary>Current courses first, then the latest start first.</summary>
    public required IReadOnlyList<DoseCourse> DoseCourses { get; init; }

    /// <summary>The latest sample first.</summary>
    public required IReadOnlyList<BloodTest> BloodTests { get; init; }

    /// <summary>The latest first.</summary>
    public required IReadOnlyList<EjectionFraction> EjectionFractions { get; init; }

    /// <summary>The latest first.</summary>
    public required IReadOnlyList<Visit> Visits { get; init; }

    /// <summary>The latest day first.</summary>
    public required IReadOnlyList<SymptomReport> SymptomReports { get; init; }

    /// <summary>The latest first.</summary>
    public required IReadOnlyList<Contact> Contacts { get; init; }

    /// <summary>The latest first.</summary>
    public required IReadOnlyList<Question> Questions { get; init; }

    /// <summary>Open flags first, the most urgent first; then the others, the latest first.</summary>
    public required IReadOnlyList<ChartFlag> Flags { get; init; }

    /// <summary>The prescriber's own thresholds for this patient, those that hold first; ended ones stay.</summary>
    public required IReadOnlyList<PatientThreshold> OwnThresholds { get; init; }

    /// <summary>The clinic's thresholds.</summary>
    public required ClinicProtocol ClinicProtocol { get; init; }

    /// <summary>The ejection fraction that holds: the latest not struck out.</summary>
    public EjectionFraction? LatestEjectionFraction => EjectionFractions.FirstOrDefault(fraction => fraction.StruckOutAt is null);

    /// <summary>The latest visit at which a NYHA class was found.</summary>
    public Visit? LatestNyha => Visits.FirstOrDefault(visit => visit.NyhaClass is not null);
}

/// <summary>A flag with everything that happened to it, the earliest step first.</summary>
public sealed record ChartFlag(Flag Flag, IReadOnlyList<FlagStep> Steps);

/// <summary>A reading with what was decided about it, the earliest decision first.</summary>
/// <param name="RecordedByName">Null for a file and for the program.</param>
public sealed record ChartReading(Reading Reading, string? RecordedByName, IReadOnlyList<ReadingDecision> Decisions);
