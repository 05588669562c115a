using System.Globalization;
using HfClinic.Clinical.Values;
using HfClinic.Records.BloodTests;
using HfClinic.Records.Contacts;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Records.Visits;
using HfClinic.Records.Work;
using HfClinic.SeedDemo.Days;
using HfClinic.SeedDemo.Persons;
using HfClinic.SeedDemo.Telling;

namespace HfClinic.SeedDemo;

/// <summary>Puts an invented patient and the past into the record, each row with the past time at which it was recorded.</summary>
internal sealed class PatientRows(WorkScope scope, DemoDays days, Team team)
{
    private static readonly TimeOnly VisitTime = new(10, 40);

    /// <summary>Enrols the patient.</summary>
    /// <param name="number">Counted over all patients; decides phone and nurse.</param>
    /// <returns>The patient's identifier.</returns>
    public async Task<long> EnrolAsync(DemoPatient patient, int number, string clinicNumber, CancellationToken cancellation)
    {
        var id = await EnrolPatient.AddAsync(scope, DetailsOf(patient, number, clinicNumber), cancellation);
        if (patient.LeftDay is { } left)
        {
            var row = scope.Db.Patients.Local.Single(p => p.Id == id);
            (row.LeftOn, row.LeftBecause) = (days.Date(left), "Moved away; care goes on elsewhere");
        }

        return id;
    }

    /// <summary>Adds the patient's past, but for the readings.</summary>
    public void AddHistory(long id, DemoPatient patient)
    {
        scope.Db.TargetWeights.AddRange(patient.Targets.Select(target => new TargetWeight
        {
            PatientId = id,
            From = days.Date(target.Day),
            Grams = target.Weight.Grams,
            Reason = target.Reason,
            ById = team.Cardiologist.UserId,
            ByName = team.Cardiologist.Name,
            RecordedAt = days.Utc(target.Day, VisitTime),
        }));
        scope.Db.SymptomReports.AddRange(patient.Symptoms.Select(told => new SymptomReport
        {
            PatientId = id,
            Day = days.Date(told.Day),
            Symptoms = told.Symptoms,
            Note = told.Note,
            Source = ReadingSource.Phone,
            ById = team.Nurse.UserId,
            ByName = team.Nurse.Name,
            RecordedAt = days.Utc(told.Day, VisitTime),
        }));
        scope.Db.Contacts.AddRange(patient.Calls.Select(call => new Contact
        {
            PatientId = id,
            At = days.Utc(call.Day, VisitTime),
            Day = days.Date(call.Day),
            Outcome = call.Outcome,
            Note = call.Note,
            ById = team.Nurse.UserId,
            ByName = team.Nurse.Name,
        }));
        AddMedicines(id, patient);
        AddTestsAndVisits(id, patient);
    }

    /// <summary>The patient's readings up to now.</summary>
    public IEnumerable<Reading> ReadingsOf(long patientId, DemoPatient patient) => patient.Readings
        .Select(measured => (Measured: measured, At: days.Utc(measured.Day, measured.Minute)))
        .Where(reading => days.HasCome(reading.At))
        .Select(reading =>
        {
            var state = reading.Measured.Held is null ? ReadingState.Accepted : ReadingState.Held;
            return new Reading
            {
                PatientId = patientId,
                Kind = reading.Measured.Kind,
                MeasuredAt = reading.At,
                Day = days.Date(reading.Measured.Day),
                Value = reading.Measured.Value,
                AsTyped = reading.Measured.AsTyped,
                Source = ReadingSource.HomeFile,
                State = state,
                FirstState = state,
                HoldReason = reading.Measured.Held,
                RecordedAt = reading.At,
            };
        });

    private PatientDetails DetailsOf(DemoPatient patient, int number, string clinicNumber) => new()
    {
        ClinicNumber = clinicNumber,
        FamilyName = patient.Person.FamilyName,
        GivenName = patient.Person.GivenName,
        BirthDate = days.Date(-patient.Person.BornDaysAgo),
        Sex = patient.Person.Sex,
        HeightCentimetres = patient.Person.HeightCentimetres,
        Phone = string.Create(CultureInfo.InvariantCulture, $"555-01{number % 100:00}"),
        EnrolledOn = days.Date(patient.EnrolledDay),
        WeighsAtHome = patient.WeighsAtHome,
        DischargedFromHospitalOn = patient.DischargedDay is { } discharged ? days.Date(discharged) : null,
        NurseId = number % 3 == 0 ? team.Nurse.UserId : null,
        Household = patient.Household,
        Note = patient.Note,
    };

    private void AddMedicines(long id, DemoPatient patient) => scope.Db.DoseCourses.AddRange(patient.Courses.Select(course => new DoseCourse
    {
        PatientId = id,
        Medicine = course.Medicine,
        DoseMilligrams = course.Milligrams,
        TimesDaily = course.TimesDaily,
        From = days.Date(course.From),
        Until = course.Until is { } until ? days.Date(until) : null,
        Reason = course.Reason,
        EndedBecause = course.Until is null ? null : "Dose changed",
        ById = team.Cardiologist.UserId,
        ByName = team.Cardiologist.Name,
        RecordedAt = days.Utc(course.From, VisitTime),
    }));

    private void AddTestsAndVisits(long id, DemoPatient patient)
    {
        scope.Db.BloodTests.AddRange(patient.Tests.Select(test => new BloodTest
        {
            PatientId = id,
            Analyte = test.Analyte,
            TakenAt = days.Utc(test.Day, VisitTime),
            Day = days.Date(test.Day),
            Value = test.Value,
            AsReported = test.Value.ToString("0.###", CultureInfo.InvariantCulture),
            UnitAsReported = test.Unit,
            ById = team.Nurse.UserId,
            ByName = team.Nurse.Name,
            RecordedAt = days.Utc(test.Day, VisitTime).AddHours(5),
        }));
        scope.Db.EjectionFractions.AddRange(patient.Fractions.Select(fraction => new EjectionFraction
        {
            PatientId = id,
            Day = days.Date(fraction.Day),
            Percent = fraction.Percent,
            Method = "echocardiography",
            ById = team.Cardiologist.UserId,
            ByName = team.Cardiologist.Name,
            RecordedAt = days.Utc(fraction.Day, VisitTime),
        }));
        scope.Db.Visits.AddRange(patient.Visits.Select(visit => new Visit
        {
            PatientId = id,
            Day = days.Date(visit.Day),
            Kind = visit.Kind,
            NyhaClass = visit.NyhaClass,
            Note = visit.Note,
            Rhythm = patient.Person.HasAtrialFibrillation ? "atrial fibrillation" : "sinus rhythm",
            ById = team.Cardiologist.UserId,
            ByName = team.Cardiologist.Name,
            RecordedAt = days.Utc(visit.Day, VisitTime),
        }));
    }
}
