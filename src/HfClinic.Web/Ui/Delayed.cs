namespace HfClinic.Web.Ui;

/// <summary>Runs something once things have been quiet for a while: many starts close together make one run.</summary>
public sealed class Delayed : IDisposable
{
    private readonly ITimer timer;
    private readonly TimeSpan quiet;

    /// <param name="run">Called on a timer thread; its own failures must be handled inside.</param>
    public Delayed(TimeProvider time, TimeSpan quiet, Func<Task> run)
    {
        this.quiet = quiet;
        timer = time.CreateTimer(_ => _ = run(), null, Timeout.InfiniteTimeSpan, Timeout.InfiniteTimeSpan);
    }

    /// <summary>Begins the wait, or begins it anew.</summary>
    public void Start() => timer.Change(quiet, Timeout.InfiniteTimeSpan);

    public void Dispose() => timer.Dispose();
}
