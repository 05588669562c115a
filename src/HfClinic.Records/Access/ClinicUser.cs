using Microsoft.AspNetCore.Identity;

namespace HfClinic.Records.Access;

/// <summary>A person who signs in.</summary>
public sealed class ClinicUser : IdentityUser<Guid>
{
    public const int DisplayNameLength = 80;

    /// <summary>The name shown beside what the person does.</summary>
    [PersonalData]
    public string DisplayName { get; set; } = "";

    /// <summary>A person who left keeps the record of what was done, but cannot sign in.</summary>
    public bool IsActive { get; set; } = true;
}
