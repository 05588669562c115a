using System.Globalization;
using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Records.Patients;
using HfClinic.Web.Ui;

namespace HfClinic.Web.Patients;

/// <summary>The details of a person as typed: kept letter for letter, whether they can be read or not.</summary>
public sealed class PatientFormModel
{
    public string ClinicNumber { get; set; } = "";

    public string FamilyName { get; set; } = "";

    public string GivenName { get; set; } = "";

    public string BirthDate { get; set; } = "";

    public Sex Sex { get; set; }

    public string Height { get; set; } = "";

    public string Phone { get; set; } = "";

    public string EnrolledOn { get; set; } = "";

    public bool WeighsAtHome { get; set; } = true;

    public string DischargedOn { get; set; } = "";

    public string NurseId { get; set; } = "";

    public string Household { get; set; } = "";

    public string Note { get; set; } = "";

    public static PatientFormModel Of(PatientDetails details) => new()
    {
        ClinicNumber = details.ClinicNumber,
        FamilyName = details.FamilyName,
        GivenName = details.GivenName,
        BirthDate = Shown(details.BirthDate),
        Sex = details.Sex,
        Height = details.HeightCentimetres?.ToString(CultureInfo.InvariantCulture) ?? "",
        Phone = details.Phone ?? "",
        EnrolledOn = Shown(details.EnrolledOn),
        WeighsAtHome = details.WeighsAtHome,
        DischargedOn = Shown(details.DischargedFromHospitalOn),
        NurseId = details.NurseId?.ToString() ?? "",
        Household = details.Household ?? "",
        Note = details.Note ?? "",
    };

    /// <summary>What was typed as details, with everything that is wrong with it; the details hold only when nothing is.</summary>
    public (PatientDetails Details, IReadOnlyList<Problem> Problems) Read(DateOnly today)
    {
        var problems = new List<Problem>();
        var details = new PatientDetails
        {
            ClinicNumber = ClinicNumber,
            FamilyName = FamilyName,
            GivenName = GivenName,
            BirthDate = Typed.Day(problems, nameof(PatientDetails.BirthDate), BirthDate, today),
            Sex = Sex,
            HeightCentimetres = Typed.Whole(problems, nameof(PatientDetails.HeightCentimetres), Height),
            Phone = Phone,
            EnrolledOn = Typed.RequiredDay(problems, nameof(PatientDetails.EnrolledOn), EnrolledOn, today) ?? today,
            WeighsAtHome = WeighsAtHome,
            DischargedFromHospitalOn = Typed.Day(problems, nameof(PatientDetails.DischargedFromHospitalOn), DischargedOn, today),
            NurseId = Guid.TryParse(NurseId, out var nurse) ? nurse : null,
            Household = Household,
            Note = Note,
        };
        return (details, [.. problems, .. details.Problems(today)]);
    }

    private static string Shown(DateOnly? day) => day is { } known ? Wording.Day(known) : "";
}
