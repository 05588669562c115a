using CsvHelper;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Exchange;

/// <summary>Reads what became of files read in.</summary>
public sealed class ImportReports(IDbContextFactory<ClinicDb> databases)
{
    /// <summary>The latest readings-in, newest first.</summary>
    public async Task<IReadOnlyList<ImportRun>> RunsAsync(int take, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await db.ImportRuns.AsNoTracking().OrderByDescending(run => run.Id).Take(take).ToListAsync(cancellation);
    }

    /// <summary>One reading-in; null when there is none with this number.</summary>
    public async Task<ImportRun?> RunAsync(long importId, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await db.ImportRuns.AsNoTracking().SingleOrDefaultAsync(run => run.Id == importId, cancellation);
    }

    /// <summary>Lines that did not simply go in, in the order of the file.</summary>
    /// <param name="outcome">Only these; null for all.</param>
    public async Task<IReadOnlyList<ImportLine>> LinesAsync(
        long importId, ImportLineOutcome? outcome, int skip, int take, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Of(db, importId, outcome).Skip(skip).Take(take).ToListAsync(cancellation);
    }

    /// <summary>How many lines of the report there are.</summary>
    public async Task<int> CountLinesAsync(long importId, ImportLineOutcome? outcome, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Of(db, importId, outcome).CountAsync(cancellation);
    }

    /// <summary>
    /// Writes the report as CSV, line by line as it comes from the database. Text that a spreadsheet would run as a formula gets an
    /// apostrophe before it (OWASP, CSV Injection).
    /// </summary>
    public async Task WriteCsvAsync(long importId, Stream destination, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        await using var csv = CsvWriter.Create(destination, new CsvWriterOptions { Injection = CsvInjection.Escape, WriteByteOrderMark = true }, leaveOpen: true);
        await csv.WriteRecordAsync(["line", "outcome", "reason", "mend", "text"], cancellation);
        await foreach (var line in Of(db, importId, null).AsAsyncEnumerable().WithCancellation(cancellation))
        {
            csv.WriteField(line.LineNumber);
            csv.WriteField(ImportWords.Of(line.Outcome));
            csv.WriteField(line.Reason);
            csv.WriteField(line.Mend);
            csv.WriteField(line.Text);
            await csv.EndRecordAsync(cancellation);
        }

        await csv.FlushAsync(cancellation);
    }

    private static IQueryable<ImportLine> Of(ClinicDb db, long importId, ImportLineOutcome? outcome) =>
        db.ImportLines.AsNoTracking().Where(line => line.ImportId == importId && (outcome == null || line.Outcome == outcome))
            .OrderBy(line => line.LineNumber).ThenBy(line => line.Id);
}
