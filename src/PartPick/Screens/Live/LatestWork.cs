namespace PartPick.Screens;

/// <summary>One piece of work in the background at a time: a new one ends the one before, and what comes of that is dropped.</summary>
/// <param name="work">Does the work.</param>
internal sealed class LatestWork(ScreenWork work)
{
    private CancellationTokenSource? _running;

    /// <summary>Whether something is being done.</summary>
    public bool IsRunning => _running is not null;

    /// <summary>Starts something.</summary>
    /// <param name="what">What is done, on another thread.</param>
    /// <param name="take">Takes what came of it, on the screen's thread, unless it was ended before.</param>
    public void Start<T>(Func<CancellationToken, T> what, Action<T> take)
    {
        Stop();
        CancellationTokenSource? own = null;
        own = work.Start(what, result =>
        {
            if (_running == own)
            {
                _running = null;
                take(result);
            }
        });
        _running = own;
    }

    /// <summary>Ends what is being done.</summary>
    public void Stop()
    {
        _running?.Cancel();
        _running = null;
    }
}
