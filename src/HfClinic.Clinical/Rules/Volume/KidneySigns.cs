using System.Globalization;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>Blood tests beside a loss. Creatinine is in µmol/L.</summary>
internal static class KidneySigns
{
    private const int BaselineDays = 365;

    /// <summary>The latest result of the analyte, if it is recent enough to count.</summary>
    public static BloodResult? Latest(string analyte, PatientPicture picture, ClinicProtocol protocol) =>
        picture.BloodTests.LastOrDefault(test => test.Analyte == analyte) is { } latest
        && protocol["loss.blood-test-days"].IsMetBy(picture.AsOf.DayNumber - latest.Day.DayNumber) ? latest : null;

    /// <summary>
    /// The latest creatinine against the lowest of the 48 hours before it, the lowest of the 7 days before it, or else the
    /// baseline: the lowest of the year before those 7 days.
    /// </summary>
    public static IEnumerable<(string Words, Evidence Evidence)> RiseOfCreatinine(PatientPicture picture, ClinicProtocol protocol)
    {
        if (Latest("creatinine", picture, protocol) is not { } latest)
        {
            return [];
        }

        var before = picture.BloodTests.Where(test => test.Analyte == "creatinine" && test.LocalTime < latest.LocalTime).ToList();
        var inTwoDays = Lowest(TimeSpan.Zero, TimeSpan.FromHours(48));
        var inSevenDays = Lowest(TimeSpan.Zero, TimeSpan.FromDays(7));
        var baseline = Lowest(TimeSpan.FromDays(7), TimeSpan.FromDays(BaselineDays));
        var earlier =
            inTwoDays is not null && protocol["loss.creatinine-48-hours"].IsMetBy(latest.Value - inTwoDays.Value) ? inTwoDays
            : inSevenDays is not null && protocol["loss.creatinine-7-days"].IsMetBy(Percent(inSevenDays)) ? inSevenDays
            : baseline is not null && protocol["loss.creatinine-baseline"].IsMetBy(Percent(baseline)) ? baseline
            : null;
        return earlier is null ? [] : [Words(earlier, latest)];

        BloodResult? Lowest(TimeSpan from, TimeSpan until) => before
            .Where(test => latest.LocalTime - test.LocalTime is var age && age > from && age <= until)
            .MinBy(test => test.Value);

        decimal Percent(BloodResult reference) => reference.Value > 0 ? ((latest.Value / reference.Value) - 1) * 100 : 0;
    }

    private static (string Words, Evidence Evidence) Words(BloodResult earlier, BloodResult latest)
    {
        var words = string.Create(CultureInfo.InvariantCulture, $"creatinine {earlier.Value:0.#} → {latest.Value:0.#} µmol/L");
        return (words, new Evidence(
            "Creatinine",
            string.Create(CultureInfo.InvariantCulture, $"{latest.Value:0.#} µmol/L; {earlier.Value:0.#} µmol/L on {Values.Wording.Day(earlier.Day)}"),
            latest.Day));
    }
}
