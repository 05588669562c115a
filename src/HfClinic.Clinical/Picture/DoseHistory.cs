namespace HfClinic.Clinical.Picture;

/// <summary>What the courses of one medicine say about its total daily dose over time.</summary>
public static class DoseHistory
{
    /// <summary>The total daily dose on a day.</summary>
    public static decimal Daily(IEnumerable<DoseCourse> courses, DateOnly day) =>
        courses.Where(course => course.HoldsOn(day)).Sum(course => course.DailyMilligrams);

    /// <summary>The days up to <paramref name="asOf"/> on which the total daily dose was not that of the day before, latest first.</summary>
    public static IEnumerable<DateOnly> Changes(IReadOnlyCollection<DoseCourse> courses, DateOnly asOf) => courses
        .Select(course => course.From)
        .Concat(courses.Where(course => course.Until is not null).Select(course => course.Until!.Value))
        .Where(day => day <= asOf)
        .Distinct()
        .OrderDescending()
        .Where(day => Daily(courses, day) != Daily(courses, day.AddDays(-1)));
}
