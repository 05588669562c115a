using Microsoft.AspNetCore.Identity;

namespace HfClinic.Records.Access;

/// <summary>The roles as Identity stores them; their identifiers are fixed, so that every database has the same.</summary>
public static class ClinicRoles
{
    /// <summary>The name Identity uses: the word itself.</summary>
    public static string NameOf(ClinicRole role) => role.ToString();

    internal static IEnumerable<IdentityRole<Guid>> Rows => Enum.GetValues<ClinicRole>().Select(role => new IdentityRole<Guid>
    {
        Id = new Guid((int)role, 0x4846, 0x4100, [0x80, 0, 0, 0, 0, 0, 0, 0]),
        Name = NameOf(role),
        NormalizedName = NameOf(role).ToUpperInvariant(),
        ConcurrencyStamp = NameOf(role),
    });
}
