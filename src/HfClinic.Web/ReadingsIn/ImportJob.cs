using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.Exchange;

namespace HfClinic.Web.ReadingsIn;

/// <summary>One file waiting to be read in or under way. It goes on when the page is left.</summary>
public sealed class ImportJob(Actor actor, FileLook look, FileMapping mapping) : IProgress<ImportProgress>, IDisposable
{
    private readonly CancellationTokenSource stop = new();

    /// <summary>Raised on the working thread at each step.</summary>
    public event Action? Changed;

    public Actor Actor => actor;

    public FileLook Look => look;

    public FileMapping Mapping => mapping;

    /// <summary>The latest step; null while waiting.</summary>
    public ImportProgress? Progress { get; private set; }

    /// <summary>The number of the reading-in, once it ended with a report.</summary>
    public long? FinishedAs { get; private set; }

    /// <summary>Why it could not be read to its end; null when it was, or is not yet.</summary>
    public Problem? Failure { get; private set; }

    public bool IsStopping => stop.IsCancellationRequested;

    internal CancellationToken Stopped => stop.Token;

    /// <summary>Asks it to stop after the lines under way.</summary>
    public void Stop()
    {
        stop.Cancel();
        Changed?.Invoke();
    }

    public void Report(ImportProgress value)
    {
        Progress = value;
        Changed?.Invoke();
    }

    public void Dispose() => stop.Dispose();

    internal void Finish(long importId)
    {
        FinishedAs = importId;
        Changed?.Invoke();
    }

    internal void Fail(Problem problem)
    {
        Failure = problem;
        Changed?.Invoke();
    }
}
