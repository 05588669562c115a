using System.Globalization;

namespace HfClinic.Benchmarks.Harness;

/// <summary>A table in Markdown, so that it can be copied into the documentation as it is.</summary>
internal sealed class Table(params string[] heads)
{
    private readonly List<string[]> rows = [];

    public void Add(params string[] cells) => rows.Add(cells);

    public void Print(TextWriter output)
    {
        var widths = heads.Select((head, at) => rows.Select(row => row[at].Length).Append(head.Length).Max()).ToArray();
        output.WriteLine();
        output.WriteLine(Line(heads, widths));
        output.WriteLine($"|{string.Join('|', widths.Select(width => new string('-', width + 2)))}|");
        rows.ForEach(row => output.WriteLine(Line(row, widths)));
        output.WriteLine();
    }

    /// <summary>"4.21 (3.80)": median and fastest.</summary>
    public static string Milliseconds(Taken taken) =>
        string.Create(CultureInfo.InvariantCulture, $"{taken.Median:0.00} ({taken.Fastest:0.00})");

    /// <summary>"1.32 (1.28)": of the medians and of the fastest.</summary>
    public static string Ratio(Taken of, Taken to) =>
        string.Create(CultureInfo.InvariantCulture, $"{of.Median / to.Median:0.00} ({of.Fastest / to.Fastest:0.00})");

    private static string Line(string[] cells, int[] widths) =>
        $"| {string.Join(" | ", cells.Select((cell, at) => cell.PadRight(widths[at])))} |";
}
