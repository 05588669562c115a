namespace HfClinic.Records.Access;

/// <summary>What a person is in the clinic. One person may be several.</summary>
public enum ClinicRole
{
    Nurse = 1,
    Prescriber = 2,
    Coordinator = 3,
    Administrator = 4,
}
