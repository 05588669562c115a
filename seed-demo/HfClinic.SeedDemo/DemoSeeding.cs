using System.Globalization;
using HfClinic.Clinical.Rules;
using HfClinic.Records.Access;
using HfClinic.Records.Readings;
using HfClinic.Records.Reassessment;
using HfClinic.Records.Work;
using HfClinic.SeedDemo.Days;
using HfClinic.SeedDemo.Stories;
using HfClinic.SeedDemo.Telling;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;

namespace HfClinic.SeedDemo;

/// <summary>
/// Fills the clinic in order of time: the people of the stories as they stood three weeks ago, then moment by moment what
/// happened with them, then everybody else, as of now.
/// </summary>
internal sealed class DemoSeeding(IServiceProvider services, SeedClock clock, DemoDays days, Team team, DateTimeOffset now)
{
    private const int FirstClinicNumber = 1000;
    /// <summary>Small, because every save looks through all rows of the piece of work.</summary>
    private const int BatchSize = 12;
    private const int ReportEvery = 60;
    private static readonly Actor Demo = Actor.Program("demo");
    private static readonly TimeOnly BeforeAnyMoment = new(7, 0);
    private readonly ClinicWork work = services.GetRequiredService<ClinicWork>();
    private readonly ILogger log = services.GetRequiredService<ILogger<DemoSeeding>>();

    public async Task RunAsync(int patients, CancellationToken cancellation)
    {
        var numbers = new Chance(1).Shuffled(patients);
        clock.MoveTo(days.Utc(Story.Begins, BeforeAnyMoment));
        var stories = StoryBook.All.Select((story, i) => (Number: i, Patient: StoryTelling.Tell(story, i))).ToList();
        var storyIds = await AddAsync(stories, numbers, cancellation);
        await TellAsync(storyIds, cancellation);

        clock.MoveTo(now);
        var quiet = new QuietPatients(days, ProtocolDefaults.Load());
        foreach (var batch in Enumerable.Range(stories.Count, patients - stories.Count).Chunk(BatchSize))
        {
            await AddAsync([.. batch.Select(number => (number, quiet.Draw(number, number - stories.Count)))], numbers, cancellation);
            if (batch[^1] / ReportEvery != (batch[0] - 1) / ReportEvery)
            {
                log.LogInformation("Demo clinic: {Done} of {Patients} patients.", batch[^1] + 1, patients);
            }
        }

        await FinishAsync(storyIds, patients, cancellation);
    }

    private Task<List<long>> AddAsync(List<(int Number, DemoPatient Patient)> patients, int[] clinicNumbers, CancellationToken cancellation) =>
        work.RunAsync(Demo, Capability.EnrolPatients, async scope =>
        {
            var rows = new PatientRows(scope, days, team);
            var ids = new List<long>();
            foreach (var (number, patient) in patients)
            {
                var clinicNumber = string.Create(CultureInfo.InvariantCulture, $"SM-{FirstClinicNumber + clinicNumbers[number]}");
                ids.Add(await rows.EnrolAsync(patient, number, clinicNumber, cancellation));
            }

            foreach (var (id, entry) in ids.Zip(patients))
            {
                rows.AddHistory(id, entry.Patient);
            }

            var readings = patients.Zip(ids, (entry, id) => rows.ReadingsOf(id, entry.Patient)).SelectMany(reading => reading);
            await ReadingBulk.InsertAsync(scope.Db, readings, cancellation);
            return ids;
        }, cancellation);

    private async Task TellAsync(List<long> storyIds, CancellationToken cancellation)
    {
        var moments = StoryBook.All.Zip(storyIds, (story, id) => story.Moments.Select(moment => (Moment: moment, PatientId: id)))
            .SelectMany(moment => moment).OrderBy(entry => entry.Moment.Day).ThenBy(entry => entry.Moment.At).ToList();
        foreach (var (moment, patientId) in moments)
        {
            clock.MoveTo(days.Utc(moment.Day, moment.At));
            await moment.Act(new Desk(services, team, days, patientId, cancellation));
        }
    }

    /// <summary>Everybody is assessed as of today, so today's sweep is done.</summary>
    private Task FinishAsync(List<long> storyIds, int patients, CancellationToken cancellation) =>
        work.RunAsync(Demo, Capability.EnrolPatients, async scope =>
        {
            await scope.TakePatientsAsync(storyIds, cancellation);
            scope.Db.SweepRuns.Add(new SweepRun { Day = scope.Today, HeldAt = scope.Now, FinishedAt = scope.Now, Patients = patients });
            scope.Note("Demo clinic made", detail: $"{patients} invented patients");
        }, cancellation);
}
