using System.Collections.Frozen;
using static HfClinic.Records.Access.Capability;

namespace HfClinic.Records.Access;

/// <summary>Who may do what: the one table behind the verbs, the pages and the endpoints.</summary>
public static class Permissions
{
    private static readonly FrozenDictionary<ClinicRole, FrozenSet<Capability>> ByRole = new Dictionary<ClinicRole, Capability[]>
    {
        [ClinicRole.Nurse] =
        [
            ReadCharts, RecordReadings, DecideReadings, ImportFiles, EnrolPatients, RecordContacts, AnswerFlags,
            AskQuestions, RecordBloodTests, Book,
        ],
        [ClinicRole.Prescriber] =
        [
            ReadCharts, RecordReadings, DecideReadings, EnrolPatients, RecordContacts, AnswerFlags, AskQuestions,
            AnswerQuestions, SetTargetWeight, SetThresholds, ChangeMedicines, RecordBloodTests, RecordVisits, Book,
            ReadClinicFigures,
        ],
        [ClinicRole.Coordinator] = [ReadCharts, ImportFiles, EnrolPatients, RecordContacts, AskQuestions, Book, ReadClinicFigures],
        [ClinicRole.Administrator] = [ManagePeople, ReadAudit, ChangeSettings, ImportFiles],
    }.ToFrozenDictionary(entry => entry.Key, entry => entry.Value.ToFrozenSet());

    /// <summary>Whether any of the roles carries the capability.</summary>
    public static bool Allow(IEnumerable<ClinicRole> roles, Capability capability) =>
        roles.Any(role => ByRole.TryGetValue(role, out var granted) && granted.Contains(capability));

    /// <summary>The roles that carry the capability.</summary>
    public static IEnumerable<ClinicRole> RolesWith(Capability capability) =>
        Enum.GetValues<ClinicRole>().Where(role => ByRole[role].Contains(capability));
}
