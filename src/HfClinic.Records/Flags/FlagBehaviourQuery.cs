using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Flags;

/// <summary>Counts how this clinic's flags behave, so that the clinic can judge its thresholds by its own rates.</summary>
public sealed class FlagBehaviourQuery(IDbContextFactory<ClinicDb> databases, ClinicClock clock)
{
    private const decimal DaysInMonth = 30.4375m;

    /// <summary>The figures of the period, both ends included. Reads one small row for each flag raised in it.</summary>
    /// <exception cref="ArgumentException">The period ends before it begins.</exception>
    public async Task<FlagBehaviour> ReadAsync(DateOnly from, DateOnly until, CancellationToken cancellation = default)
    {
        if (until < from)
        {
            throw new ArgumentException($"The period ends on {Wording.Day(until)}, before it begins on {Wording.Day(from)}.", nameof(until));
        }

        await using var db = await databases.CreateDbContextAsync(cancellation);
        var months = await PatientDaysAsync(db, from, until, cancellation) / DaysInMonth;
        var weights = db.Readings.AsNoTracking().Where(reading => reading.Kind == ReadingKind.Weight
            && reading.Day >= from && reading.Day <= until && reading.SupersedesId == null);
        return new FlagBehaviour(
            from,
            until,
            months,
            await KindsAsync(db, from, until, months, cancellation),
            await weights.CountAsync(cancellation),
            await weights.CountAsync(reading => reading.FirstState == ReadingState.Held, cancellation));
    }

    private static async Task<int> PatientDaysAsync(ClinicDb db, DateOnly from, DateOnly until, CancellationToken cancellation)
    {
        var enrolled = await db.Patients.AsNoTracking()
            .Where(patient => patient.EnrolledOn <= until && (patient.LeftOn == null || patient.LeftOn > from))
            .Select(patient => new { patient.EnrolledOn, patient.LeftOn }).ToListAsync(cancellation);
        return enrolled.Sum(patient =>
        {
            var first = patient.EnrolledOn > from ? patient.EnrolledOn : from;
            var end = patient.LeftOn is { } left && left <= until ? left : until.AddDays(1);
            return Math.Max(0, end.DayNumber - first.DayNumber);
        });
    }

    private async Task<List<FlagKind>> KindsAsync(ClinicDb db, DateOnly from, DateOnly until, decimal months, CancellationToken cancellation)
    {
        var raised = await db.Flags.AsNoTracking()
            .Where(flag => flag.EpisodeStart >= from && flag.EpisodeStart <= until)
            .Select(flag => new
            {
                flag.RuleId,
                flag.EpisodeStart,
                flag.State,
                FirstAnswer = db.FlagSteps.Where(step => step.FlagId == flag.Id && step.Kind == FlagStepKind.Answered).Min(step => (DateTime?)step.At),
            }).ToListAsync(cancellation);
        var order = RuleBook.All.Select((rule, place) => (rule.Id, Place: place)).ToDictionary(rule => rule.Id, rule => rule.Place);
        return [.. raised.GroupBy(flag => flag.RuleId)
            .OrderBy(kind => order.GetValueOrDefault(kind.Key, int.MaxValue)).ThenBy(kind => kind.Key, StringComparer.Ordinal)
            .Select(kind =>
            {
                var answered = kind.Count(flag => flag.FirstAnswer is not null);
                var sameDay = kind.Count(flag => flag.FirstAnswer is { } at && clock.DayOf(at) == flag.EpisodeStart);
                var cleared = kind.Count(flag => flag.FirstAnswer is null && flag.State == FlagState.Cleared);
                return new FlagKind(kind.Key, RuleBook.TitleOf(kind.Key), kind.Count(), sameDay, answered - sameDay, cleared, months);
            })];
    }
}
