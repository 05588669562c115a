using HfClinic.Clinical.Rules;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Flags;

/// <summary>What happened to a flag.</summary>
public enum FlagStepKind
{
    Raised = 1,

    /// <summary>The same finding again, with newer evidence.</summary>
    Joined = 2,
    Escalated = 3,
    NoLongerMet = 4,
    Seen = 5,
    PutOff = 6,

    /// <summary>Back on the list: the day has come, or the evidence grew.</summary>
    Woken = 7,
    Answered = 8,
    Cleared = 9,

    /// <summary>Answered or cleared, and now open again.</summary>
    Reopened = 10,
}

/// <summary>One step of a flag, as it was shown then. Added, never changed.</summary>
public sealed class FlagStep
{
    public long Id { get; set; }

    public long FlagId { get; set; }

    public long PatientId { get; set; }

    public FlagStepKind Kind { get; set; }

    /// <summary>UTC.</summary>
    public DateTime At { get; set; }

    public Guid? ById { get; set; }

    /// <summary>The person, or the part of the program that did it.</summary>
    public required string ByName { get; set; }

    public Urgency Urgency { get; set; }

    public required string Statement { get; set; }

    public string Limit { get; set; } = "";

    public string Caution { get; set; } = "";

    public string EvidenceJson { get; set; } = "[]";

    public int RuleVersion { get; set; }

    public int ProtocolVersion { get; set; }

    /// <summary>The answer, the reason for putting off, or what cleared it.</summary>
    public string? Note { get; set; }
}

internal sealed class FlagStepMapping : IEntityTypeConfiguration<FlagStep>
{
    public void Configure(EntityTypeBuilder<FlagStep> step)
    {
        step.HasOne<Flag>().WithMany().HasForeignKey(s => s.FlagId).OnDelete(DeleteBehavior.Restrict);
        step.HasIndex(s => s.FlagId);
        step.HasIndex(s => new { s.PatientId, s.At });
        step.Property(s => s.ByName).HasMaxLength(100);
        step.Property(s => s.Statement).HasMaxLength(400);
        step.Property(s => s.Limit).HasMaxLength(400);
        step.Property(s => s.Caution).HasMaxLength(400);
        step.Property(s => s.Note).HasMaxLength(2000);
    }
}
