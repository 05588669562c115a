using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Medicines;

/// <summary>What a prescriber sets for one medicine.</summary>
/// <param name="Medicine">Generic name, with salt where it matters.</param>
/// <param name="DoseMilligrams">Milligrams at each taking.</param>
/// <param name="TimesDaily">Takings a day; 0.5 is every other day.</param>
public sealed record PrescribedDose(string Medicine, decimal DoseMilligrams, decimal TimesDaily);

/// <summary>Starts, changes and stops medicines. Every change ends one course and starts the next, so the courses are the dose history.</summary>
public sealed class MedicineCourses(ClinicWork work)
{
    /// <summary>Starts a medicine, or changes its dose, from a day on.</summary>
    /// <exception cref="RefusedException">The dose does not hold, or the day lies before the present course.</exception>
    public Task<long> SetAsync(
        Actor actor, long patientId, PrescribedDose dose, DateOnly from, string? reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.ChangeMedicines, async scope =>
        {
            var medicine = TextRules.Required("Medicine", "The medicine", dose.Medicine, 80).ToLowerInvariant();
            var because = TextRules.Optional("Reason", "The reason", reason, 400);
            CheckDose(dose, from, scope.Today);
            await scope.TakePatientAsync(patientId, cancellation);
            await EndCurrentAsync(scope, patientId, medicine, from, because, cancellation);
            var course = new DoseCourse
            {
                PatientId = patientId,
                Medicine = medicine,
                DoseMilligrams = dose.DoseMilligrams,
                TimesDaily = dose.TimesDaily,
                From = from,
                Reason = because,
                RecordedAt = scope.Now,
                ById = actor.UserId,
                ByName = actor.Name,
            };
            scope.Db.DoseCourses.Add(course);
            await scope.SaveAsync(cancellation);
            return course.Id;
        }, cancellation);

    /// <summary>Stops a medicine on a day.</summary>
    /// <exception cref="RefusedException">No reason is given, or the medicine is not being taken.</exception>
    public Task StopAsync(
        Actor actor, long patientId, string medicine, DateOnly on, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.ChangeMedicines, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            await scope.TakePatientAsync(patientId, cancellation);
            if (!await EndCurrentAsync(scope, patientId, medicine, on, because, cancellation))
            {
                throw new RefusedException(new Problem("Medicine", $"{medicine} is not being taken.", "Look at the list of medicines again."));
            }
        }, cancellation);

    /// <summary>
    /// Takes a course out that was recorded in error; it stays visible as struck out. The course it had replaced, if that ended
    /// on the day this one began, holds on as this one would have.
    /// </summary>
    /// <exception cref="ChangedMeanwhileException">It was struck out already.</exception>
    public Task StrikeOutAsync(Actor actor, long courseId, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.ChangeMedicines, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            var patientId = await scope.Db.DoseCourses.Where(c => c.Id == courseId).Select(c => (long?)c.PatientId).SingleOrDefaultAsync(cancellation)
                ?? throw new NotFoundException("There is no such dose course.");
            await scope.TakePatientAsync(patientId, cancellation);
            var course = await scope.Db.DoseCourses.SingleAsync(c => c.Id == courseId, cancellation);
            if (course.StruckOutAt is not null)
            {
                throw new ChangedMeanwhileException("This dose course was struck out meanwhile.");
            }

            (course.StruckOutAt, course.StruckOutBecause) = (scope.Now, because);
            var replaced = await scope.Db.DoseCourses
                .Where(c => c.PatientId == patientId && c.Medicine == course.Medicine && c.Id != courseId
                    && c.StruckOutAt == null && c.Until == course.From)
                .OrderByDescending(c => c.Id).FirstOrDefaultAsync(cancellation);
            if (replaced is not null)
            {
                (replaced.Until, replaced.EndedBecause) = (course.Until, course.EndedBecause);
            }
        }, cancellation);

    private static void CheckDose(PrescribedDose dose, DateOnly from, DateOnly today)
    {
        var problems = new List<Problem>();
        if (dose.DoseMilligrams is <= 0 or > 5000)
        {
            problems.Add(new("DoseMilligrams", "The dose is not between 0 and 5000 mg.", "Give the milligrams of one taking."));
        }

        if (dose.TimesDaily is < 0.1m or > 6)
        {
            problems.Add(new("TimesDaily", "The number of takings is not between one in ten days and six a day.", "Choose how often."));
        }

        if (from > today)
        {
            problems.Add(new("From", "The day lies in the future.", "Give today or an earlier day."));
        }

        if (problems.Count > 0)
        {
            throw new RefusedException(problems);
        }
    }

    private static async Task<bool> EndCurrentAsync(
        WorkScope scope, long patientId, string medicine, DateOnly on, string? reason, CancellationToken cancellation)
    {
        var current = await scope.Db.DoseCourses
            .Where(course => course.PatientId == patientId && course.Medicine == medicine && course.Until == null && course.StruckOutAt == null)
            .SingleOrDefaultAsync(cancellation);
        if (current is null)
        {
            return false;
        }

        if (on < current.From)
        {
            throw new RefusedException(new Problem("From",
                $"The present course of {medicine} began on {TextRules.Day(current.From)}, after that day.", "Give a later day, or strike that course out first."));
        }

        (current.Until, current.EndedBecause) = (on, reason);
        return true;
    }
}
