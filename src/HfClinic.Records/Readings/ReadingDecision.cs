using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Readings;

/// <summary>What a person decided about a reading: confirmed, corrected or struck out. Added, never changed.</summary>
public sealed class ReadingDecision
{
    public long Id { get; set; }

    public long ReadingId { get; set; }

    public long PatientId { get; set; }

    public ReadingState From { get; set; }

    public ReadingState To { get; set; }

    /// <summary>The reading that corrects it, if it was corrected.</summary>
    public long? ReplacementId { get; set; }

    public required string Reason { get; set; }

    /// <summary>UTC.</summary>
    public DateTime At { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }
}

internal sealed class ReadingDecisionMapping : IEntityTypeConfiguration<ReadingDecision>
{
    public void Configure(EntityTypeBuilder<ReadingDecision> decision)
    {
        decision.HasOne<Reading>().WithMany().HasForeignKey(d => d.ReadingId).OnDelete(DeleteBehavior.Restrict);
        decision.HasIndex(d => d.ReadingId);
        decision.HasIndex(d => new { d.PatientId, d.At });
        decision.Property(d => d.Reason).HasMaxLength(400);
        decision.Property(d => d.ByName).HasMaxLength(100);
    }
}
