using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests;

/// <summary>Short ways to say what a patient's picture holds. Days count from <see cref="Today"/>: −1 is yesterday.</summary>
internal static class Pictures
{
    public static readonly DateOnly Today = new(2026, 3, 3);

    public static readonly ClinicProtocol Defaults = ProtocolDefaults.Load();

    /// <summary>Someone who weighs at home and of whom nothing else is known.</summary>
    public static PatientPicture AtHome => new() { AsOf = Today, EnrolledOn = Today.AddYears(-1), WeighsAtHome = true };

    public static PatientPicture Weighed(this PatientPicture picture, int day, int grams, HoldReason? held = null)
    {
        var time = Today.AddDays(day).ToDateTime(new TimeOnly(7, 0));
        var reading = new WeightReading(100 + picture.Weights.Length, time, new Weight(grams), held is { } reason ? new HeldReading(reason, time) : null);
        return picture with { Weights = [.. picture.Weights.Append(reading).OrderBy(one => one.LocalTime)] };
    }

    public static PatientPicture Told(this PatientPicture picture, int day, Symptoms symptoms) =>
        picture with { Symptoms = picture.Symptoms.Add(new SymptomReport(200, Today.AddDays(day), symptoms)) };

    public static PatientPicture Systolic(this PatientPicture picture, int day, int value) => picture with
    {
        Vitals = picture.Vitals.Add(new VitalReading(
            300, ReadingKind.SystolicPressure, Today.AddDays(day).ToDateTime(new TimeOnly(7, 5)), value)),
    };

    public static PatientPicture Target(this PatientPicture picture, int day, int grams) => picture with
    {
        TargetWeights = picture.TargetWeights.Add(new TargetWeight(400, Today.AddDays(day), new Weight(grams), "a prescriber")),
    };

    public static PatientPicture Dose(this PatientPicture picture, string medicine, decimal milligrams, int from, int? until = null) => picture with
    {
        DoseCourses = picture.DoseCourses.Add(new DoseCourse(
            500, medicine, milligrams, 1, Today.AddDays(from), until is { } day ? Today.AddDays(day) : null)),
    };

    /// <summary>Ejection fractions in percent, 30 days apart, the last one today.</summary>
    public static PatientPicture Ejection(this PatientPicture picture, params string[] percents) => picture with
    {
        EjectionFractions = [.. percents.Select((percent, at) => new EjectionFraction(
            600 + at,
            Today.AddDays(-30 * (percents.Length - 1 - at)),
            decimal.Parse(percent, System.Globalization.CultureInfo.InvariantCulture),
            "echocardiography"))],
    };

    /// <summary>A weight every day, the last one on the given day.</summary>
    public static PatientPicture WeighedDaily(this PatientPicture picture, int lastDay, params IEnumerable<int> grams)
    {
        int[] all = [.. grams];
        return all.Index().Aggregate(picture, (so, weight) => so.Weighed(lastDay - all.Length + 1 + weight.Index, weight.Item));
    }

    /// <summary>So many weights about a usual one, 200 g above and below it by turns.</summary>
    public static IEnumerable<int> About(int grams, int days) => Enumerable.Range(0, days).Select(day => grams + (day % 2 == 0 ? 200 : -200));

    public static PatientPicture Tested(this PatientPicture picture, string analyte, int day, decimal value, int hour = 8) => picture with
    {
        BloodTests = [.. picture.BloodTests
            .Append(new BloodResult(600, analyte, Today.AddDays(day).ToDateTime(new TimeOnly(hour, 0)), value)).OrderBy(test => test.LocalTime)],
    };

    /// <summary>The one answer of a rule that answers once.</summary>
    public static Finding Read(this IRule rule, PatientPicture picture, ClinicProtocol? protocol = null) =>
        Assert.Single(rule.Assess(picture, protocol ?? Defaults));
}
