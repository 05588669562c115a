using HfClinic.Clinical.Flags;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Readings;
using HfClinic.Records.Work;
using HfClinic.SeedDemo.Days;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.SeedDemo.Telling;

/// <summary>One patient's record, open on the desk at one moment of a story.</summary>
internal sealed class Desk(IServiceProvider services, Team team, DemoDays days, long patientId, CancellationToken cancellation)
{
    public Actor Nurse => team.Nurse;

    public Actor Cardiologist => team.Cardiologist;

    public DemoDays Days => days;

    public long PatientId => patientId;

    public CancellationToken Cancellation => cancellation;

    public T Verb<T>()
        where T : notnull => services.GetRequiredService<T>();

    /// <summary>Has the rules read the patient's record as it stands at this moment.</summary>
    public Task LookAsync() => Verb<ClinicWork>().RunAsync(
        Actor.Program("demo"), Capability.ReadCharts, scope => scope.TakePatientsAsync([patientId], cancellation), cancellation);

    /// <summary>The open flag of a rule.</summary>
    public Task<long> FlagAsync(string ruleId) => ReadAsync(db => db.Flags
        .Where(flag => flag.PatientId == patientId && flag.RuleId == ruleId && flag.State == FlagState.Open)
        .Select(flag => flag.Id).SingleAsync(cancellation));

    /// <summary>All open flags.</summary>
    public Task<List<long>> OpenFlagsAsync() => ReadAsync(db => db.Flags
        .Where(flag => flag.PatientId == patientId && flag.State == FlagState.Open)
        .OrderBy(flag => flag.Id).Select(flag => flag.Id).ToListAsync(cancellation));

    /// <summary>The one reading that is held.</summary>
    public Task<long> HeldReadingAsync() => ReadAsync(db => db.Readings
        .Where(reading => reading.PatientId == patientId && reading.State == ReadingState.Held)
        .Select(reading => reading.Id).SingleAsync(cancellation));

    /// <summary>The question that waits for an answer.</summary>
    public Task<long> OpenQuestionAsync() => ReadAsync(db => db.Questions
        .Where(question => question.PatientId == patientId && question.AnsweredAt == null)
        .Select(question => question.Id).SingleAsync(cancellation));

    public async Task<T> ReadAsync<T>(Func<ClinicDb, Task<T>> read)
    {
        await using var db = await Verb<IDbContextFactory<ClinicDb>>().CreateDbContextAsync(cancellation);
        return await read(db);
    }
}
