using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// Reads what may stand in a circuit, and analyses changed ones, in the background; what was analysed before is remembered.
/// </summary>
/// <param name="parts">The parts that are ranked.</param>
/// <param name="work">Does what takes long.</param>
internal sealed class SwapBench(IPartsSource parts, ScreenWork work)
{
    private readonly LatestWork _opening = new(work);
    private readonly LatestWork _trying = new(work);
    private readonly Lock _one = new();
    private readonly Dictionary<string, SwapTrial> _known = new(StringComparer.Ordinal);
    private Requirement? _wanted;
    private SwapDesk? _desk;
    private (string Key, ImmutableArray<SwapOption> Options) _last = ("", []);

    /// <summary>Raised on the screen's thread when the parts are read, or cannot be.</summary>
    public event Action? Opened;

    /// <summary>Whether the parts are read.</summary>
    public bool IsOpen => _desk is not null;

    /// <summary>Whether they are being read.</summary>
    public bool IsOpening => _opening.IsRunning;

    /// <summary>Whether a circuit is being analysed.</summary>
    public bool IsTrying => _trying.IsRunning;

    /// <summary>Why the parts cannot be read; null where they can.</summary>
    public string? Problem { get; private set; }

    /// <summary>Reads the parts for a requirement, unless they are there.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <returns>Whether they are there.</returns>
    public bool Open(Requirement requirement)
    {
        if (ReferenceEquals(_wanted, requirement) && (IsOpen || _opening.IsRunning))
        {
            return IsOpen;
        }

        Forget();
        _wanted = requirement;
        _opening.Start(stop => Read(requirement, stop), Take);
        return false;
    }

    /// <summary>Takes that the parts may be other ones.</summary>
    public void Forget()
    {
        Stop();
        _opening.Stop();
        (_wanted, _desk, _last) = (null, null, ("", []));
        _known.Clear();
    }

    /// <summary>Ends what is being analysed.</summary>
    public void Stop() => _trying.Stop();

    /// <summary>What may stand in a place, in order; none before the parts are read.</summary>
    /// <param name="place">The place.</param>
    /// <param name="board">The circuit.</param>
    public ImmutableArray<SwapOption> Options(SwapPlace place, BoardParts board)
    {
        if (_desk is null)
        {
            return [];
        }

        string key = place + " " + Key(board);
        if (_last.Key != key)
        {
            _last = (key, _desk.Options(place, board));
        }

        return _last.Options;
    }

    /// <summary>The changed circuits.</summary>
    /// <param name="changes">The changes.</param>
    /// <param name="before">The circuit before.</param>
    public ImmutableArray<BoardParts> Boards(SwapChanges changes, BoardParts before) => changes.Boards(before, _desk!.Support);

    /// <summary>Analyses changed circuits and takes the best.</summary>
    /// <param name="boards">The circuits.</param>
    /// <param name="ranking">The ranking that the circuit before is from.</param>
    /// <param name="take">Takes it, on the screen's thread; at once where it is known.</param>
    public void Try(ImmutableArray<BoardParts> boards, RankingResult ranking, Action<SwapTrial> take)
    {
        Stop();
        string key = string.Join(' ', boards.Select(Key).Append($"{ranking.CheapestCost}"));
        if (_known.TryGetValue(key, out SwapTrial? known))
        {
            take(known);
            return;
        }

        SwapDesk desk = _desk!;
        _trying.Start(
            stop =>
            {
                // What was overtaken by a later key gives way to it before it begins.
                lock (_one)
                {
                    return SwapTrial.Of(boards, desk.Requirement, desk.Market, ranking, stop);
                }
            },
            trial =>
            {
                _known[key] = trial;
                take(trial);
            });
    }

    private Result<SwapDesk> Read(Requirement requirement, CancellationToken stop)
    {
        try
        {
            return Result.Ok(new SwapDesk(requirement, parts.PartsFor(requirement, stop)));
        }
        catch (PartsUnreadableException unreadable)
        {
            return Result.Fail<SwapDesk>(unreadable.Problem);
        }
    }

    private void Take(Result<SwapDesk> read)
    {
        _desk = read.ValueOr(null!);
        Problem = read.Problem is { } problem ? "! " + problem : null;
        Opened?.Invoke();
    }

    private static string Key(BoardParts board) => CandidateId.Of(board.Choice) + "+" + board.Support.Feedback?.Id;
}
