using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Readings;

/// <summary>What one call or measurement gives: any of weight, pressure, pulse, saturation and symptoms.</summary>
public sealed record TakenReadings
{
    /// <summary>Date and time in the clinic's time zone.</summary>
    public DateTime LocalTime { get; init; }

    public Weight? Weight { get; init; }

    /// <summary>The weight as it was typed, with its unit.</summary>
    public string? WeightAsTyped { get; init; }

    /// <summary>mmHg.</summary>
    public int? SystolicPressure { get; init; }

    /// <summary>mmHg.</summary>
    public int? DiastolicPressure { get; init; }

    /// <summary>Beats per minute.</summary>
    public int? HeartRate { get; init; }

    /// <summary>Percent.</summary>
    public int? OxygenSaturation { get; init; }

    public Symptoms Symptoms { get; init; }

    /// <summary>The person was asked about symptoms; with none told, that answer is kept too.</summary>
    public bool AskedForSymptoms { get; init; }

    public string? Note { get; init; }

    public ReadingSource Source { get; init; } = ReadingSource.Phone;
}

/// <summary>What became of the readings.</summary>
/// <param name="ReadingIds">The readings recorded.</param>
/// <param name="Held">Why the weight was set aside, or null.</param>
public sealed record RecordedReadings(IReadOnlyList<long> ReadingIds, HoldReason? Held);

/// <summary>Records readings typed by staff: called in, or measured in the clinic.</summary>
public sealed class RecordReadings(ClinicWork work)
{
    /// <summary>Records what was given. A weight that does not fit is set aside with its likely reason, never dropped.</summary>
    /// <exception cref="RefusedException">Nothing was given, or a value cannot be.</exception>
    public Task<RecordedReadings> RunAsync(Actor actor, long patientId, TakenReadings taken, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.RecordReadings, async scope =>
        {
            var problems = ReadingChecks.Problems(taken, scope.Clock.ToLocal(scope.Now));
            if (problems.Count > 0)
            {
                throw new RefusedException(problems);
            }

            var patient = await scope.TakePatientAsync(patientId, cancellation);
            var held = taken.Weight is { } weight
                ? await WeightScreening.CheckAsync(scope, patient, weight, DateOnly.FromDateTime(taken.LocalTime), cancellation)
                : null;
            var rows = Rows(scope, patientId, taken, held);
            await RefuseDuplicatesAsync(scope.Db, patientId, rows, cancellation);
            scope.Db.Readings.AddRange(rows);
            AddSymptoms(scope, patientId, taken);
            await scope.SaveAsync(cancellation);
            return new RecordedReadings([.. rows.Select(row => row.Id)], held);
        }, cancellation);

    private static List<Reading> Rows(WorkScope scope, long patientId, TakenReadings taken, HoldReason? held)
    {
        var at = scope.Clock.ToUtc(taken.LocalTime);
        (ReadingKind Kind, int? Value)[] values =
        [
            (ReadingKind.Weight, taken.Weight?.Grams),
            (ReadingKind.SystolicPressure, taken.SystolicPressure),
            (ReadingKind.DiastolicPressure, taken.DiastolicPressure),
            (ReadingKind.HeartRate, taken.HeartRate),
            (ReadingKind.OxygenSaturation, taken.OxygenSaturation),
        ];
        return [.. values.Where(value => value.Value is not null).Select(value =>
        {
            var isHeld = value.Kind == ReadingKind.Weight && held is not null;
            var state = isHeld ? ReadingState.Held : ReadingState.Accepted;
            return new Reading
            {
                PatientId = patientId,
                Kind = value.Kind,
                MeasuredAt = at,
                Day = DateOnly.FromDateTime(taken.LocalTime),
                Value = value.Value!.Value,
                AsTyped = value.Kind == ReadingKind.Weight ? taken.WeightAsTyped : null,
                Source = taken.Source,
                State = state,
                FirstState = state,
                HoldReason = isHeld ? held : null,
                RecordedAt = scope.Now,
                RecordedById = scope.Actor.UserId,
            };
        })];
    }

    private static void AddSymptoms(WorkScope scope, long patientId, TakenReadings taken)
    {
        if (taken.Symptoms != Symptoms.None || taken.AskedForSymptoms)
        {
            scope.Db.SymptomReports.Add(new SymptomReport
            {
                PatientId = patientId,
                Day = DateOnly.FromDateTime(taken.LocalTime),
                Symptoms = taken.Symptoms,
                Note = TextRules.OrNull(taken.Note),
                Source = taken.Source,
                RecordedAt = scope.Now,
                ById = scope.Actor.UserId,
                ByName = scope.Actor.Name,
            });
        }
    }

    private static async Task RefuseDuplicatesAsync(ClinicDb db, long patientId, List<Reading> rows, CancellationToken cancellation)
    {
        foreach (var row in rows)
        {
            if (await db.Readings.AnyAsync(other => other.PatientId == patientId && other.Kind == row.Kind
                && other.MeasuredAt == row.MeasuredAt && other.Value == row.Value && other.SupersedesId == null, cancellation))
            {
                throw new RefusedException(new Problem("LocalTime",
                    "The same value at the same time is on record already.", "Give another time if it was measured again."));
            }
        }
    }
}
