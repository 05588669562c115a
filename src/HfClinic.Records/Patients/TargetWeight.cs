using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Patients;

/// <summary>The weight the prescriber wants from a day on. Never overwritten: a new one follows, a wrong one is struck out.</summary>
public sealed class TargetWeight
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    public DateOnly From { get; set; }

    public int Grams { get; set; }

    public string? Reason { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public DateTime RecordedAt { get; set; }

    public DateTime? StruckOutAt { get; set; }

    public string? StruckOutBecause { get; set; }
}

internal sealed class TargetWeightMapping : IEntityTypeConfiguration<TargetWeight>
{
    public void Configure(EntityTypeBuilder<TargetWeight> target)
    {
        target.HasOne<Patient>().WithMany().HasForeignKey(t => t.PatientId).OnDelete(DeleteBehavior.Restrict);
        target.HasIndex(t => new { t.PatientId, t.From });
        target.Property(t => t.Reason).HasMaxLength(400);
        target.Property(t => t.ByName).HasMaxLength(100);
        target.Property(t => t.StruckOutBecause).HasMaxLength(400);
        target.ToTable(t => t.HasCheckConstraint("CK_TargetWeights_Grams", "\"Grams\" BETWEEN 25000 AND 300000"));
    }
}
