using System.Text;

namespace HfClinic.Records.Exchange;

/// <summary>How a file's bytes are to be read as text.</summary>
/// <param name="Encoding">Null when the file's own byte order mark or plain UTF-8 decides.</param>
/// <param name="Notice">What the person should look at because of it; null when there is nothing to say.</param>
internal sealed record FileText(Encoding? Encoding, string? Notice)
{
    private const int ChunkSize = 64 * 1024;
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    private static readonly (byte[] Start, string What)[] OtherFiles =
    [
        ([0x50, 0x4B, 0x03, 0x04], "a spreadsheet or a packed file"),
        ([0xD0, 0xCF, 0x11, 0xE0], "an old spreadsheet"),
        ([0x25, 0x50, 0x44, 0x46], "a PDF"),
        ([0x1F, 0x8B], "a packed file"),
        ([0x89, 0x50, 0x4E, 0x47], "a picture"),
        ([0xFF, 0xD8, 0xFF], "a picture"),
    ];

    /// <summary>Reads the whole stream once, in pieces, to tell its encoding.</summary>
    /// <exception cref="RefusedException">It is empty or no text.</exception>
    public static async Task<FileText> DetectAsync(Stream stream, CancellationToken cancellation)
    {
        var buffer = new byte[ChunkSize];
        var read = await stream.ReadAtLeastAsync(buffer, ChunkSize, throwOnEndOfStream: false, cancellation);
        if (read == 0)
        {
            throw Refused("The file is empty.", "Export it again, and look whether it holds lines.");
        }

        if (Array.Find(OtherFiles, other => buffer.AsSpan(0, read).StartsWith(other.Start)) is { What: { } what })
        {
            throw Refused($"The file is {what}, not a list of lines as text.", "Save it as CSV (comma or semicolon separated) and choose that file.");
        }

        if (StartsWithWideMark(buffer.AsSpan(0, read)))
        {
            return new(null, null);
        }

        if (WideWithoutMark(buffer.AsSpan(0, read)) is { } wide)
        {
            return new(wide, "The file is UTF-16 without its mark; look whether the letters below are right.");
        }

        return await NarrowAsync(stream, buffer, read, cancellation);
    }

    private static async Task<FileText> NarrowAsync(Stream stream, byte[] buffer, int read, CancellationToken cancellation)
    {
        var decoder = Strict.GetDecoder();
        var isUtf8 = true;
        while (read > 0)
        {
            if (buffer.AsSpan(0, read).Contains((byte)0))
            {
                throw Refused("The file is not text.", "Choose the CSV file that the scale's program exports.");
            }

            isUtf8 = isUtf8 && Fits(decoder, buffer.AsSpan(0, read));
            read = await stream.ReadAsync(buffer, cancellation);
        }

        return isUtf8 && Fits(decoder, [], flush: true)
            ? new(null, null)
            : new(CodePagesEncodingProvider.Instance.GetEncoding(1252),
                "The file is not UTF-8 and is read as Windows-1252; look whether accented letters below are right.");
    }

    private static bool Fits(Decoder decoder, ReadOnlySpan<byte> bytes, bool flush = false)
    {
        try
        {
            Span<char> characters = new char[bytes.Length + 4];
            decoder.GetChars(bytes, characters, flush);
            return true;
        }
        catch (DecoderFallbackException)
        {
            return false;
        }
    }

    private static bool StartsWithWideMark(ReadOnlySpan<byte> start) => start is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..];

    /// <summary>Plain western text in UTF-16 has a zero as every other byte.</summary>
    private static UnicodeEncoding? WideWithoutMark(ReadOnlySpan<byte> start)
    {
        var (even, odd) = (0, 0);
        for (var i = 0; i < start.Length; i++)
        {
            if (start[i] == 0)
            {
                _ = i % 2 == 0 ? even++ : odd++;
            }
        }

        var half = start.Length / 2;
        return odd > half * 0.7 && even < half * 0.05 ? new UnicodeEncoding(bigEndian: false, byteOrderMark: false)
            : even > half * 0.7 && odd < half * 0.05 ? new UnicodeEncoding(bigEndian: true, byteOrderMark: false)
            : null;
    }

    private static RefusedException Refused(string what, string mend) => new(new Problem("File", what, mend));
}
