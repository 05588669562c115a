using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Flags;

/// <summary>
/// A finding that lives: raised, seen, answered, cleared. Its identity is patient, rule, subject and episode start.
/// It carries the latest statement; everything ever shown is in its <see cref="FlagStep"/> rows.
/// </summary>
public sealed class Flag
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    public required string RuleId { get; set; }

    public string Subject { get; set; } = "";

    public DateOnly EpisodeStart { get; set; }

    public FlagState State { get; set; }

    public Urgency Urgency { get; set; }

    public required string Statement { get; set; }

    public string Limit { get; set; } = "";

    /// <summary>What a person should keep in mind beside this flag; empty for most.</summary>
    public string Caution { get; set; } = "";

    /// <summary>The evidence of the latest step, as JSON.</summary>
    public string EvidenceJson { get; set; } = "[]";

    /// <summary>Source keys, separated by spaces.</summary>
    public string SourceKeys { get; set; } = "";

    public decimal? Magnitude { get; set; }

    public int RuleVersion { get; set; }

    public int ProtocolVersion { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RaisedAt { get; set; }

    /// <summary>The clinic day on which the data last met the limit.</summary>
    public DateOnly LastMetOn { get; set; }

    /// <summary>The clinic day from which the data no longer meet the limit though nobody has answered yet.</summary>
    public DateOnly? NoLongerMetOn { get; set; }

    public DateTime? SeenAt { get; set; }

    public string? SeenByName { get; set; }

    /// <summary>Kept off the list until this day.</summary>
    public DateOnly? PutOffUntil { get; set; }

    public string? PutOffBecause { get; set; }

    public DateTime? AnsweredAt { get; set; }

    public DateOnly? AnsweredOn { get; set; }

    public string? AnsweredByName { get; set; }

    /// <summary>The last day the answer stands, where a person set one.</summary>
    public DateOnly? AnswerStandsUntil { get; set; }

    public string? Answer { get; set; }

    public DateTime? ClearedAt { get; set; }

    public string? ClearedBecause { get; set; }

    public int Version { get; set; }
}

internal sealed class FlagMapping : IEntityTypeConfiguration<Flag>
{
    public void Configure(EntityTypeBuilder<Flag> flag)
    {
        flag.HasOne<Patient>().WithMany().HasForeignKey(f => f.PatientId).OnDelete(DeleteBehavior.Restrict);
        flag.HasIndex(f => new { f.PatientId, f.State });
        flag.HasIndex(f => new { f.PatientId, f.RuleId, f.Subject }).IsUnique().HasFilter("\"State\" = 1");
        flag.HasIndex(f => f.RaisedAt);
        flag.Property(f => f.RuleId).HasMaxLength(60);
        flag.Property(f => f.Subject).HasMaxLength(80);
        flag.Property(f => f.Statement).HasMaxLength(400);
        flag.Property(f => f.Limit).HasMaxLength(400);
        flag.Property(f => f.Caution).HasMaxLength(400);
        flag.Property(f => f.SourceKeys).HasMaxLength(200);
        flag.Property(f => f.Magnitude).HasPrecision(14, 4);
        flag.Property(f => f.SeenByName).HasMaxLength(100);
        flag.Property(f => f.PutOffBecause).HasMaxLength(400);
        flag.Property(f => f.AnsweredByName).HasMaxLength(100);
        flag.Property(f => f.Answer).HasMaxLength(2000);
        flag.Property(f => f.ClearedBecause).HasMaxLength(400);
        flag.Property(f => f.Version).IsConcurrencyToken();
    }
}
