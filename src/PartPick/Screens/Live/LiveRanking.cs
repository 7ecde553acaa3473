using System.Runtime.ExceptionServices;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// Keeps one ranking running for the latest requirement. A new one ends the one before, and answers that come too late are
/// dropped. Everything but the ranking itself happens where the screen's thread is.
/// </summary>
public sealed class LiveRanking : IDisposable
{
    private readonly IRankingService _service;
    private readonly Action<Action> _post;
    private readonly TimeProvider _time;
    private CancellationTokenSource? _running;
    private int _number;

    /// <summary>Makes it, without starting anything.</summary>
    /// <param name="service">What ranks.</param>
    /// <param name="post">Runs something on the screen's thread.</param>
    /// <param name="time">The time, for pauses.</param>
    public LiveRanking(IRankingService service, Action<Action> post, TimeProvider time)
    {
        _service = service;
        _post = post;
        _time = time;
    }

    /// <summary>Raised on the screen's thread with every answer, best-so-far or complete.</summary>
    public event Action<RankingResult>? Answered;

    /// <summary>Raised on the screen's thread where the parts cannot be read.</summary>
    public event Action<Problem>? Failed;

    /// <summary>Whether the latest requirement still waits for its complete answer.</summary>
    public bool IsRunning { get; private set; }

    /// <summary>Starts over with a requirement. Called on the screen's thread.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="pause">How long to wait for something newer first.</param>
    public void Ask(Requirement requirement, TimeSpan pause)
    {
        Stop();
        _running = new CancellationTokenSource();
        IsRunning = true;
        _ = RunAsync(requirement, pause, ++_number, _running.Token);
    }

    /// <summary>Ends the ranking that runs. Called on the screen's thread.</summary>
    public void Stop()
    {
        _number++;
        IsRunning = false;
        _running?.Cancel();
        _running?.Dispose();
        _running = null;
    }

    /// <inheritdoc/>
    public void Dispose() => Stop();

    private async Task RunAsync(Requirement requirement, TimeSpan pause, int number, CancellationToken cancellation)
    {
        try
        {
            if (pause > TimeSpan.Zero)
            {
                await Task.Delay(pause, _time, cancellation).ConfigureAwait(false);
            }

            var progress = new Reports(result => _post(() => Take(result, number)));
            RankingResult answer = await _service.RankAsync(requirement, progress, cancellation).ConfigureAwait(false);
            _post(() => Take(answer, number));
        }
        catch (OperationCanceledException)
        {
            // Something newer has been asked.
        }
        catch (PartsUnreadableException unreadable)
        {
            _post(() => Fail(unreadable.Problem, number));
        }
        catch (Exception error)
        {
            var caught = ExceptionDispatchInfo.Capture(error);
            _post(() =>
            {
                if (number == _number)
                {
                    caught.Throw();
                }
            });
        }
    }

    private void Take(RankingResult result, int number)
    {
        if (number != _number)
        {
            return;
        }

        IsRunning = !result.IsComplete;
        Answered?.Invoke(result);
    }

    private void Fail(Problem problem, int number)
    {
        if (number == _number)
        {
            IsRunning = false;
            Failed?.Invoke(problem);
        }
    }

    private sealed class Reports(Action<RankingResult> take) : IProgress<RankingResult>
    {
        public void Report(RankingResult value) => take(value);
    }
}
