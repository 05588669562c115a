using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Exchange;

/// <summary>A new weight to be screened.</summary>
internal sealed record NewWeight(ReadingLine Line, long PatientId)
{
    /// <summary>Why it is set aside; null when accepted.</summary>
    public HoldReason? Held { get; set; }
}

/// <summary>
/// Screens the weights of a file, patient by patient in order of time, among what is on record already. A patient's screen is carried
/// from batch to batch while nobody else changes the patient and the file goes forward in time; otherwise it is built anew from the record.
/// </summary>
internal sealed class WeightScreens
{
    private const int HistoryDays = 100;
    private const int PatientsAtOnce = 200;
    private const int MostCarried = 20_000;

    private readonly Dictionary<long, Carried> carried = [];

    /// <summary>Forgets everything carried, for example after a batch that did not hold.</summary>
    public void Clear() => carried.Clear();

    /// <summary>Screens the weights of one batch. The patients are held by the piece of work.</summary>
    /// <param name="versions">The patients' versions after they were held for this batch.</param>
    public async Task ScreenAsync(
        WorkScope scope, IReadOnlyCollection<NewWeight> weights, IReadOnlyDictionary<long, int> versions, CancellationToken cancellation)
    {
        if (carried.Count > MostCarried)
        {
            carried.Clear();
        }

        var patients = weights.GroupBy(weight => weight.PatientId)
            .Select(group => group.OrderBy(weight => weight.Line.LocalTime).ThenBy(weight => weight.Line.Source.Number).ToList())
            .OrderBy(group => group[0].Line.Day).ToList();
        foreach (var known in patients.Where(group => CanGoOn(group, versions)))
        {
            var screen = carried[known[0].PatientId];
            Take(screen, known, [], scope.Clock);
            screen.Version = versions[known[0].PatientId];
        }

        foreach (var chunk in patients.Where(group => !IsCurrent(group[0].PatientId, versions)).Chunk(PatientsAtOnce))
        {
            await BuildAsync(scope, chunk, versions, cancellation);
        }
    }

    private bool CanGoOn(List<NewWeight> group, IReadOnlyDictionary<long, int> versions) =>
        carried.TryGetValue(group[0].PatientId, out var screen)
        && screen.Version + 1 == versions[group[0].PatientId] && screen.LastDay <= group[0].Line.Day;

    private bool IsCurrent(long patientId, IReadOnlyDictionary<long, int> versions) =>
        carried.TryGetValue(patientId, out var screen) && screen.Version == versions[patientId];

    private async Task BuildAsync(
        WorkScope scope, List<NewWeight>[] groups, IReadOnlyDictionary<long, int> versions, CancellationToken cancellation)
    {
        var db = scope.Db;
        var ids = groups.Select(group => group[0].PatientId).ToList();
        var from = groups[0][0].Line.Day.AddDays(-HistoryDays);
        var onRecord = (await db.Readings.AsNoTracking()
            .Where(reading => ids.Contains(reading.PatientId) && reading.Kind == ReadingKind.Weight && reading.Day >= from
                && (reading.State == ReadingState.Accepted || reading.State == ReadingState.Held))
            .Select(reading => new Recorded(reading.PatientId, reading.MeasuredAt, reading.Day, reading.Value, reading.State == ReadingState.Held))
            .ToListAsync(cancellation)).ToLookup(recorded => recorded.PatientId);
        var targets = await TargetsAsync(db, ids, cancellation);
        var households = await HouseholdWeights.OfAsync(db, ids, cancellation);
        foreach (var group in groups)
        {
            var patientId = group[0].PatientId;
            var screen = new Carried(new ReadingScreen(TargetOn(targets[patientId], group[0].Line.Day)), households[patientId].ToList())
            {
                Version = versions[patientId],
            };
            var known = onRecord[patientId].Where(recorded => recorded.Day >= group[0].Line.Day.AddDays(-HistoryDays)).ToList();
            Take(screen, group, known, scope.Clock);
            carried[patientId] = screen;
            if (known.Exists(recorded => recorded.Day > screen.LastDay))
            {
                carried.Remove(patientId);
            }
        }
    }

    /// <summary>Weights on record go in unchecked before a new one of the same moment; held ones are screened again, so that a second alike confirms.</summary>
    private static void Take(Carried screen, List<NewWeight> weights, List<Recorded> known, ClinicClock clock)
    {
        var onRecord = new Queue<Recorded>(known.OrderBy(recorded => recorded.MeasuredAt));
        foreach (var weight in weights)
        {
            while (onRecord.TryPeek(out var next) && next.MeasuredAt <= weight.Line.MeasuredAt)
            {
                TakeRecorded(screen, onRecord.Dequeue(), clock);
            }

            var screened = screen.Screen.Take(weight.Line.LocalTime, weight.Line.Weight!.Value, screen.Household);
            weight.Held = screened.Verdict == ScreenVerdict.Held ? screened.Reason ?? HoldReason.Unexplained : null;
            screen.LastDay = weight.Line.Day;
        }
    }

    private static void TakeRecorded(Carried screen, Recorded recorded, ClinicClock clock)
    {
        var localTime = clock.ToLocal(recorded.MeasuredAt);
        if (recorded.IsHeld)
        {
            screen.Screen.Take(localTime, new Weight(recorded.Grams), screen.Household);
        }
        else
        {
            screen.Screen.Accept(localTime, new Weight(recorded.Grams));
        }
    }

    private static async Task<ILookup<long, (DateOnly From, int Grams)>> TargetsAsync(ClinicDb db, List<long> ids, CancellationToken cancellation) =>
        (await db.TargetWeights.AsNoTracking().Where(target => ids.Contains(target.PatientId) && target.StruckOutAt == null)
            .OrderBy(target => target.From).ThenBy(target => target.Id)
            .Select(target => new { target.PatientId, target.From, target.Grams }).ToListAsync(cancellation))
        .ToLookup(target => target.PatientId, target => (target.From, target.Grams));

    private static Weight? TargetOn(IEnumerable<(DateOnly From, int Grams)> targets, DateOnly day) =>
        targets.Where(target => target.From <= day).Select(target => (Weight?)new Weight(target.Grams)).LastOrDefault();

    private sealed record Recorded(long PatientId, DateTime MeasuredAt, DateOnly Day, int Grams, bool IsHeld);

    private sealed class Carried(ReadingScreen screen, List<Weight> household)
    {
        public ReadingScreen Screen => screen;

        public List<Weight> Household => household;

        public DateOnly LastDay { get; set; }

        public int Version { get; set; }
    }
}
