using HfClinic.Clinical.Values;

namespace HfClinic.Records.Patients;

/// <summary>What is typed about a patient, for enrolling and for editing.</summary>
public sealed record PatientDetails
{
    public string ClinicNumber { get; init; } = "";

    public string FamilyName { get; init; } = "";

    public string GivenName { get; init; } = "";

    public DateOnly? BirthDate { get; init; }

    public Sex Sex { get; init; }

    public int? HeightCentimetres { get; init; }

    public string? Phone { get; init; }

    public DateOnly EnrolledOn { get; init; }

    public bool WeighsAtHome { get; init; }

    public DateOnly? DischargedFromHospitalOn { get; init; }

    public Guid? NurseId { get; init; }

    public string? Household { get; init; }

    public string? Note { get; init; }

    public static PatientDetails Of(Patient patient) => new()
    {
        ClinicNumber = patient.ClinicNumber,
        FamilyName = patient.FamilyName,
        GivenName = patient.GivenName,
        BirthDate = patient.BirthDate,
        Sex = patient.Sex,
        HeightCentimetres = patient.HeightCentimetres,
        Phone = patient.Phone,
        EnrolledOn = patient.EnrolledOn,
        WeighsAtHome = patient.WeighsAtHome,
        DischargedFromHospitalOn = patient.DischargedFromHospitalOn,
        NurseId = patient.NurseId,
        Household = patient.Household,
        Note = patient.Note,
    };

    /// <summary>Everything wrong with the details, by field.</summary>
    public IReadOnlyList<Problem> Problems(DateOnly today)
    {
        var problems = new List<Problem>();
        TextRules.Require(problems, nameof(ClinicNumber), "The clinic number", ClinicNumber, Patient.ClinicNumberLength);
        TextRules.Require(problems, nameof(FamilyName), "The family name", FamilyName, Patient.NameLength);
        TextRules.Require(problems, nameof(GivenName), "The given name", GivenName, Patient.NameLength);
        TextRules.Limit(problems, nameof(Phone), "The phone number", Phone, Patient.PhoneLength);
        TextRules.Limit(problems, nameof(Household), "The household", Household, 40);
        TextRules.Limit(problems, nameof(Note), "The note", Note, 2000);
        if (BirthDate is { } born && (born > today || born < today.AddYears(-120)))
        {
            problems.Add(new(nameof(BirthDate), $"Nobody is born on {TextRules.Day(born)}.", "Give a day within the last 120 years."));
        }

        if (HeightCentimetres is < 100 or > 230)
        {
            problems.Add(new(nameof(HeightCentimetres), $"A height of {HeightCentimetres} cm is outside 100 to 230 cm.", "Give the height in centimetres."));
        }

        if (EnrolledOn > today || EnrolledOn < new DateOnly(1990, 1, 1))
        {
            problems.Add(new(nameof(EnrolledOn), "The day of enrolment is not between 01 Jan 1990 and today.", "Give the day care began."));
        }

        if (DischargedFromHospitalOn > today)
        {
            problems.Add(new(nameof(DischargedFromHospitalOn), "The discharge from hospital is in the future.", "Give the day, or leave it empty."));
        }

        return problems;
    }

    internal void CopyTo(Patient patient)
    {
        patient.ClinicNumber = ClinicNumber.Trim().ToUpperInvariant();
        patient.FamilyName = FamilyName.Trim();
        patient.GivenName = GivenName.Trim();
        patient.SearchText = SearchFolding.ForPatient(patient.FamilyName, patient.GivenName, patient.ClinicNumber);
        patient.BirthDate = BirthDate;
        patient.Sex = Sex;
        patient.HeightCentimetres = HeightCentimetres;
        patient.Phone = TextRules.OrNull(Phone);
        patient.EnrolledOn = EnrolledOn;
        patient.WeighsAtHome = WeighsAtHome;
        patient.DischargedFromHospitalOn = DischargedFromHospitalOn;
        patient.NurseId = NurseId;
        patient.Household = TextRules.OrNull(Household);
        patient.Note = TextRules.OrNull(Note);
    }
}
