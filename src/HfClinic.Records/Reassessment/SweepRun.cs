using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Reassessment;

/// <summary>The morning sweep of one clinic day. The day is the key, so that only one server runs it.</summary>
public sealed class SweepRun
{
    public DateOnly Day { get; set; }

    /// <summary>UTC; who holds a day that is not finished may be overtaken some minutes after this.</summary>
    public DateTime HeldAt { get; set; }

    public Guid HeldBy { get; set; }

    public DateTime? FinishedAt { get; set; }

    /// <summary>The last patient done, so that an interrupted sweep goes on.</summary>
    public long LastPatientId { get; set; }

    public int Patients { get; set; }

    /// <summary>Patients whose assessment failed; they show it on their own rows too.</summary>
    public int Failed { get; set; }
}

internal sealed class SweepRunMapping : IEntityTypeConfiguration<SweepRun>
{
    public void Configure(EntityTypeBuilder<SweepRun> sweep)
    {
        sweep.HasKey(s => s.Day);
        sweep.Property(s => s.HeldBy).IsConcurrencyToken();
    }
}
