namespace PartPick.Screens;

/// <summary>
/// Lets the toolkit's loop rest until there is something to do: by itself it looks for keys all the time, which costs a processor that
/// others want, and answers a key only when it looks the next time.
/// </summary>
internal sealed class LoopPace
{
    private static readonly TimeSpan Calm = TimeSpan.FromMilliseconds(100);
    private static readonly TimeSpan Lively = TimeSpan.FromMilliseconds(10);

    // A lone Esc is held back for 50 ms, since it may begin the sequence of another key.
    private static readonly TimeSpan AfterKeys = TimeSpan.FromMilliseconds(150);

    /// <summary>How long a stop may take to begin.</summary>
    public static readonly TimeSpan UntilStopped = TimeSpan.FromMilliseconds(300);

    private readonly object _lock = new();
    private bool _something;
    private long _lastKeys;

    /// <summary>Ends the rest; called from any thread.</summary>
    public void Wake()
    {
        lock (_lock)
        {
            _something = true;
            Monitor.Pulse(_lock);
        }
    }

    /// <summary>Ends the rest since keys came, and keeps rests short for a moment; called from any thread.</summary>
    public void WakeForKeys()
    {
        Volatile.Write(ref _lastKeys, TimeProvider.System.GetTimestamp());
        Wake();
    }

    /// <summary>Waits until there is something to do, but not for long.</summary>
    public void Rest()
    {
        lock (_lock)
        {
            if (!_something)
            {
                Monitor.Wait(_lock, TimeProvider.System.GetElapsedTime(Volatile.Read(ref _lastKeys)) < AfterKeys ? Lively : Calm);
            }

            _something = false;
        }
    }
}
