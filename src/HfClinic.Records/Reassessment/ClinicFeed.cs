namespace HfClinic.Records.Reassessment;

/// <summary>Tells open pages which patients changed. In this process; a subscriber that fails does not stop the others.</summary>
public sealed class ClinicFeed
{
    private readonly Lock gate = new();
    private readonly List<Action<IReadOnlySet<long>>> subscribers = [];

    /// <summary>Calls back with the identifiers of the patients that changed, on the thread that changed them: return quickly.</summary>
    /// <returns>Dispose it to stop.</returns>
    public IDisposable Subscribe(Action<IReadOnlySet<long>> onChange)
    {
        lock (gate)
        {
            subscribers.Add(onChange);
        }

        return new Subscription(this, onChange);
    }

    /// <summary>Tells every subscriber, after the change was committed.</summary>
    /// <exception cref="AggregateException">Some subscribers failed; all were called.</exception>
    public void Publish(IReadOnlySet<long> patients)
    {
        if (patients.Count == 0)
        {
            return;
        }

        Action<IReadOnlySet<long>>[] current;
        lock (gate)
        {
            current = [.. subscribers];
        }

        List<Exception>? failures = null;
        foreach (var subscriber in current)
        {
            try
            {
                subscriber(patients);
            }
            catch (Exception failure)
            {
                (failures ??= []).Add(failure);
            }
        }

        if (failures is not null)
        {
            throw new AggregateException(failures);
        }
    }

    private sealed class Subscription(ClinicFeed feed, Action<IReadOnlySet<long>> onChange) : IDisposable
    {
        public void Dispose()
        {
            lock (feed.gate)
            {
                feed.subscribers.Remove(onChange);
            }
        }
    }
}
