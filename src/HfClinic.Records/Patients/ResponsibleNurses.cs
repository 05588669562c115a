using HfClinic.Records.Access;

namespace HfClinic.Records.Patients;

/// <summary>The people who can be responsible for a patient.</summary>
public sealed class ResponsibleNurses(People people)
{
    /// <summary>The active nurses by name, and whoever is responsible now even if that person left.</summary>
    public async Task<IReadOnlyList<Person>> ListAsync(Guid? present, CancellationToken cancellation = default) =>
        [.. (await people.ListAsync(cancellation))
            .Where(person => (person.IsActive && person.Roles.Contains(ClinicRole.Nurse)) || person.Id == present)];
}
