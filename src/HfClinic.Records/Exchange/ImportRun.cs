using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Exchange;

/// <summary>What a file holds.</summary>
public enum ImportKind
{
    Roster = 1,
    HomeReadings = 2,
}

/// <summary>How far a reading-in came.</summary>
public enum ImportState
{
    /// <summary>Under way; when its server stopped, it is settled as <see cref="Interrupted"/> some minutes later.</summary>
    Running = 1,

    /// <summary>Every line was looked at and every patient touched was reassessed.</summary>
    Done = 2,

    /// <summary>Somebody stopped it. What was in is in; the same file may be read in again.</summary>
    Stopped = 3,

    /// <summary>A fault or a stopped server ended it. What was in is in; the same file may be read in again.</summary>
    Interrupted = 4,
}

/// <summary>One reading-in of a file.</summary>
public sealed class ImportRun
{
    public long Id { get; set; }

    public ImportKind Kind { get; set; }

    public required string FileName { get; set; }

    /// <summary>UTC.</summary>
    public DateTime StartedAt { get; set; }

    /// <summary>UTC; when every patient touched was reassessed as well.</summary>
    public DateTime? FinishedAt { get; set; }

    public ImportState State { get; set; } = ImportState.Running;

    /// <summary>UTC; a sign of life with each batch.</summary>
    public DateTime HeartbeatAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public int Lines { get; set; }

    /// <summary>Lines that went in, the later readings of a day included.</summary>
    public int Accepted { get; set; }

    /// <summary>Of these, later readings of a day: kept, but another stands for the day.</summary>
    public int Later { get; set; }

    public int Duplicates { get; set; }

    public int Held { get; set; }

    public int Refused { get; set; }
}

/// <summary>A line of a file that did not simply go in: what came of it and how to mend it.</summary>
public sealed class ImportLine
{
    /// <summary>Of each outcome this many lines are kept for the report; further ones are only counted.</summary>
    public const int MostKept = 50_000;

    public const int TextLength = 400;
    public const int ReasonLength = 200;
    public const int MendLength = 400;

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
        import.HasIndex(i => i.State).HasFilter("\"State\" = 1");
        import.ToTable(t => t.HasCheckConstraint("CK_ImportRuns_State", "\"State\" BETWEEN 1 AND 4"));
    }
}

internal sealed class ImportLineMapping : IEntityTypeConfiguration<ImportLine>
{
    public void Configure(EntityTypeBuilder<ImportLine> line)
    {
        line.HasOne<ImportRun>().WithMany().HasForeignKey(l => l.ImportId).OnDelete(DeleteBehavior.Cascade);
        line.HasIndex(l => new { l.ImportId, l.LineNumber });
        line.Property(l => l.Reason).HasMaxLength(ImportLine.ReasonLength);
        line.Property(l => l.Mend).HasMaxLength(ImportLine.MendLength);
        line.Property(l => l.Text).HasMaxLength(ImportLine.TextLength);
    }
}
