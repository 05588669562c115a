using System.Collections.Immutable;

namespace HfClinic.Records.Access;

/// <summary>Who is doing something: a signed-in person, or a part of the program.</summary>
/// <param name="UserId">Null for the program itself.</param>
/// <param name="Name">The name kept beside what was done.</param>
/// <param name="Roles">The roles at this moment.</param>
/// <param name="IsProgram">True for the program's own work, which needs no role.</param>
public sealed record Actor(Guid? UserId, string Name, ImmutableHashSet<ClinicRole> Roles, bool IsProgram = false)
{
    /// <summary>The program doing its own work, for example "morning sweep".</summary>
    public static Actor Program(string name) => new(null, name, [], IsProgram: true);

    /// <summary>Whether this actor may do it.</summary>
    public bool May(Capability capability) => IsProgram || Permissions.Allow(Roles, capability);
}
