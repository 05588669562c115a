using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Questions;

/// <summary>What a nurse asks a prescriber about a patient, and the answer, word for word.</summary>
public sealed class Question
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    /// <summary>The flag it is about, if any.</summary>
    public long? FlagId { get; set; }

    public required string Text { get; set; }

    /// <summary>UTC.</summary>
    public DateTime AskedAt { get; set; }

    public Guid? AskedById { get; set; }

    public required string AskedByName { get; set; }

    public string? Answer { get; set; }

    public DateTime? AnsweredAt { get; set; }

    public Guid? AnsweredById { get; set; }

    public string? AnsweredByName { get; set; }

    /// <summary>When the asker, or another nurse, read the answer.</summary>
    public DateTime? AnswerSeenAt { get; set; }

    public string? AnswerSeenByName { get; set; }

    public int Version { get; set; }
}

internal sealed class QuestionMapping : IEntityTypeConfiguration<Question>
{
    public void Configure(EntityTypeBuilder<Question> question)
    {
        question.HasOne<Patient>().WithMany().HasForeignKey(q => q.PatientId).OnDelete(DeleteBehavior.Restrict);
        question.HasIndex(q => new { q.PatientId, q.AskedAt });
        question.HasIndex(q => q.AnsweredAt);
        question.Property(q => q.Text).HasMaxLength(4000);
        question.Property(q => q.Answer).HasMaxLength(4000);
        question.Property(q => q.AskedByName).HasMaxLength(100);
        question.Property(q => q.AnsweredByName).HasMaxLength(100);
        question.Property(q => q.AnswerSeenByName).HasMaxLength(100);
        question.Property(q => q.Version).IsConcurrencyToken();
    }
}
