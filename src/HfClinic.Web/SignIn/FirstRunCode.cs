using System.Security.Cryptography;

namespace HfClinic.Web.SignIn;

/// <summary>Shown only where the program was started, so that nobody else on the network sets the clinic up first.</summary>
public sealed class FirstRunCode
{
    private const string Letters = "ABCDEFGHJKLMNPQRSTUVWXYZ23456789";

    public string Value { get; } = RandomNumberGenerator.GetString(Letters, 8);

    public bool Matches(string? typed) => CryptographicOperations.FixedTimeEquals(
        System.Text.Encoding.UTF8.GetBytes(typed?.Trim().ToUpperInvariant() ?? ""), System.Text.Encoding.UTF8.GetBytes(Value));
}
