using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Invented patients for the titration rules. Days count from <see cref="Pictures.Today"/>.</summary>
internal static class TitrationPictures
{
    public static readonly ClinicProtocol Esc = Defaults;

    public static readonly ClinicProtocol Aha = Defaults with { Profile = "AHA" };

    /// <summary>Seen today with nothing that argues against a step, on no medicine.</summary>
    public static PatientPicture Well(int ejection) => new PatientPicture { AsOf = Today, EnrolledOn = Today.AddDays(-60) }
        .Ejection($"{ejection}").InRhythm(-60, Rhythm.Sinus).Weighed(0, 70_000).Systolic(0, 118).Rate(0, 70)
        .Blood("potassium", -20, 4.4m).Blood("creatinine", -20, 88).Blood("egfr", -20, 86) with
    {
        Congestion = [new(Today, false)],
    };

    /// <summary>LVEF 30 % with all four pillars at target for long.</summary>
    public static PatientPicture AtTarget => (Well(30) with { EnrolledOn = Today.AddDays(-300) })
        .On("bisoprolol", 10, 1, -200).On("ramipril", 5, 2, -200).On("spironolactone", 50, 1, -200).On("dapagliflozin", 10, 1, -200);

    /// <summary>LVEF 30 %; beta blocker, ACE inhibitor and MRA below target and unchanged for 100 days.</summary>
    public static PatientPicture Short => (Well(30) with { EnrolledOn = Today.AddDays(-100) })
        .On("bisoprolol", 2.5m, 1, -100).On("ramipril", 1.25m, 2, -100).On("spironolactone", 12.5m, 1, -100).On("dapagliflozin", 10, 1, -100)
        .Blood("creatinine", -101, 88);

    public static PatientPicture On(this PatientPicture picture, string medicine, decimal milligrams, decimal times, int from, int? until = null) => picture with
    {
        DoseCourses = [.. picture.DoseCourses.Append(new DoseCourse(
            500 + picture.DoseCourses.Length, medicine, milligrams, times, Today.AddDays(from), until is { } day ? Today.AddDays(day) : null)).OrderBy(course => course.From)],
    };

    public static PatientPicture Without(this PatientPicture picture, string medicine) => picture with
    {
        DoseCourses = picture.DoseCourses.RemoveAll(course => course.Medicine == medicine),
    };

    public static PatientPicture Blood(this PatientPicture picture, string analyte, int day, decimal value) => picture with
    {
        BloodTests = [.. picture.BloodTests.Append(new BloodResult(
            700 + picture.BloodTests.Length, analyte, Today.AddDays(day).ToDateTime(new TimeOnly(9, 0)), value)).OrderBy(test => test.LocalTime)],
    };

    public static PatientPicture Rate(this PatientPicture picture, int day, int value) => picture with
    {
        Vitals = [.. picture.Vitals.Append(new VitalReading(
            800 + picture.Vitals.Length, ReadingKind.HeartRate, Today.AddDays(day).ToDateTime(new TimeOnly(7, 5)), value)).OrderBy(vital => vital.LocalTime)],
    };

    public static PatientPicture NoVitals(this PatientPicture picture) => picture with { Vitals = [] };

    public static PatientPicture NoBlood(this PatientPicture picture) => picture with { BloodTests = [] };

    public static PatientPicture InRhythm(this PatientPicture picture, int day, Rhythm rhythm) => picture with
    {
        Rhythms = [.. picture.Rhythms.Append(new(Today.AddDays(day), rhythm)).OrderBy(seen => seen.Day)],
    };

    public static PatientPicture Limit(this PatientPicture picture, TitrationClass titration, int on, int? expires = null) => picture with
    {
        TitrationLimits = picture.TitrationLimits.Add(new(
            900, titration, "dizzy at the next step", "Dr Invented", Today.AddDays(on), expires is { } day ? Today.AddDays(day) : null)),
    };

    public static ClassTitration Of(this PatientPicture picture, TitrationClass titration, ClinicProtocol? protocol = null) =>
        TitrationAssessment.Of(picture, protocol ?? Esc)[titration]!;

    public static TitrationState StateOf(this PatientPicture picture, TitrationClass titration, ClinicProtocol? protocol = null) =>
        picture.Of(titration, protocol).State;

    /// <summary>The rule's answer for one class.</summary>
    public static Finding About(this IRule rule, PatientPicture picture, TitrationClass titration, ClinicProtocol? protocol = null) =>
        Assert.Single(rule.Assess(picture, protocol ?? Esc), finding => finding.Subject == TitrationClasses.Words(titration));

    /// <summary>The rules that fire for one class, in short.</summary>
    public static string[] Firing(this PatientPicture picture, TitrationClass titration, ClinicProtocol? protocol = null) =>
        [.. RuleBook.Assess(TitrationRules.All, picture, protocol ?? Esc)
            .Where(finding => finding.Outcome == Outcome.Fires && finding.Subject == TitrationClasses.Words(titration))
            .Select(finding => finding.RuleId["titration.".Length..]).Order()];
}
