using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Readings;

/// <summary>A person decides about a reading: confirm a held one, correct a wrong value, or strike an error out. Nothing is overwritten.</summary>
public sealed class DecideReading(ClinicWork work)
{
    /// <summary>A held reading is right after all and counts from now on.</summary>
    /// <exception cref="ChangedMeanwhileException">It is not held any more.</exception>
    public Task ConfirmAsync(Actor actor, long readingId, string reason, CancellationToken cancellation = default) =>
        DecideAsync(actor, readingId, reason, (scope, reading, because) =>
        {
            if (reading.State != ReadingState.Held)
            {
                throw new ChangedMeanwhileException("This reading is not held any more. Nothing of yours was saved; look again.");
            }

            Decide(scope, reading, ReadingState.Accepted, because, null);
            return Task.CompletedTask;
        }, cancellation);

    /// <summary>Takes a reading out as an error.</summary>
    public Task StrikeOutAsync(Actor actor, long readingId, string reason, CancellationToken cancellation = default) =>
        DecideAsync(actor, readingId, reason, (scope, reading, because) =>
        {
            RequireStanding(reading);
            Decide(scope, reading, ReadingState.StruckOut, because, null);
            return Task.CompletedTask;
        }, cancellation);

    /// <summary>Replaces a reading's value; the wrong one stays visible.</summary>
    /// <param name="value">In the unit of the reading's kind: grams, mmHg, beats per minute, percent.</param>
    /// <exception cref="RefusedException">The new value cannot be, or is the same.</exception>
    public Task CorrectAsync(
        Actor actor, long readingId, int value, string? asTyped, string reason, CancellationToken cancellation = default) =>
        DecideAsync(actor, readingId, reason, async (scope, reading, because) =>
        {
            RequireStanding(reading);
            Check(scope, reading, value);
            var corrected = new Reading
            {
                PatientId = reading.PatientId,
                Kind = reading.Kind,
                MeasuredAt = reading.MeasuredAt,
                Day = reading.Day,
                Value = value,
                AsTyped = asTyped,
                Source = reading.Source,
                Device = reading.Device,
                RecordedAt = scope.Now,
                RecordedById = actor.UserId,
                SupersedesId = reading.Id,
            };
            scope.Db.Readings.Add(corrected);
            await scope.SaveAsync(cancellation);
            Decide(scope, reading, ReadingState.Superseded, because, corrected.Id);
        }, cancellation);

    private Task DecideAsync(
        Actor actor, long readingId, string reason, Func<WorkScope, Reading, string, Task> decide, CancellationToken cancellation) =>
        work.RunAsync(actor, Capability.DecideReadings, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            var patientId = await scope.Db.Readings.Where(r => r.Id == readingId).Select(r => (long?)r.PatientId).SingleOrDefaultAsync(cancellation)
                ?? throw new NotFoundException("There is no such reading.");
            await scope.TakePatientAsync(patientId, cancellation);
            await decide(scope, await scope.Db.Readings.SingleAsync(r => r.Id == readingId, cancellation), because);
        }, cancellation);

    private static void RequireStanding(Reading reading)
    {
        if (reading.State is not (ReadingState.Accepted or ReadingState.Held))
        {
            throw new ChangedMeanwhileException("This reading was corrected or struck out meanwhile. Nothing of yours was saved; look again.");
        }
    }

    private static void Check(WorkScope scope, Reading reading, int value)
    {
        var taken = new TakenReadings { LocalTime = scope.Clock.ToLocal(reading.MeasuredAt) };
        taken = reading.Kind switch
        {
            ReadingKind.Weight => taken with { Weight = new Weight(value) },
            ReadingKind.HeartRate => taken with { HeartRate = value },
            ReadingKind.OxygenSaturation => taken with { OxygenSaturation = value },
            ReadingKind.SystolicPressure => taken with { SystolicPressure = value, DiastolicPressure = Math.Min(value - 1, 160) },
            _ => taken with { DiastolicPressure = value, SystolicPressure = 260 },
        };
        var problems = ReadingChecks.Problems(taken, scope.Clock.ToLocal(scope.Now)).ToList();
        if (value == reading.Value)
        {
            problems.Add(new("Value", "The corrected value is the same.", "Confirm it instead, or type the right one."));
        }

        if (problems.Count > 0)
        {
            throw new RefusedException(problems);
        }
    }

    private static void Decide(WorkScope scope, Reading reading, ReadingState to, string reason, long? replacement)
    {
        scope.Db.ReadingDecisions.Add(new ReadingDecision
        {
            ReadingId = reading.Id,
            PatientId = reading.PatientId,
            From = reading.State,
            To = to,
            ReplacementId = replacement,
            Reason = reason,
            At = scope.Now,
            ById = scope.Actor.UserId,
            ByName = scope.Actor.Name,
        });
        reading.State = to;
    }
}
