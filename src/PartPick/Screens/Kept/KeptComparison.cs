using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// Kept requirements side by side: what differs, and the best circuit of each. Those that were not ranked yet are ranked in the
/// background, one after the other; leaving ends it.
/// </summary>
/// <param name="service">What ranks.</param>
/// <param name="work">Does what takes long.</param>
/// <param name="figures">What the rankings of this session found.</param>
internal sealed class KeptComparison(IRankingService service, ScreenWork work, RankedFigures figures)
{
    private readonly ScreenWork _work = work;
    private readonly LatestWork _ranking = new(work);

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>Raised when it begins to rank, and when it has ended.</summary>
    public event Action<bool>? Ranks;

    /// <summary>Raised with each exact answer.</summary>
    public event Action<RankingResult>? Ranked;

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>What stands side by side, from left to right.</summary>
    public ImmutableArray<KeptRow> Rows { get; private set; } = [];

    /// <summary>Number of the first one in sight, from zero.</summary>
    public int First { get; private set; }

    /// <summary>The one that is being ranked; null for none.</summary>
    public KeptRow? Current { get; private set; }

    /// <summary>How much of its combinations is covered, 0 to 1.</summary>
    public double Share { get; private set; }

    /// <summary>Why no more can be ranked; null where nothing is wrong.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Where it is scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>What was found for a row; null before.</summary>
    /// <param name="row">The row.</param>
    public RankedFigure? FigureOf(KeptRow row) => figures.Of(row.Requirement);

    /// <summary>Opens it.</summary>
    /// <param name="rows">What is to stand side by side.</param>
    public void Open(ImmutableArray<KeptRow> rows)
    {
        (IsOpen, Rows, First, Problem) = (true, rows, 0, null);
        Scroll.Reset();
        if (rows.Any(row => FigureOf(row) is null))
        {
            Ranks?.Invoke(true);
            Next();
        }
    }

    /// <summary>Closes it, and ends the ranking.</summary>
    public void Close()
    {
        bool ranked = _ranking.IsRunning;
        (IsOpen, Current) = (false, null);
        _ranking.Stop();
        if (ranked)
        {
            Ranks?.Invoke(false);
        }
    }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key)
    {
        switch (key)
        {
            case { Name: KeyName.Left }:
                First = Math.Max(0, First - 1);
                break;
            case { Name: KeyName.Right }:
                First = Math.Min(Math.Max(0, Rows.Length - 2), First + 1);
                break;
            case { Name: KeyName.Escape or KeyName.Backspace or KeyName.Enter } or { Letter: 'd' }:
                Close();
                break;
            default:
                Scroll.Press(key);
                break;
        }

        return key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private void Next()
    {
        if (Rows.FirstOrDefault(row => FigureOf(row) is null) is not { } row || Problem is not null)
        {
            Current = null;
            Ranks?.Invoke(false);
            return;
        }

        (Current, Share) = (row, 0);
        _ranking.Start(stop => Rank(row, stop), answer =>
        {
            Problem = answer.Problem;
            if (answer.IsOk)
            {
                RankingResult exact = answer.Value with { Requirement = row.Requirement, IsComplete = true };
                figures.Take(exact);
                Ranked?.Invoke(exact);
            }

            Next();
            Changed?.Invoke();
        });
    }

    private Result<RankingResult> Rank(KeptRow row, CancellationToken stop)
    {
        try
        {
            return Result.Ok(service.RankAsync(row.Requirement, new Reports(this, row), stop).GetAwaiter().GetResult());
        }
        catch (PartsUnreadableException unreadable)
        {
            return Result.Fail<RankingResult>(unreadable.Problem);
        }
    }

    private void Take(KeptRow row, RankingResult soFar)
    {
        if (ReferenceEquals(Current, row))
        {
            Share = soFar.Combinations > 0 ? Math.Clamp(soFar.Covered / soFar.Combinations, 0, 1) : 1;
            Changed?.Invoke();
        }
    }

    private sealed class Reports(KeptComparison owner, KeptRow row) : IProgress<RankingResult>
    {
        public void Report(RankingResult value) => owner._work.Post(() => owner.Take(row, value));
    }
}
