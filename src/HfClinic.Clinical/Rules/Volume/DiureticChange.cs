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
    public static DateOnly? Last(PatientPicture picture) => picture.DoseCourses
        .Where(course => Diuretics.Contains(course.Medicine))
        .GroupBy(course => course.Medicine)
        .SelectMany(courses => DoseHistory.Changes([.. courses], picture.AsOf))
        .Max(day => (DateOnly?)day);
}
