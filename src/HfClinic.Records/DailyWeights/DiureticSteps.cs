using HfClinic.Records.Medicines;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>Reads when loop diuretics were started, changed or stopped.</summary>
internal static class DiureticSteps
{
    /// <summary>The steps within the days, both ends included, in order of day.</summary>
    public static async Task<ILookup<long, DiureticStep>> ReadAsync(
        ClinicDb db, IReadOnlyCollection<long> patients, DateOnly from, DateOnly until, CancellationToken cancellation)
    {
        var courses = await db.DoseCourses.AsNoTracking()
            .Where(course => patients.Contains(course.PatientId) && course.StruckOutAt == null && LoopDiuretics.Names.Contains(course.Medicine)
                && ((course.From >= from && course.From <= until) || (course.Until >= from && course.Until <= until)))
            .Select(course => new { course.PatientId, course.From, course.Until, course.Medicine, course.DoseMilligrams, course.TimesDaily })
            .ToListAsync(cancellation);
        var begun = courses.Where(course => course.From >= from && course.From <= until)
            .Select(course => (course.PatientId, Step: new DiureticStep(course.From, DoseWords.Of(course.Medicine, course.DoseMilligrams, course.TimesDaily))));
        var stopped = courses
            .Where(course => course.Until >= from && course.Until <= until
                && !courses.Exists(next => next.PatientId == course.PatientId && next.Medicine == course.Medicine && next.From == course.Until))
            .Select(course => (course.PatientId, Step: new DiureticStep(course.Until!.Value, $"{course.Medicine} stopped")));
        return begun.Concat(stopped).OrderBy(entry => entry.Step.Day).ToLookup(entry => entry.PatientId, entry => entry.Step);
    }
}
