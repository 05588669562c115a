using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>One line of the older label's table.</summary>
/// <param name="ClearancePer70Kilograms">Creatinine clearance, mL/min per 70 kg.</param>
/// <param name="MicrogramsDaily">One for each of <see cref="DigoxinLabelTable.LeanKilograms"/>.</param>
/// <param name="DaysToSteadyState">As printed.</param>
public sealed record DigoxinLabelRow(int ClearancePer70Kilograms, ImmutableArray<decimal> MicrogramsDaily, int DaysToSteadyState);

/// <summary>
/// Table 5 of the older US digoxin label: daily maintenance in heart failure for peak stores of 10 micrograms/kg.
/// History only: it aims at 0.8 to 2 ng/mL, about twice the intake that goes with 0.5 to 0.9 ng/mL.
/// </summary>
/// <remarks>The label's own formula with the nearest tablet reproduces only 57 to 60 of the 66 cells, so the table itself is kept.</remarks>
public static class DigoxinLabelTable
{
    public const string SourceKey = "digoxin-label-older";

    private const string File = "digoxin-label-table.json";

    /// <summary>The columns: lean weight in kg.</summary>
    public static readonly ImmutableArray<int> LeanKilograms = [50, 60, 70, 80, 90, 100];

    /// <summary>Reads the embedded table.</summary>
    /// <exception cref="TableFaultException">The table is faulty.</exception>
    public static ImmutableArray<DigoxinLabelRow> Load() => Parse(StrictTable.Text(File));

    /// <inheritdoc cref="Load"/>
    public static ImmutableArray<DigoxinLabelRow> Parse(string json) =>
        StrictTable.Read<DigoxinLabelRow>(File, json, row => $"{row.ClearancePer70Kilograms}", WhyRefused);

    private static string? WhyRefused(DigoxinLabelRow row) =>
        row.MicrogramsDaily.IsDefault || row.MicrogramsDaily.Length != LeanKilograms.Length ? $"there must be {LeanKilograms.Length} daily amounts"
        : row.MicrogramsDaily.Any(amount => amount <= 0) ? "a daily amount is not above 0"
        : row.DaysToSteadyState <= 0 ? "the days to steady state are not above 0"
        : row.ClearancePer70Kilograms < 0 ? "the creatinine clearance is below 0"
        : null;
}
