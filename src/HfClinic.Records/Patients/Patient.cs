using HfClinic.Clinical.Values;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Patients;

/// <summary>A person enrolled in the clinic.</summary>
public sealed class Patient
{
    public const int NameLength = 80;
    public const int ClinicNumberLength = 20;
    public const int PhoneLength = 40;
    public const int SearchTextLength = 400;

    public long Id { get; set; }

    /// <summary>The clinic's own number for this person; unique, kept in upper case.</summary>
    public required string ClinicNumber { get; set; }

    public required string FamilyName { get; set; }

    public required string GivenName { get; set; }

    /// <summary>Names and number folded for searching: see <see cref="SearchFolding"/>.</summary>
    public string SearchText { get; set; } = "";

    public DateOnly? BirthDate { get; set; }

    public Sex Sex { get; set; }

    public int? HeightCentimetres { get; set; }

    public string? Phone { get; set; }

    public DateOnly EnrolledOn { get; set; }

    /// <summary>The day the person left the clinic's care; null while enrolled.</summary>
    public DateOnly? LeftOn { get; set; }

    public string? LeftBecause { get; set; }

    /// <summary>Whether daily weights from home are expected.</summary>
    public bool WeighsAtHome { get; set; }

    /// <summary>Last discharge from hospital for heart failure.</summary>
    public DateOnly? DischargedFromHospitalOn { get; set; }

    /// <summary>The nurse who usually speaks with this person: the "mine" filter.</summary>
    public Guid? NurseId { get; set; }

    /// <summary>People who share a scale carry the same household word.</summary>
    public string? Household { get; set; }

    public string? Note { get; set; }

    /// <summary>Raised with every edit; a save with an older one is refused.</summary>
    public int Version { get; set; }

    public string FullName => $"{FamilyName}, {GivenName}";
}

internal sealed class PatientMapping : IEntityTypeConfiguration<Patient>
{
    public void Configure(EntityTypeBuilder<Patient> patient)
    {
        patient.Property(p => p.ClinicNumber).HasMaxLength(Patient.ClinicNumberLength);
        patient.Property(p => p.FamilyName).HasMaxLength(Patient.NameLength);
        patient.Property(p => p.GivenName).HasMaxLength(Patient.NameLength);
        patient.Property(p => p.SearchText).HasMaxLength(Patient.SearchTextLength);
        patient.Property(p => p.Phone).HasMaxLength(Patient.PhoneLength);
        patient.Property(p => p.LeftBecause).HasMaxLength(400);
        patient.Property(p => p.Household).HasMaxLength(40);
        patient.Property(p => p.Note).HasMaxLength(2000);
        patient.Property(p => p.Version).IsConcurrencyToken();
        patient.Ignore(p => p.FullName);
        patient.HasIndex(p => p.ClinicNumber).IsUnique();
        patient.HasIndex(p => p.Household);
        patient.ToTable(t =>
        {
            t.HasCheckConstraint("CK_Patients_ClinicNumber", "\"ClinicNumber\" <> ''");
            t.HasCheckConstraint("CK_Patients_Height", "\"HeightCentimetres\" IS NULL OR \"HeightCentimetres\" BETWEEN 100 AND 230");
            t.HasCheckConstraint("CK_Patients_Left", "\"LeftOn\" IS NULL OR \"LeftOn\" >= \"EnrolledOn\"");
        });
    }
}
