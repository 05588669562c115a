using System.Text;

namespace HfClinic.Records.Exchange;

/// <summary>How large a file may be.</summary>
/// <param name="LargestFile">Bytes.</param>
public sealed record ImportLimits(long LargestFile = 300L * 1024 * 1024);

/// <summary>What a first look at a whole file found, before anything is read in.</summary>
public sealed record FileLook
{
    /// <summary>How many lines are shown before reading in.</summary>
    public const int SampleLines = 5;

    /// <summary>Where the file lies on this machine.</summary>
    public required string Path { get; init; }

    /// <summary>The name the person knows it by.</summary>
    public required string FileName { get; init; }

    public required long Bytes { get; init; }

    /// <summary>Lines that are not blank, without the heading.</summary>
    public required int Lines { get; init; }

    /// <summary>The character between fields.</summary>
    public required char Separator { get; init; }

    /// <summary>What the person should look at because of the file's encoding; null when there is nothing to say.</summary>
    public string? EncodingNotice { get; init; }

    public required IReadOnlyList<ColumnLook> Columns { get; init; }

    /// <summary>The first lines.</summary>
    public required IReadOnlyList<IReadOnlyList<string>> Sample { get; init; }

    internal Encoding? Encoding { get; init; }

    /// <summary>Looks at the whole file, in pieces.</summary>
    /// <param name="path">Where it lies on this machine.</param>
    /// <param name="fileName">The name the person knows it by.</param>
    /// <exception cref="RefusedException">It is empty, too large, no text or no list of lines.</exception>
    public static async Task<FileLook> TakeAsync(string path, string fileName, ImportLimits limits, CancellationToken cancellation = default)
    {
        var bytes = new FileInfo(path).Length;
        if (bytes > limits.LargestFile)
        {
            throw TooLarge(bytes, limits);
        }

        var text = await DetectAsync(path, cancellation);
        await using var lines = await CsvLines.OpenAsync(path, text.Encoding, cancellation);
        List<ColumnLook> columns = [.. lines.Headings.Select(heading => new ColumnLook(heading))];
        var sample = new List<IReadOnlyList<string>>();
        var count = 0;
        await foreach (var line in lines.ReadAsync(cancellation))
        {
            count++;
            if (sample.Count < SampleLines)
            {
                sample.Add([.. columns.Select((_, at) => line.Field(at))]);
            }

            for (var at = 0; at < columns.Count; at++)
            {
                columns[at].Take(line.Field(at));
            }
        }

        if (count == 0)
        {
            throw new RefusedException(new Problem("File", "The file holds a heading and no lines.", "Export it again, and look whether it holds readings or people."));
        }

        return new FileLook
        {
            Path = path,
            FileName = fileName,
            Bytes = bytes,
            Lines = count,
            Separator = lines.Separator,
            Encoding = text.Encoding,
            EncodingNotice = text.Notice,
            Columns = columns,
            Sample = sample,
        };
    }

    /// <summary>The answer to a file that is too large.</summary>
    public static RefusedException TooLarge(long bytes, ImportLimits limits) => new(new Problem("File",
        $"The file has {Megabytes(bytes)} MB; up to {Megabytes(limits.LargestFile)} MB are taken.",
        "Split it into smaller files, each with the heading line."));

    private static long Megabytes(long bytes) => (long)Math.Ceiling(bytes / (1024.0 * 1024));

    private static async Task<FileText> DetectAsync(string path, CancellationToken cancellation)
    {
        await using var file = File.OpenRead(path);
        return await FileText.DetectAsync(file, cancellation);
    }
}
