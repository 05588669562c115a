using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>When a diuretic was last started, stopped or given at another dose.</summary>
internal static class DiureticChange
{
    /// <summary>Loop and thiazide-type diuretics and acetazolamide by generic name. Common practice, no source.</summary>
    private static readonly ImmutableHashSet<string> Diuretics =
    [
        "furosemide", "bumetanide", "torasemide", "etacrynic acid",
        "metolazone", "hydrochlorothiazide", "bendroflumethiazide", "chlortalidone", "indapamide", "xipamide",
        "acetazolamide",
    ];

    /// <summary>
    /// The last day, up to the picture's, on which the daily milligrams of any diuretic were not those of the day before.
    /// The first record of a patient's diuretics counts as a change.
    /// </summary>
    public static DateOnly? Last(PatientPicture picture)
    {
        var courses = picture.DoseCourses.Where(course => Diuretics.Contains(course.Medicine)).ToList();
        var days = courses.Select(course => course.From)
            .Concat(courses.Where(course => course.Until is not null).Select(course => course.Until!.Value))
            .Where(day => day <= picture.AsOf)
            .OrderDescending();
        return days.Cast<DateOnly?>().FirstOrDefault(day => Changed(courses, day!.Value));
    }

    private static bool Changed(List<DoseCourse> courses, DateOnly day) => courses
        .GroupBy(course => course.Medicine)
        .Any(medicine => DailyMilligrams(medicine, day) != DailyMilligrams(medicine, day.AddDays(-1)));

    private static decimal DailyMilligrams(IEnumerable<DoseCourse> courses, DateOnly day) =>
        courses.Where(course => course.HoldsOn(day)).Sum(course => course.DailyMilligrams);
}
