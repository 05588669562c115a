using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.BloodTests;

/// <summary>One laboratory result: as reported, and in the canonical unit of its analyte.</summary>
public sealed class BloodTest
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    /// <summary>Analyte key: "potassium", "creatinine" …</summary>
    public required string Analyte { get; set; }

    /// <summary>UTC; when the sample was taken.</summary>
    public DateTime TakenAt { get; set; }

    public DateOnly Day { get; set; }

    /// <summary>In the canonical unit of the analyte.</summary>
    public decimal Value { get; set; }

    public required string AsReported { get; set; }

    public required string UnitAsReported { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public DateTime? StruckOutAt { get; set; }

    public string? StruckOutBecause { get; set; }
}

internal sealed class BloodTestMapping : IEntityTypeConfiguration<BloodTest>
{
    public void Configure(EntityTypeBuilder<BloodTest> test)
    {
        test.HasOne<Patient>().WithMany().HasForeignKey(t => t.PatientId).OnDelete(DeleteBehavior.Restrict);
        test.HasIndex(t => new { t.PatientId, t.Analyte, t.TakenAt });
        test.Property(t => t.Analyte).HasMaxLength(40);
        test.Property(t => t.Value).HasPrecision(14, 4);
        test.Property(t => t.AsReported).HasMaxLength(40);
        test.Property(t => t.UnitAsReported).HasMaxLength(20);
        test.Property(t => t.ByName).HasMaxLength(100);
        test.Property(t => t.StruckOutBecause).HasMaxLength(400);
    }
}
