using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Protocol;

/// <summary>A prescriber's own threshold for one patient. A new one ends the one before; nothing is overwritten.</summary>
public sealed class PatientThreshold
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    /// <summary>Key of the protocol threshold it replaces.</summary>
    public required string Key { get; set; }

    /// <summary>In the unit of the threshold.</summary>
    public decimal Value { get; set; }

    public bool IsOn { get; set; }

    public required string Reason { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    /// <summary>UTC; null while it holds.</summary>
    public DateTime? EndedAt { get; set; }
}

internal sealed class PatientThresholdMapping : IEntityTypeConfiguration<PatientThreshold>
{
    public void Configure(EntityTypeBuilder<PatientThreshold> threshold)
    {
        threshold.HasOne<Patient>().WithMany().HasForeignKey(t => t.PatientId).OnDelete(DeleteBehavior.Restrict);
        threshold.HasIndex(t => new { t.PatientId, t.Key }).IsUnique().HasFilter("\"EndedAt\" IS NULL");
        threshold.Property(t => t.Key).HasMaxLength(60);
        threshold.Property(t => t.Value).HasPrecision(14, 4);
        threshold.Property(t => t.Reason).HasMaxLength(400);
        threshold.Property(t => t.ByName).HasMaxLength(100);
    }
}
