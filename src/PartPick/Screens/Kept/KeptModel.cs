using System.Collections.Immutable;
using PartPick.Requirements;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// The page of kept requirements: the sentence as it stands comes first, what is kept follows. What the disk is needed for is done in
/// the background.
/// </summary>
internal sealed class KeptModel
{
    private readonly KeptRequirementStore? _store;
    private readonly LatestWork? _work;
    private readonly HashSet<string> _marked = new(StringComparer.Ordinal);
    private KeptRequirements _kept = KeptRequirements.None;
    private KeptNaming? _naming;
    private (string Id, KeyName Key)? _confirming;

    /// <summary>Without any.</summary>
    public KeptModel()
    {
    }

    /// <summary>With a store.</summary>
    /// <param name="store">Where they are kept.</param>
    /// <param name="work">Does what takes long.</param>
    /// <param name="service">What ranks.</param>
    public KeptModel(KeptRequirementStore store, ScreenWork work, IRankingService service)
    {
        _store = store;
        _work = new LatestWork(work);
        Comparison = new KeptComparison(service, work, Figures);
        Comparison.Changed += () => Changed?.Invoke(null);
    }

    /// <summary>Raised when it looks different without a key, with a line to show; null for none.</summary>
    public event Action<string?>? Changed;

    /// <summary>Raised with a requirement that is to be the sentence.</summary>
    public event Action<Requirement>? Taken;

    /// <summary>Raised with the name under which the sentence as it stands was kept.</summary>
    public event Action<string>? Named;

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>Whether requirements can be kept at all.</summary>
    public bool CanKeep => _store is not null;

    /// <summary>Whether it is being read or written.</summary>
    public bool IsAtWork => _work is { IsRunning: true };

    /// <summary>What the rankings of this session found.</summary>
    public RankedFigures Figures { get; } = new();

    /// <summary>The comparison; null without a store.</summary>
    public KeptComparison? Comparison { get; }

    /// <summary>The sentence as it stands, then what is kept by name.</summary>
    public ImmutableArray<KeptRow> Rows { get; private set; } = [];

    /// <summary>Number of the chosen row, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The chosen row.</summary>
    public KeptRow Chosen => Rows[At];

    /// <summary>What cannot be read, a line each.</summary>
    public ImmutableArray<Problem> Problems => _kept.Problems;

    /// <summary>The name that is asked for; null where none is.</summary>
    public AskedFields? Asking => _naming?.Fields;

    /// <summary>What Enter does while a name is asked for.</summary>
    public string Enter => _naming?.Enter ?? "";

    /// <summary>The kept one that wants the same as the sentence, whatever its name; null where none does.</summary>
    public KeptRequirement? SameAsSentence =>
        _kept.Items.FirstOrDefault(each => RankedFigures.AreSame(each.Requirement, Rows[0].Requirement));

    /// <summary>Whether a row is marked for the comparison.</summary>
    /// <param name="row">The row.</param>
    public bool IsMarked(KeptRow row) => _marked.Contains(row.Kept?.Id ?? "");

    /// <summary>Opens the page.</summary>
    /// <param name="sentence">The sentence as it stands.</param>
    public void Open(Requirement sentence)
    {
        if (_store is null)
        {
            return;
        }

        (IsOpen, At, Rows) = (true, 0, [new KeptRow(sentence, null)]);
        _marked.Clear();
        Read(null, null);
    }

    /// <summary>Ends the comparison, as when the program is left.</summary>
    public void Stop() => Comparison?.Close();

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        notice = null;
        if (!IsOpen)
        {
            return false;
        }

        if (_naming is { } naming)
        {
            PressInName(key, naming);
            return true;
        }

        if (Comparison!.IsOpen)
        {
            return Comparison.Press(key);
        }

        (string, KeyName)? confirming = _confirming;
        _confirming = null;
        notice = key switch
        {
            { Name: KeyName.Escape or KeyName.Backspace } or { Letter: 'w' } => Close(),
            { Name: KeyName.Up } => Move(At - 1),
            { Name: KeyName.Down } => Move(At + 1),
            { Name: KeyName.Home or KeyName.PageUp } => Move(0),
            { Name: KeyName.End or KeyName.PageDown } => Move(Rows.Length),
            { Name: KeyName.Enter } => Take(confirming),
            { Name: KeyName.Delete } => Remove(confirming),
            { Letter: 'n' } => Name(Chosen.Kept is null ? NamingAim.Keep : NamingAim.Rename),
            { Letter: 'c' } => Name(Chosen.Kept is null ? NamingAim.Keep : NamingAim.Copy),
            { Letter: ' ' } => Mark(),
            { Letter: 'd' } => Compare(),
            _ => null,
        };
        return key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private string? Close()
    {
        IsOpen = false;
        return null;
    }

    private string? Move(int at)
    {
        At = Math.Clamp(at, 0, Rows.Length - 1);
        return null;
    }

    private string? Take((string Id, KeyName Key)? confirming)
    {
        if (Chosen.Kept is not { } kept)
        {
            return Close();
        }

        if (SameAsSentence is null && confirming != (kept.Id, KeyName.Enter))
        {
            _confirming = (kept.Id, KeyName.Enter);
            return "The sentence as it stands is not kept: Enter once more lets it go, n on it keeps it.";
        }

        IsOpen = false;
        Taken?.Invoke(kept.Requirement);
        return $"{kept.Name} is what is wanted now.";
    }

    private string? Remove((string Id, KeyName Key)? confirming)
    {
        if (Chosen.Kept is not { } kept)
        {
            return "The sentence as it stands cannot be taken away.";
        }

        if (confirming != (kept.Id, KeyName.Delete))
        {
            _confirming = (kept.Id, KeyName.Delete);
            return $"Del once more takes {kept.Name} away for good.";
        }

        Read(() => _store!.Remove(kept) is { } problem ? Result.Fail<string>(problem) : Result.Ok(""), $"{kept.Name} was taken away.");
        return null;
    }

    private string? Mark()
    {
        string id = Chosen.Kept?.Id ?? "";
        if (!_marked.Remove(id))
        {
            _marked.Add(id);
        }

        return Move(At + 1);
    }

    // The marked ones; with one alone, it and the sentence; with none, the chosen one and the sentence.
    private string? Compare()
    {
        KeptRow[] marked = [.. Rows.Where(IsMarked)];
        KeptRow other = marked.Length == 1 ? marked[0] : Chosen;
        KeptRow[] rows = marked.Length > 1 ? marked : other.Kept is null ? [other] : [Rows[0], other];
        if (rows.Length < 2)
        {
            return "Space marks those that are to stand side by side; two at least.";
        }

        Comparison!.Open([.. rows]);
        return null;
    }

    private string? Name(NamingAim aim)
    {
        _naming = new KeptNaming(aim, Chosen, _kept.Items);
        return null;
    }

    private void PressInName(KeyPress key, KeptNaming naming)
    {
        if (key.Name == KeyName.Escape)
        {
            _naming = null;
        }
        else if (naming.Press(key, _store!) is { } doing)
        {
            _naming = null;
            Read(() => doing.Work().Map(kept => kept.Id), doing.Said, naming);
        }
    }

    // Reads what is kept, after something that is to be done before and gives the row to choose.
    private void Read(Func<Result<string>>? before, string? done, KeptNaming? naming = null)
    {
        string chosen = Rows[At].Kept?.Id ?? "";
        _work!.Start(_ => (Did: before?.Invoke(), Kept: _store!.Read()), read =>
        {
            Problem? problem = read.Did?.Problem ?? read.Kept.Problem;
            _kept = read.Kept.ValueOr(_kept);
            if (problem is null && naming is { Aim: NamingAim.Keep })
            {
                Rows = [Rows[0] with { Requirement = Rows[0].Requirement with { Name = naming.Name } }];
                Named?.Invoke(naming.Name);
            }

            Rows = [Rows[0], .. _kept.Items.Select(kept => new KeptRow(kept.Requirement, kept))];
            At = IndexOf(problem is null && read.Did is { } did ? did.Value : chosen);
            _marked.RemoveWhere(id => id.Length > 0 && IndexOf(id) == 0);
            Refuse(problem, naming);
            Changed?.Invoke(problem is null ? done : naming is null ? "! " + problem : null);
        });
    }

    // A name that was refused is asked again.
    private void Refuse(Problem? problem, KeptNaming? naming)
    {
        if (problem is not null && naming is not null && IsOpen)
        {
            naming.Fields.Problem = problem.ToString();
            _naming = naming;
        }
    }

    private int IndexOf(string id) => Math.Max(0, Rows.Select(row => row.Kept?.Id).ToList().IndexOf(id));
}
