using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Readings;

/// <summary>Symptoms as told by the patient on one day.</summary>
public sealed class SymptomReport
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    public DateOnly Day { get; set; }

    public Symptoms Symptoms { get; set; }

    public string? Note { get; set; }

    public ReadingSource Source { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public DateTime? StruckOutAt { get; set; }

    public string? StruckOutBecause { get; set; }
}

internal sealed class SymptomReportMapping : IEntityTypeConfiguration<SymptomReport>
{
    public void Configure(EntityTypeBuilder<SymptomReport> report)
    {
        report.HasOne<Patient>().WithMany().HasForeignKey(r => r.PatientId).OnDelete(DeleteBehavior.Restrict);
        report.HasIndex(r => new { r.PatientId, r.Day });
        report.Property(r => r.Note).HasMaxLength(1000);
        report.Property(r => r.ByName).HasMaxLength(100);
        report.Property(r => r.StruckOutBecause).HasMaxLength(400);
    }
}
