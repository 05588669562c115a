using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Exchange;

/// <summary>
/// What is on record of some patients on some days, and what a batch adds to it: tells duplicates, and which weight stands for a day.
/// </summary>
internal sealed class ReadingsOnRecord
{
    private readonly HashSet<(long PatientId, ReadingKind Kind, DateTime MeasuredAt, int Value)> values = [];
    private readonly Dictionary<(long PatientId, DateOnly Day), List<WeightReading>> weights = [];
    private long lastId;

    /// <summary>Reads what is on record.</summary>
    public static async Task<ReadingsOnRecord> LoadAsync(
        ClinicDb db, IReadOnlyCollection<long> patientIds, IReadOnlyCollection<DateOnly> days, ClinicClock clock, CancellationToken cancellation)
    {
        var record = new ReadingsOnRecord();
        var rows = db.Readings.AsNoTracking()
            .Where(reading => patientIds.Contains(reading.PatientId) && days.Contains(reading.Day))
            .OrderBy(reading => reading.Id)
            .Select(reading => new { reading.PatientId, reading.Kind, reading.MeasuredAt, reading.Value, reading.State, IsFirst = reading.SupersedesId == null })
            .AsAsyncEnumerable();
        await foreach (var row in rows.WithCancellation(cancellation))
        {
            if (row.IsFirst)
            {
                record.values.Add((row.PatientId, row.Kind, row.MeasuredAt, row.Value));
            }

            if (row.Kind == ReadingKind.Weight && row.State == ReadingState.Accepted)
            {
                record.AddAccepted(row.PatientId, clock.ToLocal(row.MeasuredAt), new Weight(row.Value));
            }
        }

        return record;
    }

    /// <summary>Notes a value; false when it is there already.</summary>
    public bool Add(long patientId, ReadingKind kind, DateTime measuredAt, int value) => values.Add((patientId, kind, measuredAt, value));

    /// <summary>Notes an accepted weight and returns its number for <see cref="StandsForItsDay"/>.</summary>
    public long AddAccepted(long patientId, DateTime localTime, Weight weight)
    {
        var key = (patientId, DateOnly.FromDateTime(localTime));
        if (!weights.TryGetValue(key, out var ofDay))
        {
            weights.Add(key, ofDay = []);
        }

        ofDay.Add(new WeightReading(++lastId, localTime, weight));
        return lastId;
    }

    /// <summary>Whether the weight noted with this number is the one of the day series.</summary>
    public bool StandsForItsDay(long patientId, DateOnly day, long number) =>
        DaySeries.ReadingsOf(weights[(patientId, day)]) is [var standing] && standing.Id == number;
}
