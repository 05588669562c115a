using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Audit;

/// <summary>One line of the record of access: who did or opened what, when, with the values before and after.</summary>
public sealed class AuditEntry
{
    /// <summary>Counted up without gaps, so that a missing line shows.</summary>
    public long Id { get; set; }

    /// <summary>UTC.</summary>
    public DateTime At { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public long? PatientId { get; set; }

    /// <summary>What was done: "Target weight added", "Chart opened".</summary>
    public required string What { get; set; }

    /// <summary>JSON of the values before, of what changed only.</summary>
    public string? Before { get; set; }

    /// <summary>JSON of the values after, of what changed only.</summary>
    public string? After { get; set; }

    /// <summary>SHA-256 over the line before and this line, in hexadecimal.</summary>
    public required string Hash { get; set; }
}

/// <summary>The end of the audit chain: one row, whose lock puts audit lines in order.</summary>
public sealed class AuditHead
{
    public const int OnlyId = 1;

    public int Id { get; set; } = OnlyId;

    public long LastId { get; set; }

    public required string LastHash { get; set; }
}

internal sealed class AuditEntryMapping : IEntityTypeConfiguration<AuditEntry>
{
    public void Configure(EntityTypeBuilder<AuditEntry> entry)
    {
        entry.Property(e => e.Id).ValueGeneratedNever();
        entry.HasIndex(e => e.At);
        entry.HasIndex(e => new { e.PatientId, e.At });
        entry.Property(e => e.ByName).HasMaxLength(100);
        entry.Property(e => e.What).HasMaxLength(200);
        entry.Property(e => e.Hash).HasMaxLength(64);
    }
}

internal sealed class AuditHeadMapping : IEntityTypeConfiguration<AuditHead>
{
    public void Configure(EntityTypeBuilder<AuditHead> head)
    {
        head.Property(h => h.Id).ValueGeneratedNever();
        head.Property(h => h.LastHash).HasMaxLength(64);
        head.HasData(new AuditHead { LastId = 0, LastHash = "" });
    }
}
