using HfClinic.Clinical.Values;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace HfClinic.Records.Settings;

/// <summary>The clinic's own settings: one row.</summary>
public sealed class ClinicSettings
{
    public const int OnlyId = 1;

    public int Id { get; set; } = OnlyId;

    public required string ClinicName { get; set; }

    /// <summary>IANA name of the clinic's time zone, which decides the clinic day.</summary>
    public required string TimeZone { get; set; }

    public WeightUnit WeightUnit { get; set; } = WeightUnit.Kilograms;

    /// <summary>True for a database made by the demo; it can never become a real clinic's, nor the other way round.</summary>
    public bool IsDemo { get; set; }

    public int Version { get; set; }
}

internal sealed class ClinicSettingsMapping : IEntityTypeConfiguration<ClinicSettings>
{
    public void Configure(EntityTypeBuilder<ClinicSettings> settings)
    {
        settings.Property(s => s.Id).ValueGeneratedNever();
        settings.Property(s => s.ClinicName).HasMaxLength(100);
        settings.Property(s => s.TimeZone).HasMaxLength(60);
        settings.Property(s => s.Version).IsConcurrencyToken();
        settings.ToTable(t => t.HasCheckConstraint("CK_Settings_OneRow", "\"Id\" = 1"));
    }
}
