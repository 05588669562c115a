using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;

namespace HfClinic.Records.Exchange;

/// <summary>
/// Takes lines of home readings in: refuses what cannot be, passes over what is on record, sets aside weights that do not fit, adds the
/// rest in bulk. A line is refused as a whole. The patients are reassessed once, after the whole file.
/// </summary>
internal sealed class ReadingLines(FileMapping mapping, ClinicClock clock) : ILineTaker
{
    private readonly ReadingLineParser parser = new(mapping, clock);
    private readonly KnownPatients patients = new();
    private readonly WeightScreens screens = new();
    private readonly HashSet<long> owed = [];

    public int BatchSize => 2000;

    public IReadOnlyCollection<long> Owed => owed;

    public void Forget() => screens.Clear();

    public async Task<IReadOnlyList<LineOutcome>> TakeAsync(
        WorkScope scope, long importId, IReadOnlyList<CsvLine> lines, CancellationToken cancellation)
    {
        var now = clock.ToLocal(scope.Now);
        var parsed = lines.Select(line => parser.Parse(line, now)).ToList();
        var known = await patients.FindAsync(scope.Db, parsed.Select(line => line.ClinicNumber), cancellation);
        parsed.ForEach(line => CheckPatient(line, known));
        var good = parsed.Where(line => line.Faults.Count == 0).Select(line => new GoodLine(line, known[line.ClinicNumber].Id)).ToList();
        if (good.Count > 0)
        {
            await AddAsync(scope, importId, good, cancellation);
        }

        var outcomes = good.ToDictionary(line => line.Line, line => line.Outcome());
        return [.. parsed.Select(line => outcomes.TryGetValue(line, out var outcome)
            ? outcome
            : new LineOutcome(line.Source, ImportLineOutcome.Refused, LineFault.Joined(line.Faults)))];
    }

    private static void CheckPatient(ReadingLine line, IReadOnlyDictionary<string, KnownPatient> known)
    {
        if (line.ClinicNumber.Length == 0)
        {
            return;
        }

        if (!known.TryGetValue(line.ClinicNumber, out var patient))
        {
            line.Faults.Insert(0, LineFault.UnknownNumber);
        }
        else if (line.Faults.Count == 0 && line.Day > patient.LeftOn)
        {
            line.Faults.Add(LineFault.HasLeft);
        }
    }

    private async Task AddAsync(WorkScope scope, long importId, List<GoodLine> lines, CancellationToken cancellation)
    {
        var ids = lines.Select(line => line.PatientId).ToHashSet();
        var versions = await scope.HoldPatientsAsync(ids, cancellation);
        var record = await ReadingsOnRecord.LoadAsync(scope.Db, ids, lines.Select(line => line.Line.Day).ToHashSet(), clock, cancellation);
        foreach (var line in lines)
        {
            line.New.AddRange(line.Line.Values().Where(value => record.Add(line.PatientId, value.Kind, line.Line.MeasuredAt, value.Value)));
        }

        var weights = lines.Where(line => line.HasNewWeight).ToDictionary(line => line, line => new NewWeight(line.Line, line.PatientId));
        if (weights.Count > 0)
        {
            await screens.ScreenAsync(scope, weights.Values, versions, cancellation);
            NoteLater(record, weights);
        }

        var readings = lines.SelectMany(line => line.New.Select(value => ToReading(scope, importId, line, value))).ToList();
        await ReadingBulk.InsertAsync(scope.Db, readings, cancellation);
        owed.UnionWith(lines.Where(line => line.New.Count > 0).Select(line => line.PatientId));
        if (readings.Count > 0)
        {
            scope.Note("Readings read in from a file",
                detail: $"Import {importId}, lines {lines[0].Line.Source.Number} to {lines[^1].Line.Source.Number}: {readings.Count} readings of {ids.Count} people.");
        }
    }

    /// <summary>Which of the accepted weights stand for their day, once all of the batch are known.</summary>
    private static void NoteLater(ReadingsOnRecord record, Dictionary<GoodLine, NewWeight> weights)
    {
        var numbers = new Dictionary<GoodLine, long>();
        foreach (var (line, weight) in weights)
        {
            line.Held = weight.Held;
            if (weight.Held is null)
            {
                numbers.Add(line, record.AddAccepted(line.PatientId, line.Line.LocalTime, line.Line.Weight!.Value));
            }
        }

        foreach (var (line, number) in numbers)
        {
            line.IsLater = !record.StandsForItsDay(line.PatientId, line.Line.Day, number);
        }
    }

    private static Reading ToReading(WorkScope scope, long importId, GoodLine line, (ReadingKind Kind, int Value) value)
    {
        var isHeld = value.Kind == ReadingKind.Weight && line.Held is not null;
        var state = isHeld ? ReadingState.Held : ReadingState.Accepted;
        return new Reading
        {
            PatientId = line.PatientId,
            Kind = value.Kind,
            MeasuredAt = line.Line.MeasuredAt,
            Day = line.Line.Day,
            Value = value.Value,
            AsTyped = value.Kind == ReadingKind.Weight ? line.Line.WeightAsTyped : null,
            Source = ReadingSource.HomeFile,
            Device = line.Line.Device,
            State = state,
            FirstState = state,
            HoldReason = isHeld ? line.Held : null,
            RecordedAt = scope.Now,
            RecordedById = scope.Actor.UserId,
            ImportId = importId,
        };
    }

    /// <summary>A line with nothing wrong in itself, and what becomes of it.</summary>
    private sealed class GoodLine(ReadingLine line, long patientId)
    {
        public ReadingLine Line => line;

        public long PatientId => patientId;

        /// <summary>The values that are not on record yet.</summary>
        public List<(ReadingKind Kind, int Value)> New { get; } = [];

        public bool HasNewWeight => New.Exists(value => value.Kind == ReadingKind.Weight);

        public HoldReason? Held { get; set; }

        public bool IsLater { get; set; }

        public LineOutcome Outcome() => this switch
        {
            { New.Count: 0 } => new(line.Source, ImportLineOutcome.Duplicate, LineFault.Duplicate),
            { Held: { } reason } => new(line.Source, ImportLineOutcome.Held, HoldWords.Of(reason)),
            { IsLater: true } => new(line.Source, ImportLineOutcome.Accepted, LineFault.Later),
            _ => new(line.Source, ImportLineOutcome.Accepted, null),
        };
    }
}
