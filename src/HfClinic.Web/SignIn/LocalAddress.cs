namespace HfClinic.Web.SignIn;

/// <summary>Keeps a "back to" address inside this program.</summary>
public static class LocalAddress
{
    /// <summary>The address if it is a path of this program, else the fallback.</summary>
    public static string Or(string? address, string fallback) =>
        address is ['/', ..] and not ['/', '/' or '\\', ..] && Uri.IsWellFormedUriString(address, UriKind.Relative) ? address : fallback;
}
