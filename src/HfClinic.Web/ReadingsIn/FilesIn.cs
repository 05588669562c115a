using System.Threading.Channels;
using HfClinic.Records.Access;
using HfClinic.Records.Exchange;
using HfClinic.Web.Hosting;

namespace HfClinic.Web.ReadingsIn;

/// <summary>
/// Files on their way into the record: received into the data folder, looked at, queued, removed when done. One is read in at a time.
/// </summary>
public sealed class FilesIn(DataFolder data, ImportLimits limits)
{
    private const int CopySize = 80 * 1024;

    private readonly Channel<ImportJob> queue = Channel.CreateUnbounded<ImportJob>();
    private readonly Lock gate = new();
    private readonly List<ImportJob> underWay = [];

    /// <summary>How large a file may be.</summary>
    public ImportLimits Limits => limits;

    /// <summary>Files waiting or being read in, oldest first.</summary>
    public IReadOnlyList<ImportJob> UnderWay
    {
        get
        {
            lock (gate)
            {
                return [.. underWay];
            }
        }
    }

    private string Folder => Path.Combine(data.Path, "files-in");

    /// <summary>Receives a file and looks at it. Nothing stays when it is refused.</summary>
    /// <param name="content">Its bytes, read to the end.</param>
    /// <param name="onReceived">Called with the bytes received so far.</param>
    /// <exception cref="HfClinic.Records.RefusedException">It is empty, too large, or no list of lines.</exception>
    public async Task<FileLook> ReceiveAsync(Stream content, string fileName, Action<long>? onReceived, CancellationToken cancellation)
    {
        Directory.CreateDirectory(Folder);
        var path = Path.Combine(Folder, $"{Guid.NewGuid():N}.csv");
        try
        {
            await using (var file = new FileStream(path, FileMode.CreateNew, FileAccess.Write, FileShare.None, CopySize, FileOptions.Asynchronous))
            {
                await CopyAsync(content, file, onReceived, cancellation);
            }

            return await FileLook.TakeAsync(path, fileName, limits, cancellation);
        }
        catch
        {
            File.Delete(path);
            throw;
        }
    }

    /// <summary>Removes a received file that is not read in after all.</summary>
    public static void Discard(FileLook look) => File.Delete(look.Path);

    /// <summary>Queues a received file. It is removed when it is done.</summary>
    public ImportJob Start(Actor actor, FileLook look, FileMapping mapping)
    {
        var job = new ImportJob(actor, look, mapping);
        lock (gate)
        {
            underWay.Add(job);
        }

        queue.Writer.TryWrite(job);
        return job;
    }

    internal IAsyncEnumerable<ImportJob> WaitingAsync(CancellationToken cancellation) => queue.Reader.ReadAllAsync(cancellation);

    internal void Remove(ImportJob job)
    {
        lock (gate)
        {
            underWay.Remove(job);
        }

        Discard(job.Look);
    }

    /// <summary>Removes files that a stopped program left behind a day ago or earlier; younger ones may belong to another one that is running.</summary>
    public void RemoveLeftovers(DateTime utcNow)
    {
        if (Directory.Exists(Folder))
        {
            foreach (var file in Directory.EnumerateFiles(Folder, "*.csv").Where(file => File.GetLastWriteTimeUtc(file) < utcNow.AddDays(-1)))
            {
                File.Delete(file);
            }
        }
    }

    private async Task CopyAsync(Stream content, FileStream file, Action<long>? onReceived, CancellationToken cancellation)
    {
        var buffer = new byte[CopySize];
        long received = 0;
        while (await content.ReadAsync(buffer, cancellation) is > 0 and var read)
        {
            received += read;
            if (received > limits.LargestFile)
            {
                throw FileLook.TooLarge(received, limits);
            }

            await file.WriteAsync(buffer.AsMemory(0, read), cancellation);
            onReceived?.Invoke(received);
        }
    }
}
