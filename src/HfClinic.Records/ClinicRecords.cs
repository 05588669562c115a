using HfClinic.Clinical.Sources;
using HfClinic.Records.Access;
using HfClinic.Records.Audit;
using HfClinic.Records.Chart;
using HfClinic.Records.Contacts;
using HfClinic.Records.DailyWeights;
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
using HfClinic.Records.Work;
using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.DependencyInjection.Extensions;

namespace HfClinic.Records;

/// <summary>Puts the clinic's record together.</summary>
public static class ClinicRecords
{
    /// <summary>Everything below the browser: database, people, verbs, queries, reassessment.</summary>
    public static IServiceCollection AddClinicRecords(this IServiceCollection services, Func<IServiceProvider, StorageChoice> storage)
    {
        services.AddDbContextFactory<ClinicDb>((provider, options) => storage(provider).Configure(options));
        services.TryAddSingleton(TimeProvider.System);
        services.AddSingleton<CurrentSettings>();
        services.AddSingleton<ClinicClock>();
        services.AddSingleton<ClinicStorage>();
        services.AddSingleton<ClinicFeed>();
        services.AddSingleton<ProtocolInForce>();
        services.AddSingleton<PatientPictureLoader>();
        services.AddSingleton<SummaryWriter>();
        services.AddSingleton<ReassessPatient>();
        services.AddSingleton<MorningSweep>();
        services.AddSingleton<ClinicWork>();
        AddVerbs(services);
        AddQueries(services);
        AddPeople(services);
        return services;
    }

    private static void AddVerbs(IServiceCollection services)
    {
        services.AddSingleton<EnrolPatient>();
        services.AddSingleton<EditPatient>();
        services.AddSingleton<LeaveClinic>();
        services.AddSingleton<SetTargetWeight>();
        services.AddSingleton<RecordReadings>();
        services.AddSingleton<DecideReading>();
        services.AddSingleton<StrikeOutSymptoms>();
        services.AddSingleton<RecordContact>();
        services.AddSingleton<AnswerFlag>();
        services.AddSingleton<PutOffFlag>();
        services.AddSingleton<MarkFlagsSeen>();
        services.AddSingleton<AskQuestion>();
        services.AddSingleton<AnswerQuestion>();
        services.AddSingleton<MedicineCourses>();
        services.AddSingleton<SetPatientThreshold>();
        services.AddSingleton<AuditVerification>();
        services.TryAddSingleton(new ImportLimits());
        services.AddSingleton<ImportAftermath>();
        services.AddSingleton<ImportFile>();
    }

    private static void AddQueries(IServiceCollection services)
    {
        services.AddSingleton<DailyWeightsQuery>();
        services.AddSingleton<WeightStripQuery>();
        services.AddSingleton<DailyListQuery>();
        services.AddSingleton<WhyQuery>();
        services.AddSingleton<PatientSearch>();
        services.AddSingleton<ChartQuery>();
        services.AddSingleton<QuestionsQuery>();
        services.AddSingleton<FlagBehaviourQuery>();
        services.AddSingleton<AuditQuery>();
        services.AddSingleton(_ => SourceTable.Load());
        services.AddSingleton<ImportReports>();
    }

    private static void AddPeople(IServiceCollection services)
    {
        services.AddIdentityCore<ClinicUser>(options =>
            {
                options.Password.RequiredLength = 12;
                options.Password.RequireDigit = false;
                options.Password.RequireLowercase = false;
                options.Password.RequireUppercase = false;
                options.Password.RequireNonAlphanumeric = false;
                options.Lockout.MaxFailedAccessAttempts = 5;
                options.Lockout.DefaultLockoutTimeSpan = TimeSpan.FromMinutes(15);
                options.Lockout.AllowedForNewUsers = true;
                options.User.RequireUniqueEmail = false;
            })
            .AddRoles<IdentityRole<Guid>>()
            .AddEntityFrameworkStores<ClinicDb>()
            .AddClaimsPrincipalFactory<ClinicClaims>()
            .AddDefaultTokenProviders();
        services.AddDataProtection().SetApplicationName("HfClinic").PersistKeysToDbContext<ClinicDb>();
        services.AddScoped<People>();
        services.AddScoped<ResponsibleNurses>();
        services.AddScoped<SetUpClinic>();
    }
}
