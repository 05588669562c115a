using HfClinic.Clinical.Rules;
using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Flags;

/// <summary>
/// What the lists show of a patient, stored: written by reassessment only, so that a list costs what its rows cost.
/// </summary>
public sealed class PatientSummary
{
    public long PatientId { get; set; }

    /// <summary>Enrolled and weighing at home: stands on Daily weights.</summary>
    public bool OnDailyWeights { get; set; }

    public int? LastGrams { get; set; }

    public DateOnly? LastWeightDay { get; set; }

    /// <summary>UTC.</summary>
    public DateTime? LastWeightAt { get; set; }

    /// <summary>Grams against the lowest of the day before; null when there was none.</summary>
    public int? Gain1Day { get; set; }

    public int? Gain3Days { get; set; }

    public int? Gain7Days { get; set; }

    public int? TargetGrams { get; set; }

    public DateOnly? TargetFrom { get; set; }

    /// <summary>The day of the weight up to which the trend was computed; null while it learns this person's scatter.</summary>
    public DateOnly? TrendDay { get; set; }

    /// <summary>The weight with the scatter taken out, less the target, grams; null without a target.</summary>
    public int? ExcessGrams { get; set; }

    /// <summary>Standard error of <see cref="ExcessGrams"/>, also without a target.</summary>
    public int? ExcessErrorGrams { get; set; }

    public int? SlopeGramsPerWeek { get; set; }

    /// <summary>Half the width of the slope's 95 % interval.</summary>
    public int? SlopeBandGramsPerWeek { get; set; }

    /// <summary>Fluid against the person's own baseline, grams; negative below it.</summary>
    public int? FluidGrams { get; set; }

    /// <summary>Half the width of the 95 % interval of <see cref="FluidGrams"/>.</summary>
    public int? FluidBandGrams { get; set; }

    /// <summary>Fluid in standard deviations of this person's usual coming and going; for ordering, not for showing.</summary>
    public decimal? FluidScore { get; set; }

    /// <summary>Day-to-day scatter of this person's weights, one standard deviation in grams.</summary>
    public int? ScatterGrams { get; set; }

    /// <summary>Too few weights yet: only the plain limits are read.</summary>
    public bool IsLearning { get; set; }

    /// <summary>The whole 95 % interval of the slope lies above zero.</summary>
    public bool IsRising { get; set; }

    /// <summary>The whole 95 % interval of the slope lies below zero.</summary>
    public bool IsFalling { get; set; }

    /// <summary>The filtered line of the last days, for <see cref="Flags.TrendLine.Read"/>.</summary>
    public string TrendLine { get; set; } = "";

    /// <summary>The most urgent open flag that is not put off; null when there is none.</summary>
    public Urgency? WorstUrgency { get; set; }

    /// <summary>When the oldest open flag of that urgency was raised, UTC.</summary>
    public DateTime? WorstSince { get; set; }

    /// <summary>Statements of the open flags, the most urgent first, separated by "; ".</summary>
    public string Why { get; set; } = "";

    /// <summary>Rule identifiers of the open flags that are not put off, separated by spaces.</summary>
    public string OpenRules { get; set; } = "";

    /// <summary>What could not be told, and why, separated by "; ". Never shown as "fine".</summary>
    public string NotChecked { get; set; } = "";

    /// <summary>A rule failed for this patient: the row says so.</summary>
    public bool CheckFailed { get; set; }

    public int OpenFlags { get; set; }

    public int PutOffFlags { get; set; }

    public int HeldReadings { get; set; }

    public bool IsSilent { get; set; }

    /// <summary>Current loop diuretic with its dose in words.</summary>
    public string LoopDiuretic { get; set; } = "";

    public DateOnly? LastContactDay { get; set; }

    public string LastContact { get; set; } = "";

    public int OpenQuestions { get; set; }

    /// <summary>The clinic day this row was computed for.</summary>
    public DateOnly AsOf { get; set; }

    public int Version { get; set; }
}

internal sealed class PatientSummaryMapping : IEntityTypeConfiguration<PatientSummary>
{
    public void Configure(EntityTypeBuilder<PatientSummary> summary)
    {
        summary.HasKey(s => s.PatientId);
        summary.Property(s => s.PatientId).ValueGeneratedNever();
        summary.HasOne<Patient>().WithOne().HasForeignKey<PatientSummary>(s => s.PatientId).OnDelete(DeleteBehavior.Restrict);
        summary.HasIndex(s => new { s.OnDailyWeights, s.WorstUrgency, s.WorstSince });
        summary.Property(s => s.FluidScore).HasPrecision(8, 3);
        summary.Property(s => s.TrendLine).HasMaxLength(1000);
        summary.Property(s => s.OpenRules).HasMaxLength(1000);
        summary.Property(s => s.NotChecked).HasMaxLength(2000);
        summary.Property(s => s.Why).HasMaxLength(2000);
        summary.Property(s => s.LoopDiuretic).HasMaxLength(200);
        summary.Property(s => s.LastContact).HasMaxLength(200);
    }
}
