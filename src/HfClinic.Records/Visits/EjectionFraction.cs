using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Visits;

/// <summary>A left ventricular ejection fraction with its date and method.</summary>
public sealed class EjectionFraction
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    public DateOnly Day { get; set; }

    /// <summary>Percent, as reported.</summary>
    public decimal Percent { get; set; }

    public required string Method { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public DateTime? StruckOutAt { get; set; }

    public string? StruckOutBecause { get; set; }
}

internal sealed class EjectionFractionMapping : IEntityTypeConfiguration<EjectionFraction>
{
    public void Configure(EntityTypeBuilder<EjectionFraction> fraction)
    {
        fraction.HasOne<Patient>().WithMany().HasForeignKey(f => f.PatientId).OnDelete(DeleteBehavior.Restrict);
        fraction.HasIndex(f => new { f.PatientId, f.Day });
        fraction.Property(f => f.Percent).HasPrecision(5, 2);
        fraction.Property(f => f.Method).HasMaxLength(60);
        fraction.Property(f => f.ByName).HasMaxLength(100);
        fraction.Property(f => f.StruckOutBecause).HasMaxLength(400);
        // SQLite keeps decimals as text, and would compare them as text.
        fraction.ToTable(t => t.HasCheckConstraint("CK_EjectionFractions_Percent", "CAST(\"Percent\" AS REAL) BETWEEN 5 AND 90"));
    }
}
