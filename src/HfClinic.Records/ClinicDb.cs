using HfClinic.Records.Access;
using HfClinic.Records.Audit;
using HfClinic.Records.BloodTests;
using HfClinic.Records.Contacts;
using HfClinic.Records.Exchange;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Records.Reassessment;
using HfClinic.Records.Settings;
using HfClinic.Records.Storage;
using HfClinic.Records.Visits;
using Microsoft.AspNetCore.DataProtection.EntityFrameworkCore;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Identity.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records;

/// <summary>The clinic's record, on SQLite or PostgreSQL.</summary>
public sealed class ClinicDb(DbContextOptions<ClinicDb> options)
    : IdentityDbContext<ClinicUser, IdentityRole<Guid>, Guid>(options), IDataProtectionKeyContext
{
    public DbSet<Patient> Patients => Set<Patient>();

    public DbSet<TargetWeight> TargetWeights => Set<TargetWeight>();

    public DbSet<Reading> Readings => Set<Reading>();

    public DbSet<ReadingDecision> ReadingDecisions => Set<ReadingDecision>();

    public DbSet<SymptomReport> SymptomReports => Set<SymptomReport>();

    public DbSet<DoseCourse> DoseCourses => Set<DoseCourse>();

    public DbSet<BloodTest> BloodTests => Set<BloodTest>();

    public DbSet<Visit> Visits => Set<Visit>();

    public DbSet<EjectionFraction> EjectionFractions => Set<EjectionFraction>();

    public DbSet<Flag> Flags => Set<Flag>();

    public DbSet<FlagStep> FlagSteps => Set<FlagStep>();

    public DbSet<PatientSummary> PatientSummaries => Set<PatientSummary>();

    public DbSet<Contact> Contacts => Set<Contact>();

    public DbSet<Question> Questions => Set<Question>();

    public DbSet<PatientThreshold> PatientThresholds => Set<PatientThreshold>();

    public DbSet<ClinicSettings> Settings => Set<ClinicSettings>();

    public DbSet<SweepRun> SweepRuns => Set<SweepRun>();

    public DbSet<ImportRun> ImportRuns => Set<ImportRun>();

    public DbSet<ImportLine> ImportLines => Set<ImportLine>();

    public DbSet<AuditEntry> AuditEntries => Set<AuditEntry>();

    public DbSet<AuditHead> AuditHeads => Set<AuditHead>();

    public DbSet<DataProtectionKey> DataProtectionKeys => Set<DataProtectionKey>();

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder)
    {
        configurationBuilder.Properties<DateTime>().HaveConversion<UtcConverter>();
        configurationBuilder.Properties<DateTimeOffset>().HaveConversion<UtcOffsetConverter>();
    }

    protected override void OnModelCreating(ModelBuilder builder)
    {
        base.OnModelCreating(builder);
        builder.ApplyConfigurationsFromAssembly(typeof(ClinicDb).Assembly);
        builder.Entity<ClinicUser>().Property(user => user.DisplayName).HasMaxLength(ClinicUser.DisplayNameLength);
        builder.Entity<IdentityRole<Guid>>().HasData(ClinicRoles.Rows);
    }
}
