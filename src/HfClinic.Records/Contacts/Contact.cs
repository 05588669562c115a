using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Contacts;

/// <summary>How a call or message went.</summary>
public enum ContactOutcome
{
    Spoke = 1,
    SpokeWithRelative = 2,
    LeftMessage = 3,
    NoAnswer = 4,
    SentMessage = 5,
}

/// <summary>A call or message and its outcome.</summary>
public sealed class Contact
{
    public long Id { get; set; }

    public long PatientId { get; set; }

    /// <summary>UTC.</summary>
    public DateTime At { get; set; }

    public DateOnly Day { get; set; }

    public ContactOutcome Outcome { get; set; }

    public string? Note { get; set; }

    public Guid? ById { get; set; }

    public required string ByName { get; set; }
}

internal sealed class ContactMapping : IEntityTypeConfiguration<Contact>
{
    public void Configure(EntityTypeBuilder<Contact> contact)
    {
        contact.HasOne<Patient>().WithMany().HasForeignKey(c => c.PatientId).OnDelete(DeleteBehavior.Restrict);
        contact.HasIndex(c => new { c.PatientId, c.At });
        contact.Property(c => c.Note).HasMaxLength(2000);
        contact.Property(c => c.ByName).HasMaxLength(100);
    }
}
