using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;

namespace HfClinic.Records.Exchange;

/// <summary>What a column of a file may hold.</summary>
public enum ImportField
{
    ClinicNumber = 1,
    MeasuredAt,
    MeasuredTime,
    Weight,
    Unit,
    Systolic,
    Diastolic,
    Pulse,
    Saturation,
    Device,
    FamilyName,
    GivenName,
    BirthDate,
    Sex,
    Height,
    TargetWeight,
    TargetFrom,
    Phone,
    EnrolledOn,
    WeighsAtHome,
    Household,
    Note,
}

/// <summary>One field: its words on screen, the headings it is told from, and where it belongs.</summary>
/// <param name="Headings">Folded headings (lower case, letters and digits, one space between words) that mean this field.</param>
public sealed record ImportFieldInfo(
    ImportField Field, string Name, bool InReadings, bool InRoster, bool Required, bool IsDate, ImmutableArray<string> Headings);

/// <summary>The fields of both kinds of file, and how a heading is recognised. The headings are common practice, no source.</summary>
public static class ImportFields
{
    public static readonly ImmutableArray<ImportFieldInfo> All =
    [
        new(ImportField.ClinicNumber, "Clinic number", true, true, true, false,
            ["clinic number", "clinic no", "number", "patient number", "patient no", "patient id", "id", "clinic id", "record number"]),
        new(ImportField.MeasuredAt, "Date, with or without time", true, false, true, true,
            ["measured at", "measured on", "date", "datetime", "date time", "timestamp", "taken at", "reading date", "measurement date", "date and time", "when"]),
        new(ImportField.MeasuredTime, "Time of day", true, false, false, false, ["time", "measured time", "time of day", "reading time", "clock"]),
        new(ImportField.Weight, "Weight", true, false, false, false, ["weight", "body weight", "mass", "weight value", "bodyweight"]),
        new(ImportField.Unit, "Unit of the weight", true, false, false, false, ["unit", "units", "weight unit", "uom", "unit of weight"]),
        new(ImportField.Systolic, "Systolic pressure", true, false, false, false,
            ["systolic", "sys", "sbp", "systolic pressure", "systolic mmhg", "systolic bp", "bp systolic", "systolic blood pressure"]),
        new(ImportField.Diastolic, "Diastolic pressure", true, false, false, false,
            ["diastolic", "dia", "dbp", "diastolic pressure", "diastolic mmhg", "diastolic bp", "bp diastolic", "diastolic blood pressure"]),
        new(ImportField.Pulse, "Pulse", true, false, false, false, ["pulse", "heart rate", "hr", "pulse rate", "bpm", "pulse bpm", "heart rate bpm"]),
        new(ImportField.Saturation, "Oxygen saturation", true, false, false, false, ["spo2", "oxygen saturation", "saturation", "o2 saturation", "sats"]),
        new(ImportField.Device, "Device", true, false, false, false, ["device", "scale", "device id", "scale id", "serial", "serial number", "source"]),
        new(ImportField.FamilyName, "Family name", false, true, true, false, ["family name", "last name", "surname", "lastname", "familyname", "name family"]),
        new(ImportField.GivenName, "Given name", false, true, true, false, ["given name", "first name", "forename", "firstname", "givenname", "name given", "given names"]),
        new(ImportField.BirthDate, "Birth date", false, true, false, true, ["birth date", "date of birth", "dob", "birthdate", "born", "born on"]),
        new(ImportField.Sex, "Sex", false, true, false, false, ["sex", "gender", "sex at birth"]),
        new(ImportField.Height, "Height in cm", false, true, false, false, ["height cm", "height", "height in cm", "stature"]),
        new(ImportField.TargetWeight, "Target weight in kg", false, true, false, false,
            ["target weight kg", "target weight", "dry weight", "dry weight kg", "target kg", "target"]),
        new(ImportField.TargetFrom, "Target weight set on", false, true, false, true, ["target set on", "target weight set on", "target date", "target from", "target since"]),
        new(ImportField.Phone, "Phone", false, true, false, false, ["phone", "telephone", "phone number", "tel", "mobile"]),
        new(ImportField.EnrolledOn, "Enrolled on", false, true, false, true, ["enrolled on", "enrolled", "enrolment date", "enrollment date", "start date", "date enrolled"]),
        new(ImportField.WeighsAtHome, "Weighs at home", false, true, false, false, ["home weighing", "weighs at home", "home weights", "home monitoring"]),
        new(ImportField.Household, "Household", false, true, false, false, ["household", "shared scale", "address group"]),
        new(ImportField.Note, "Note", false, true, false, false, ["note", "notes", "remark", "comment", "comments"]),
    ];

    /// <summary>The fields a kind of file may hold, in the order they are asked about.</summary>
    public static IEnumerable<ImportFieldInfo> Of(ImportKind kind) =>
        All.Where(info => kind == ImportKind.Roster ? info.InRoster : info.InReadings);

    /// <summary>The words of a field.</summary>
    public static string NameOf(ImportField field) => All.First(info => info.Field == field).Name;

    /// <summary>Whether a heading means this field: "Weight (kg)" means the weight.</summary>
    internal static bool Means(ImportFieldInfo info, string heading)
    {
        var folded = SearchFolding.Fold(heading);
        return info.Headings.Contains(folded)
            || (info.Field == ImportField.Weight && UnitInHeading(heading) is not null && info.Headings.Contains(WithoutLastWord(folded)));
    }

    /// <summary>The unit a heading names: "weight_kg" names kilograms.</summary>
    internal static WeightUnit? UnitInHeading(string heading) => UnitWords.Read(SearchFolding.Fold(heading).Split(' ')[^1]);

    private static string WithoutLastWord(string folded) => folded[..Math.Max(0, folded.LastIndexOf(' '))];
}
