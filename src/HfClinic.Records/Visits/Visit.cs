using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Visits;

public enum VisitKind
{
    Clinic = 1,
    Phone = 2,
    Home = 3,
}

/// <summary>A contact at which findings are taken.</summary>
public sealed class Visit
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    public DateOnly Day { get; set; }

    public VisitKind Kind { get; set; }

    /// <summary>New York Heart Association class, 1 to 4.</summary>
    public int? NyhaClass { get; set; }

    public string? Rhythm { get; set; }

    public string? Note { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }
}

internal sealed class VisitMapping : IEntityTypeConfiguration<Visit>
{
    public void Configure(EntityTypeBuilder<Visit> visit)
    {
        visit.HasOne<Patient>().WithMany().HasForeignKey(v => v.PatientId).OnDelete(DeleteBehavior.Restrict);
        visit.HasIndex(v => new { v.PatientId, v.Day });
        visit.Property(v => v.Rhythm).HasMaxLength(60);
        visit.Property(v => v.Note).HasMaxLength(4000);
        visit.Property(v => v.ByName).HasMaxLength(100);
        visit.ToTable(t => t.HasCheckConstraint("CK_Visits_Nyha", "\"NyhaClass\" IS NULL OR \"NyhaClass\" BETWEEN 1 AND 4"));
    }
}
