using System.Collections.Frozen;
using HfClinic.Records.BloodTests;
using HfClinic.Records.Contacts;
using HfClinic.Records.Exchange;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Records.Visits;

namespace HfClinic.Records.Audit;

/// <summary>What each kind of row is called in the record of access, and which kinds need no line because they are themselves a record.</summary>
public static class AuditWords
{
    /// <summary>Rows whose every change gets a line.</summary>
    public static readonly FrozenDictionary<Type, string> Audited = new Dictionary<Type, string>
    {
        [typeof(Patient)] = "Patient",
        [typeof(TargetWeight)] = "Target weight",
        [typeof(Reading)] = "Reading",
        [typeof(ReadingDecision)] = "Decision on a reading",
        [typeof(SymptomReport)] = "Symptom report",
        [typeof(DoseCourse)] = "Dose course",
        [typeof(BloodTest)] = "Blood test",
        [typeof(Visit)] = "Visit",
        [typeof(EjectionFraction)] = "Ejection fraction",
        [typeof(Contact)] = "Contact",
        [typeof(Question)] = "Question",
        [typeof(PatientThreshold)] = "Threshold for one patient",
        [typeof(ClinicSettings)] = "Clinic settings",
        [typeof(ImportRun)] = "Reading-in of a file",
        [typeof(Flag)] = "Flag",
    }.ToFrozenDictionary();
}
