using System.Runtime.ExceptionServices;

namespace PartPick.Screens;

/// <summary>Does what takes long on threads of its own; what comes of it is taken where the screen's thread is.</summary>
/// <param name="post">Runs something on the screen's thread, never before it returns.</param>
public sealed class ScreenWork(Action<Action> post)
{
    private int _running;

    /// <summary>Whether nothing is being done.</summary>
    public bool IsIdle => Volatile.Read(ref _running) == 0;

    /// <summary>Runs something on the screen's thread; called from any thread.</summary>
    /// <param name="action">What is run.</param>
    public void Post(Action action) => post(action);

    /// <summary>Starts something.</summary>
    /// <param name="work">What is done, on another thread.</param>
    /// <param name="take">Takes what came of it, on the screen's thread; also where it was cancelled too late.</param>
    /// <param name="stopped">Is told, on the screen's thread, that it was cancelled.</param>
    /// <returns>Cancels it.</returns>
    public CancellationTokenSource Start<T>(Func<CancellationToken, T> work, Action<T> take, Action? stopped = null)
    {
        var stop = new CancellationTokenSource();
        Interlocked.Increment(ref _running);
        _ = RunAsync(work, take, stopped, stop.Token);
        return stop;
    }

    private async Task RunAsync<T>(Func<CancellationToken, T> work, Action<T> take, Action? stopped, CancellationToken cancellation)
    {
        try
        {
            // A ranking keeps the pool's threads busy; what a key asked for does not wait for one of them.
            T result = await Task.Factory.StartNew(
                () => work(cancellation), CancellationToken.None, TaskCreationOptions.LongRunning, TaskScheduler.Default)
                .ConfigureAwait(false);
            post(() => take(result));
        }
        catch (OperationCanceledException)
        {
            post(() => stopped?.Invoke());
        }
        catch (Exception error)
        {
            var caught = ExceptionDispatchInfo.Capture(error);
            post(caught.Throw);
        }
        finally
        {
            Interlocked.Decrement(ref _running);
        }
    }
}
