namespace HfClinic.Records.Exchange;

/// <summary>What became of one line. A line that simply went in has no fault.</summary>
internal sealed record LineOutcome(CsvLine Line, ImportLineOutcome Outcome, LineFault? Fault);

/// <summary>What became of the lines of one batch: counts, and the rows of the report.</summary>
internal static class LineOutcomes
{
    /// <summary>How many of an outcome.</summary>
    public static int Count(this IEnumerable<LineOutcome> lines, ImportLineOutcome outcome) => lines.Count(line => line.Outcome == outcome);

    /// <summary>The rows for the report, as many as are still kept after those counted already.</summary>
    public static IEnumerable<ImportLine> ToKeep(this IReadOnlyList<LineOutcome> lines, ImportRun before) =>
        from line in lines
        where line.Fault is not null
        group line by line.Outcome into alike
        from line in alike.Take(ImportLine.MostKept - CountedBefore(before, alike.Key))
        select new ImportLine
        {
            ImportId = before.Id,
            LineNumber = line.Line.Number,
            Outcome = line.Outcome,
            Reason = Cut(line.Fault!.Reason, ImportLine.ReasonLength),
            Mend = Cut(line.Fault.Mend, ImportLine.MendLength),
            Text = Cut(line.Line.Raw, ImportLine.TextLength),
        };

    private static int CountedBefore(ImportRun run, ImportLineOutcome outcome) => outcome switch
    {
        ImportLineOutcome.Accepted => run.Later,
        ImportLineOutcome.Duplicate => run.Duplicates,
        ImportLineOutcome.Held => run.Held,
        _ => run.Refused,
    };

    /// <summary>Never between the halves of one character, and without characters no database keeps.</summary>
    private static string Cut(string text, int length)
    {
        var end = Math.Min(text.Length, length);
        if (end < text.Length && char.IsHighSurrogate(text[end - 1]))
        {
            end--;
        }

        return text[..end].Replace('\0', ' ');
    }
}
