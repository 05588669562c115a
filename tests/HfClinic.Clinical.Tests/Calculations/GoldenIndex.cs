using System.Globalization;
using System.Text.RegularExpressions;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>One worked value of the reference table: what, from which inputs, ten decimals.</summary>
public sealed partial record GoldenIndex(string Name, string Inputs, double Value, string Unit)
{
    public bool IsFemale => Inputs.Contains("sex=F", StringComparison.Ordinal);

    public bool HasHeartFailure => Inputs.Contains("hf=1", StringComparison.Ordinal);

    /// <summary>The number after the name: "kg" of "cm=170;kg=70(Mosteller)" is 70.</summary>
    public decimal this[string input] => decimal.Parse(
        Regex.Match(Inputs, $@"(?:^|[;\s]){Regex.Escape(input)}=([0-9.]+)") is { Success: true } found
            ? Unrounded(found.Groups[1].Value)
            : throw new InvalidDataException($"{Name}: no {input} in '{Inputs}'."),
        CultureInfo.InvariantCulture);

    /// <summary>The number a plain input begins with: "2.0 ng/mL".</summary>
    public decimal First => decimal.Parse(LeadingNumber().Match(Inputs).Value, CultureInfo.InvariantCulture);

    public static IReadOnlyList<GoldenIndex> Read() =>
    [
        .. File.ReadLines(Path.Combine(AppContext.BaseDirectory, "Files", "golden", "indices_golden.csv"))
            .Skip(1)
            .Select(line => line.Trim('"').Split("\",\""))
            .Select(parts => new GoldenIndex(parts[0], parts[1], double.Parse(parts[2], CultureInfo.InvariantCulture), parts[3])),
    ];

    // The table prints this one input with ten digits but was computed with twelve.
    private static string Unrounded(string number) => number == "97.22222222" ? "97.2222222222" : number;

    [GeneratedRegex("^[0-9.]+")]
    private static partial Regex LeadingNumber();
}
