using System.Runtime.CompilerServices;
using System.Text;
using CsvHelper;

namespace HfClinic.Records.Exchange;

/// <summary>One line of a file.</summary>
/// <param name="Number">As an editor counts: the heading is line 1, blank lines count too.</param>
/// <param name="Raw">As it stood in the file.</param>
internal sealed record CsvLine(int Number, string[] Fields, string Raw)
{
    /// <summary>The field without surrounding blanks; empty when the line is shorter or the column is not given.</summary>
    public string Field(int? column) => column is { } at && at < Fields.Length ? Fields[at].Trim() : "";
}

/// <summary>
/// A file's heading and lines, read in pieces. A line is a line: a stray quote never swallows the lines after it. Blank lines, and lines
/// of separators alone, are passed over.
/// </summary>
internal sealed class CsvLines : IAsyncDisposable
{
    /// <summary>Longer lines are no list any more, bytes.</summary>
    private const int LongestLine = 32 * 1024;

    private readonly FileStream file;
    private readonly CsvReader reader;

    private CsvLines(FileStream file, CsvReader reader)
    {
        this.file = file;
        this.reader = reader;
    }

    /// <summary>The column headings.</summary>
    public IReadOnlyList<string> Headings { get; private set; } = [];

    /// <summary>The character between fields.</summary>
    public char Separator => reader.Separator;

    /// <summary>Bytes read so far, for progress.</summary>
    public long BytesRead => file.Position;

    /// <summary>Opens the file and reads its heading.</summary>
    /// <exception cref="RefusedException">There is no heading, or the first line is too long to be one.</exception>
    public static async Task<CsvLines> OpenAsync(string path, Encoding? encoding, CancellationToken cancellation)
    {
        var file = new FileStream(path, new FileStreamOptions { Options = FileOptions.Asynchronous | FileOptions.SequentialScan, BufferSize = 64 * 1024 });
        var reader = CsvReader.Create(file, new CsvReaderOptions
        {
            Encoding = encoding,
            TrackLineNumbers = true,
            AllowLineBreaksInQuotes = false,
            MaxRecordSize = LongestLine,
            FieldCountMismatch = CsvFieldCountHandling.Allow,
            DetectSeparatorHint = true,
        }, leaveOpen: true);
        var lines = new CsvLines(file, reader);
        try
        {
            await lines.ReadHeadingAsync(cancellation);
            return lines;
        }
        catch
        {
            await lines.DisposeAsync();
            throw;
        }
    }

    /// <summary>The lines after the heading.</summary>
    /// <exception cref="RefusedException">A line is too long to be one.</exception>
    public async IAsyncEnumerable<CsvLine> ReadAsync([EnumeratorCancellation] CancellationToken cancellation)
    {
        while (await NextAsync(cancellation))
        {
            var fields = reader.Current.ToArray();
            if (!Array.TrueForAll(fields, string.IsNullOrWhiteSpace))
            {
                yield return new((int)reader.LineNumber, fields, Encoding.UTF8.GetString(reader.RawRecord));
            }
        }
    }

    public async ValueTask DisposeAsync()
    {
        await reader.DisposeAsync();
        await file.DisposeAsync();
    }

    private async Task ReadHeadingAsync(CancellationToken cancellation)
    {
        try
        {
            await reader.ReadHeaderAsync(cancellation);
        }
        catch (CsvFormatException fault)
        {
            throw TooLong(fault);
        }

        Headings = [.. (reader.Headers ?? []).Select(heading => heading.Trim())];
        if (Headings.All(string.IsNullOrEmpty))
        {
            throw new RefusedException(new Problem("File", "The file holds no heading and no lines.", "Export it again, with the column headings in the first line."));
        }
    }

    private async ValueTask<bool> NextAsync(CancellationToken cancellation)
    {
        try
        {
            return await reader.ReadAsync(cancellation);
        }
        catch (CsvFormatException fault)
        {
            throw TooLong(fault);
        }
    }

    private static RefusedException TooLong(CsvFormatException fault) => new(new Problem("File",
        fault.LineNumber > 0 ? $"Line {fault.LineNumber} is too long to be a line of readings." : "A line is too long to be a line of readings.",
        "Look whether this is the right file, and whether its lines end where they should."));
}
