using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Exchange;

/// <summary>What a file holds.</summary>
public enum ImportKind
{
    Roster = 1,
    HomeReadings = 2,
}

/// <summary>One reading-in of a file.</summary>
public sealed class ImportRun
{
    public long Id { get; set; }

    public ImportKind Kind { get; set; }

    public required string FileName { get; set; }

    /// <summary>UTC.</summary>
    public DateTime StartedAt { get; set; }

    public DateTime? FinishedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public int Lines { get; set; }

    public int Accepted { get; set; }

    public int Duplicates { get; set; }

    public int Held { get; set; }

    public int Refused { get; set; }
}

/// <summary>A line of a file that did not simply go in: what came of it and how to mend it.</summary>
public sealed class ImportLine
{
    public long Id { get; set; }

    public long ImportId { get; set; }

    public int LineNumber { get; set; }

    public ImportLineOutcome Outcome { get; set; }

    public required string Reason { get; set; }

    public string Mend { get; set; } = "";

    /// <summary>The line as it stood in the file, cut at 400 characters.</summary>
    public string Text { get; set; } = "";
}

public enum ImportLineOutcome
{
    Accepted = 1,
    Duplicate = 2,
    Held = 3,
    Refused = 4,
}

internal sealed class ImportRunMapping : IEntityTypeConfiguration<ImportRun>
{
    public void Configure(EntityTypeBuilder<ImportRun> import)
    {
        import.Property(i => i.FileName).HasMaxLength(260);
        import.Property(i => i.ByName).HasMaxLength(100);
        import.HasIndex(i => i.StartedAt);
    }
}

internal sealed class ImportLineMapping : IEntityTypeConfiguration<ImportLine>
{
    public void Configure(EntityTypeBuilder<ImportLine> line)
    {
        line.HasOne<ImportRun>().WithMany().HasForeignKey(l => l.ImportId).OnDelete(DeleteBehavior.Cascade);
        line.HasIndex(l => new { l.ImportId, l.LineNumber });
        line.Property(l => l.Reason).HasMaxLength(200);
        line.Property(l => l.Mend).HasMaxLength(400);
        line.Property(l => l.Text).HasMaxLength(400);
    }
}
