namespace HfClinic.Records.Access;

/// <summary>One thing a person may do. Each is also an authorisation policy of the same name.</summary>
public enum Capability
{
    ReadCharts,
    RecordReadings,
    DecideReadings,
    ImportFiles,
    EnrolPatients,
    RecordContacts,
    AnswerFlags,
    AskQuestions,
    AnswerQuestions,
    SetTargetWeight,
    SetThresholds,
    ChangeMedicines,
    RecordBloodTests,
    RecordVisits,
    Book,
    ManagePeople,
    ReadAudit,
    ReadClinicFigures,
    ChangeSettings,
}
