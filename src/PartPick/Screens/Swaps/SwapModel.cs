using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>
/// The open circuit, and what was changed in it: the arrows choose a part and step its value. The figures are computed in the
/// background; the last ones stay until the new ones are there. Changes are kept when the circuit is left.
/// </summary>
internal sealed class SwapModel
{
    private readonly SwapBench? _bench;
    private readonly Dictionary<string, SwapChanges> _kept = new(StringComparer.Ordinal);
    private readonly Queue<KeyPress> _waiting = [];
    private RankingResult? _ranking;
    private SwapTrial? _trial;

    /// <summary>Without parts to put in.</summary>
    public SwapModel()
    {
    }

    /// <summary>With parts to put in.</summary>
    /// <param name="parts">The parts that are ranked.</param>
    /// <param name="work">Computes.</param>
    public SwapModel(IPartsSource parts, ScreenWork work)
    {
        _bench = new SwapBench(parts, work);
        _bench.Opened += GoOn;
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>The circuit as it was ranked; null before one was opened.</summary>
    public Candidate? Ranked { get; private set; }

    /// <summary>
    /// The circuit whose figures are the last ones: the changed one, or the ranked one. What may be put in is specified over the
    /// supply, so that every changed circuit has figures.
    /// </summary>
    public Candidate? Shown => _trial?.Candidate ?? Ranked;

    /// <summary>The parts as they were ranked.</summary>
    public BoardParts? Before { get; private set; }

    /// <summary>The parts as they are now; what the figures of a change decide is known only when they are there.</summary>
    public BoardParts? Board { get; private set; }

    /// <summary>The places that can be changed.</summary>
    public ImmutableArray<SwapPlace> Places => Board is null ? [] : SwapPlaces.Of(Board.Choice);

    /// <summary>Number of the chosen place, from zero.</summary>
    public int At { get; private set; }

    /// <summary>What may stand in the chosen place, in order; none before the parts are read.</summary>
    public ImmutableArray<SwapOption> Options => Board is null ? [] : _bench?.Options(Places[At], Board) ?? [];

    /// <summary>Whether something is changed.</summary>
    public bool IsChanged => !Changes.IsEmpty;

    /// <summary>Whether the figures are still the last ones.</summary>
    public bool IsComputing => _waiting.Count > 0 || _bench is { IsTrying: true } || (IsChanged && _bench is { IsOpening: true });

    /// <summary>Why nothing can be changed; null where it can.</summary>
    public string? Problem => _bench?.Problem;

    private SwapChanges Changes => Ranked is null ? SwapChanges.None : _kept.GetValueOrDefault(Group(Ranked), SwapChanges.None);

    /// <summary>Shows a circuit of a ranking, with what was changed in it before.</summary>
    /// <param name="candidate">The circuit.</param>
    /// <param name="ranking">The ranking.</param>
    public void Show(Candidate candidate, RankingResult ranking)
    {
        bool other = Ranked is null || !CandidateList.SameGroup(Ranked, candidate);
        (Ranked, _ranking, Before) = (candidate, ranking, BoardParts.Of(candidate));
        Keep(Changes.In(Before));
        if (other)
        {
            (At, _trial, Board) = (0, null, Before);
            _waiting.Clear();
        }

        if (_bench is not null && _bench.Open(ranking.Requirement))
        {
            Compute();
        }
    }

    /// <summary>Whether something was changed in a circuit, open or not.</summary>
    /// <param name="candidate">The circuit as it was ranked.</param>
    public bool IsKept(Candidate candidate) => _kept.ContainsKey(Group(candidate));

    /// <summary>Takes that the parts may be other ones.</summary>
    public void Forget() => _bench?.Forget();

    /// <summary>Ends what is being computed.</summary>
    public void Stop() => _bench?.Stop();

    /// <summary>What there is to say when the circuit is left; null for nothing.</summary>
    public string? Leave() => IsChanged ? "The changed circuit is kept, marked with *: Enter shows it again." : null;

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether the key was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        notice = null;
        switch (key)
        {
            case { Name: KeyName.Up or KeyName.Down }:
                At = Math.Clamp(At + (key.Name == KeyName.Up ? -1 : 1), 0, Math.Max(0, Places.Length - 1));
                return true;
            case { Name: KeyName.Left or KeyName.Right or KeyName.Backspace or KeyName.Delete } or { Name: KeyName.Letter, Letter: '0' }:
                notice = Ranked is null || _bench is null ? "There are no parts to put in." : Change(key);
                return true;
            default:
                return false;
        }
    }

    private string? Change(KeyPress key)
    {
        // The keys that come before the parts are read are not lost.
        if (!_bench!.IsOpen)
        {
            _waiting.Enqueue(key);
            return Problem;
        }

        SwapPlace place = Places[At];
        switch (key.Name)
        {
            case KeyName.Delete when IsChanged:
                Keep(SwapChanges.None);
                break;
            case KeyName.Backspace when Board!.Words(place) != Before!.Words(place):
                Keep(Changes.Without(place));
                break;
            case KeyName.Backspace or KeyName.Delete:
                return key.Name == KeyName.Delete ? "All parts are as they were ranked." : "That part is as it was ranked.";
            case KeyName.Letter:
                return TakeOut();
            default:
                return Step(key.Name == KeyName.Left ? -1 : 1);
        }

        Compute();
        return null;
    }

    private string? TakeOut()
    {
        if (Options.FirstOrDefault(one => one.Parts is [null]) is not { } option)
        {
            return "The circuit needs a part there.";
        }

        Put(option);
        return null;
    }

    private string? Step(int step)
    {
        ImmutableArray<SwapOption> options = Options;
        int at = options.IndexOf(options.First(option => option.StandsIn(Board!)));
        if (at + step < 0 || at + step >= options.Length)
        {
            return options.Length == 1 ? "The catalogue has nothing else that may stand there."
                : $"{options[at].Words} is the {(step < 0 ? "first" : "last")} one that may stand there.";
        }

        Put(options[at + step]);
        return null;
    }

    private void Put(SwapOption option)
    {
        Keep(option.StandsIn(Before!) ? Changes.Without(option.Place) : Changes.With(option));
        Compute();
    }

    private void Compute()
    {
        ImmutableArray<BoardParts> boards = _bench!.Boards(Changes, Before!);
        Board = boards[0];
        At = Math.Min(At, Places.Length - 1);
        if (!IsChanged)
        {
            _bench.Stop();
            _trial = null;
            return;
        }

        _bench.Try(boards, _ranking!, trial =>
        {
            (_trial, Board) = (trial, trial.Board);
            Redraw?.Invoke();
        });
    }

    private void GoOn()
    {
        if (Ranked is not null && Problem is null)
        {
            Compute();
            while (_waiting.TryDequeue(out KeyPress key))
            {
                Change(key);
            }
        }

        _waiting.Clear();
        Redraw?.Invoke();
    }

    private void Keep(SwapChanges changes)
    {
        if (changes.IsEmpty)
        {
            _kept.Remove(Group(Ranked!));
        }
        else
        {
            _kept[Group(Ranked!)] = changes;
        }
    }

    private static string Group(Candidate candidate) => FormattableString.Invariant(
        $"{candidate.Choice.Circuit} {candidate.Choice.Crystal.Id} {candidate.Choice.Amplifier.Id} {candidate.Choice.Tap}");
}
