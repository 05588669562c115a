using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>A medicine being taken, with the history of its dose.</summary>
/// <param name="Recorded">The name as recorded.</param>
/// <param name="Milligrams">Of one taking, as last recorded.</param>
/// <param name="TimesDaily">Takings a day, as last recorded.</param>
/// <param name="Daily">The total daily dose.</param>
/// <param name="Since">The day of its last change.</param>
/// <param name="IsStart">Whether that change was the start.</param>
public sealed record TakenMedicine(
    string Recorded, MedicineMatch Match, decimal Milligrams, decimal TimesDaily, decimal Daily, DateOnly Since, bool IsStart)
{
    /// <summary>"bisoprolol 2.5 mg daily".</summary>
    public string Words => DoseWords.Of(Recorded, Milligrams, TimesDaily);

    /// <summary>What is being taken on the picture's day and known to the formulary.</summary>
    public static ImmutableArray<TakenMedicine> Of(PatientPicture picture) => [.. picture.DoseCourses
        .GroupBy(course => course.Medicine, StringComparer.OrdinalIgnoreCase)
        .Select(courses => Read(courses.Key, [.. courses], picture.AsOf))
        .OfType<TakenMedicine>()];

    /// <summary>The days on which a dose of a medicine of these classes changed, latest first; stopping counts.</summary>
    public static IEnumerable<DateOnly> Steps(PatientPicture picture, ImmutableArray<MedicineClass> classes) => picture.DoseCourses
        .Where(course => Formulary.BuiltIn.Read(course.Medicine).Class is { } found && classes.Contains(found))
        .GroupBy(course => course.Medicine, StringComparer.OrdinalIgnoreCase)
        .SelectMany(courses => DoseHistory.Changes([.. courses], picture.AsOf))
        .OrderDescending();

    private static TakenMedicine? Read(string recorded, IReadOnlyCollection<DoseCourse> courses, DateOnly asOf)
    {
        var match = Formulary.BuiltIn.Read(recorded);
        var present = courses.LastOrDefault(course => course.HoldsOn(asOf));
        if (present is null || match.Candidates.IsEmpty)
        {
            return null;
        }

        var since = DoseHistory.Changes(courses, asOf).First();
        return new(
            recorded, match, present.DoseMilligrams, present.TimesDaily, DoseHistory.Daily(courses, asOf), since,
            DoseHistory.Daily(courses, since.AddDays(-1)) == 0);
    }
}
