using System.Globalization;

namespace HfClinic.Clinical.Tests.Weights;

/// <summary>A table of reference values with a header line; an empty field is a missing value.</summary>
internal sealed class GoldenTable
{
    /// <summary>The tables hold ten decimals.</summary>
    public const double Tolerance = 1e-8;

    private readonly string[] columns;
    private readonly string[][] rows;

    private GoldenTable(string[] lines)
    {
        columns = lines[0].Split(',');
        rows = [.. lines.Skip(1).Select(line => line.Split(','))];
    }

    public int Count => rows.Length;

    /// <summary>Weights in grams, one for each day; null on a day without.</summary>
    public int?[] Grams => [.. Enumerable.Range(0, Count).Select(row => Find(row, "y") is double y ? (int?)Math.Round(1000 * y) : null)];

    public double this[int row, string column] =>
        Find(row, column) ?? throw new InvalidDataException($"Row {row + 1} has no {column}.");

    public static GoldenTable Read(string name) =>
        new(File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "Files", "golden", name)));

    public double? Find(int row, string column) =>
        rows[row][Array.IndexOf(columns, column)] is { Length: > 0 } text ? double.Parse(text, CultureInfo.InvariantCulture) : null;

    /// <summary>Every named value of a row agrees; a missing reference value must be missing.</summary>
    public void Check(int row, params ReadOnlySpan<(string Column, double? Value)> values)
    {
        foreach (var (column, value) in values)
        {
            double? expected = Find(row, column);
            Assert.True(
                expected is null ? value is null : Math.Abs(expected.Value - (value ?? double.NaN)) < Tolerance,
                $"Day {row + 1}, {column}: expected {expected}, found {value}.");
        }
    }
}
