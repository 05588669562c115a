using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Readings;

/// <summary>Where a reading came from.</summary>
public enum ReadingSource
{
    /// <summary>A file from home scales.</summary>
    HomeFile = 1,

    /// <summary>Called in by the patient and typed by staff.</summary>
    Phone = 2,

    /// <summary>Measured in the clinic.</summary>
    Clinic = 3,
}

/// <summary>What a reading counts as now.</summary>
public enum ReadingState
{
    Accepted = 1,

    /// <summary>Set aside with a likely reason until a person decides.</summary>
    Held = 2,

    /// <summary>Taken out as an error; stays visible.</summary>
    StruckOut = 3,

    /// <summary>Replaced by a correction; stays visible.</summary>
    Superseded = 4,
}

/// <summary>One measured value of one kind at one time. The value is never changed: decisions about it are added.</summary>
public sealed class Reading
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    public ReadingKind Kind { get; set; }

    /// <summary>UTC.</summary>
    public DateTime MeasuredAt { get; set; }

    /// <summary>The clinic day, in the clinic's time zone when it was recorded.</summary>
    public DateOnly Day { get; set; }

    /// <summary>In the unit of the kind: grams, mmHg, beats per minute, percent.</summary>
    public int Value { get; set; }

    /// <summary>The value with its unit as typed or as in the file: "164.5 lb".</summary>
    public string? AsTyped { get; set; }

    public ReadingSource Source { get; set; }

    public string? Device { get; set; }

    public ReadingState State { get; set; } = ReadingState.Accepted;

    /// <summary>The state it was recorded with; later states are in <see cref="ReadingDecision"/>.</summary>
    public ReadingState FirstState { get; set; } = ReadingState.Accepted;

    public HoldReason? HoldReason { get; set; }

    /// <summary>UTC; when it entered the record.</summary>
    public DateTime RecordedAt { get; set; }

    public Guid? RecordedById { get; set; }

    /// <summary>The reading this one corrects.</summary>
    public long? SupersedesId { get; set; }

    public long? ImportId { get; set; }
}

internal sealed class ReadingMapping : IEntityTypeConfiguration<Reading>
{
    public void Configure(EntityTypeBuilder<Reading> reading)
    {
        reading.HasOne<Patient>().WithMany().HasForeignKey(r => r.PatientId).OnDelete(DeleteBehavior.Restrict);
        reading.HasIndex(r => new { r.PatientId, r.Kind, r.MeasuredAt, r.Value }).IsUnique().HasFilter("\"SupersedesId\" IS NULL");
        reading.HasIndex(r => new { r.PatientId, r.Day });
        reading.HasIndex(r => r.State).HasFilter("\"State\" = 2");
        reading.Property(r => r.AsTyped).HasMaxLength(40);
        reading.Property(r => r.Device).HasMaxLength(60);
        reading.ToTable(t =>
        {
            t.HasCheckConstraint("CK_Readings_Value", """
                ("Kind" = 1 AND "Value" BETWEEN 25000 AND 300000) OR ("Kind" IN (2, 3) AND "Value" BETWEEN 20 AND 300)
                OR ("Kind" = 4 AND "Value" BETWEEN 20 AND 300) OR ("Kind" = 5 AND "Value" BETWEEN 30 AND 100)
                """);
            t.HasCheckConstraint("CK_Readings_State", "\"State\" BETWEEN 1 AND 4 AND \"FirstState\" BETWEEN 1 AND 2");
            t.HasCheckConstraint("CK_Readings_Held", "\"FirstState\" <> 2 OR \"HoldReason\" IS NOT NULL");
        });
    }
}
