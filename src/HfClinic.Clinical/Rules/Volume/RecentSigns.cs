using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>What was told or measured in the last days, as far back as the protocol looks for symptoms.</summary>
internal static class RecentSigns
{
    private const string DaysBack = "symptoms.days";

    /// <summary>The symptom reports of those days, in order of day.</summary>
    public static ImmutableArray<SymptomReport> Reports(PatientPicture picture, ClinicProtocol protocol) =>
        [.. picture.Symptoms.Where(report => IsRecent(report.Day, picture, protocol))];

    /// <summary>The latest report of any of the symptoms, in words, or nothing.</summary>
    public static IEnumerable<(string Words, Evidence Evidence)> Reported(PatientPicture picture, ClinicProtocol protocol, Symptoms symptoms)
    {
        if (Reports(picture, protocol).LastOrDefault(report => (report.Symptoms & symptoms) != 0) is { } report)
        {
            var words = SymptomWords.List(report.Symptoms & symptoms);
            yield return (words, new Evidence("Reported", words, report.Day));
        }
    }

    /// <summary>The lowest systolic pressure below the protocol's limit, in words, or nothing.</summary>
    public static IEnumerable<(string Words, Evidence Evidence)> LowSystolic(PatientPicture picture, ClinicProtocol protocol)
    {
        if (LowestSystolic(picture, protocol) is { } lowest && protocol["pressure.low-systolic"].IsMetBy(lowest.Value))
        {
            var value = lowest.Value.ToString(CultureInfo.InvariantCulture);
            yield return ($"systolic {value}", new Evidence("Systolic pressure", $"{value} mmHg", lowest.Day, lowest.Id));
        }
    }

    /// <summary>The lowest systolic pressure of those days, or null.</summary>
    public static VitalReading? LowestSystolic(PatientPicture picture, ClinicProtocol protocol) => picture.Vitals
        .Where(vital => vital.Kind == ReadingKind.SystolicPressure && IsRecent(vital.Day, picture, protocol))
        .MinBy(vital => vital.Value);

    private static bool IsRecent(DateOnly day, PatientPicture picture, ClinicProtocol protocol) =>
        protocol[DaysBack].IsMetBy(picture.AsOf.DayNumber - day.DayNumber);
}
