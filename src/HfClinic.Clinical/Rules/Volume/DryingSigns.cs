using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// Signs beside a loss that a person may have been dried out too far: dizzy or fainted, a low or fallen systolic pressure,
/// a rise of creatinine, sodium or potassium out of range. Source: KDIGO 2012 for creatinine in 48 hours and 7 days, from
/// memory; the rest a default of this program. A fall of pressure on standing is not recorded and so not looked at.
/// </summary>
internal static class DryingSigns
{
    private const int MedianDays = 14;
    private const int FewestPressures = 3;

    /// <summary>Each sign in words, with its evidence.</summary>
    public static IEnumerable<(string Words, Evidence Evidence)> Of(PatientPicture picture, ClinicProtocol protocol) =>
    [
        .. RecentSigns.Reported(picture, protocol, Symptoms.Dizziness | Symptoms.Syncope),
        .. Systolic(picture, protocol),
        .. KidneySigns.RiseOfCreatinine(picture, protocol),
        .. OutOfRange("sodium", picture, protocol),
        .. OutOfRange("potassium", picture, protocol),
    ];

    private static IEnumerable<(string Words, Evidence Evidence)> Systolic(PatientPicture picture, ClinicProtocol protocol)
    {
        var low = RecentSigns.LowSystolic(picture, protocol).ToList();
        return low.Count > 0 ? low : FallOfSystolic(picture, protocol);
    }

    /// <summary>Against the median of the 14 days before it, of at least 3 pressures.</summary>
    private static IEnumerable<(string Words, Evidence Evidence)> FallOfSystolic(PatientPicture picture, ClinicProtocol protocol)
    {
        if (RecentSigns.LowestSystolic(picture, protocol) is not { } lowest || !protocol["loss.systolic-fall-below"].IsMetBy(lowest.Value))
        {
            yield break;
        }

        double[] before =
        [
            .. picture.Vitals
                .Where(vital => vital.Kind == ReadingKind.SystolicPressure && vital.Day < lowest.Day && vital.Day >= lowest.Day.AddDays(-MedianDays))
                .Select(vital => (double)vital.Value),
        ];
        if (before.Length >= FewestPressures && SampleMedian.Of(before) is var usual
            && protocol["loss.systolic-fall"].IsMetBy((decimal)usual - lowest.Value))
        {
            var words = string.Create(CultureInfo.InvariantCulture, $"systolic {lowest.Value}, usually {usual:0.#}");
            yield return (words, new Evidence(
                "Systolic pressure",
                string.Create(CultureInfo.InvariantCulture, $"{lowest.Value} mmHg; median of the {MedianDays} days before {usual:0.#} mmHg"),
                lowest.Day,
                lowest.Id));
        }
    }

    private static IEnumerable<(string Words, Evidence Evidence)> OutOfRange(string analyte, PatientPicture picture, ClinicProtocol protocol)
    {
        if (KidneySigns.Latest(analyte, picture, protocol) is { } test
            && (protocol[$"loss.{analyte}-low"].IsMetBy(test.Value) || protocol[$"loss.{analyte}-high"].IsMetBy(test.Value)))
        {
            var value = string.Create(CultureInfo.InvariantCulture, $"{test.Value:0.#} mmol/L");
            yield return ($"{analyte} {value}", new Evidence(Wording.Sentence(analyte), value, test.Day));
        }
    }
}
