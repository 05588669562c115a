using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Medicines;

/// <summary>One medicine at one dose from a day until a day. A dose change ends one and starts the next.</summary>
public sealed class DoseCourse
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    /// <summary>Generic name in lower case, with salt where it matters.</summary>
    public required string Medicine { get; set; }

    /// <summary>Milligrams at each taking.</summary>
    public decimal DoseMilligrams { get; set; }

    /// <summary>Takings a day; 0.5 is every other day.</summary>
    public decimal TimesDaily { get; set; }

    public DateOnly From { get; set; }

    /// <summary>The first day it no longer holds; null while current.</summary>
    public DateOnly? Until { get; set; }

    public string? Reason { get; set; }

    public string? EndedBecause { get; set; }

    /// <summary>UTC.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }

    public DateTime? StruckOutAt { get; set; }

    public string? StruckOutBecause { get; set; }
}

internal sealed class DoseCourseMapping : IEntityTypeConfiguration<DoseCourse>
{
    public void Configure(EntityTypeBuilder<DoseCourse> course)
    {
        course.HasOne<Patient>().WithMany().HasForeignKey(c => c.PatientId).OnDelete(DeleteBehavior.Restrict);
        course.HasIndex(c => new { c.PatientId, c.From });
        course.Property(c => c.Medicine).HasMaxLength(80);
        course.Property(c => c.DoseMilligrams).HasPrecision(10, 4);
        course.Property(c => c.TimesDaily).HasPrecision(5, 3);
        course.Property(c => c.Reason).HasMaxLength(400);
        course.Property(c => c.EndedBecause).HasMaxLength(400);
        course.Property(c => c.ByName).HasMaxLength(100);
        course.Property(c => c.StruckOutBecause).HasMaxLength(400);
        course.ToTable(t =>
        {
            t.HasCheckConstraint("CK_DoseCourses_Dates", "\"Until\" IS NULL OR \"Until\" >= \"From\"");
            t.HasCheckConstraint("CK_DoseCourses_Medicine", "\"Medicine\" <> ''");
        });
    }
}
