using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// The page of one list: its candidates, which of them is chosen, and writing it to a file. What the disk is needed for is done in
/// the background.
/// </summary>
/// <param name="desk">Where the lists are kept; null where there are none.</param>
/// <param name="reading">Reads, takes off and writes.</param>
/// <param name="replacements">What may replace the parts of a candidate; null where there are no lists.</param>
/// <param name="quantity">What a candidate costs over the number of boards; null where there are no lists.</param>
internal sealed class ShortlistPage(
    IShortlistDesk? desk, LatestWork? reading, ReplacementsPage? replacements, QuantityPage? quantity)
{
    private ImmutableArray<string> _names = [];
    private bool _replaces;
    private int? _leaving;

    /// <summary>Raised when it looks different without a key, with a line to show; null for none.</summary>
    public event Action<string?>? Changed;

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>Whether it is being read or written.</summary>
    public bool IsReading => reading is { IsRunning: true };

    /// <summary>The name of the list.</summary>
    public string Name { get; private set; } = "";

    /// <summary>Its candidates.</summary>
    public ImmutableArray<ShortlistReview> Candidates { get; private set; } = [];

    /// <summary>Number of the chosen one, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The chosen candidate; null where the list is empty.</summary>
    public ShortlistReview? Chosen => Candidates.IsEmpty ? null : Candidates[At];

    /// <summary>Which list of how many; empty before that is known.</summary>
    public string Position =>
        _names.IndexOf(Name) is >= 0 and int at ? FormattableString.Invariant($"list {at + 1} of {_names.Length}") : "";

    /// <summary>The file that is asked for; null where none is.</summary>
    public AskedFields? Asking { get; private set; }

    /// <summary>Where the words about the chosen candidate are scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>What may replace the parts of the chosen candidate; null where it is not open.</summary>
    public ReplacementsPage? Replacements => replacements is { IsOpen: true } ? replacements : null;

    /// <summary>What the chosen candidate costs over the number of boards; null where it is not open.</summary>
    public QuantityPage? Quantity => quantity is { IsOpen: true } ? quantity : null;

    /// <summary>Opens it.</summary>
    /// <param name="list">The list to show; where it is not there, the first one.</param>
    public void Open(string list)
    {
        (IsOpen, Name, Candidates) = (true, list, []);
        Read(null, null);
    }

    /// <summary>Reads it anew where it is open.</summary>
    /// <param name="list">The list that has changed.</param>
    public void Refresh(string list)
    {
        if (IsOpen && (list == Name || _names.IsEmpty))
        {
            Read(null, null);
        }
    }

    /// <summary>Ends what is being read.</summary>
    public void Stop() => reading?.Stop();

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        int? leaving = _leaving;
        _leaving = null;
        if (Asking is not null)
        {
            notice = PressInFile(key, Asking);
            return true;
        }

        if (Replacements is not null || Quantity is not null)
        {
            notice = null;
            return Replacements?.Press(key) ?? Quantity!.Press(key);
        }

        notice = key switch
        {
            { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } => Close(),
            { Name: KeyName.Letter, Letter: 'l' } => Close(),
            { Name: KeyName.Up } => Move(-1),
            { Name: KeyName.Down } => Move(1),
            { Name: KeyName.Home } => Move(-Candidates.Length),
            { Name: KeyName.End } => Move(Candidates.Length),
            { Name: KeyName.Left } => Turn(-1),
            { Name: KeyName.Right } => Turn(1),
            { Name: KeyName.Delete } => Remove(leaving),
            { Name: KeyName.Letter, Letter: 'x' } when Chosen is not null => AskFile(),
            { Name: KeyName.Letter, Letter: 'r' } => Study(replacements!.Open),
            { Name: KeyName.Letter, Letter: 'b' } => Study(quantity!.Open),
            _ => null,
        };
        return (key.Name is KeyName.PageUp or KeyName.PageDown && Scroll.Press(key))
            || key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    // Reads the names of all lists and the candidates of this one, after something that is to be done before.
    private void Read(Func<Problem?>? before, string? done)
    {
        string list = Name;
        reading!.Start(stop => Look(list, before, stop), look =>
        {
            if (!look.IsOk)
            {
                IsOpen = !Candidates.IsEmpty;
                Changed?.Invoke("! " + look.Problem);
                return;
            }

            (_names, string name, Candidates) = look.Value;
            (At, Name) = (Math.Clamp(At, 0, Math.Max(0, Candidates.Length - 1)), name);
            Scroll.Reset();
            IsOpen &= !_names.IsEmpty;
            Changed?.Invoke(_names.IsEmpty ? "There is no list yet; s puts the chosen circuit on one." : done);
        });
    }

    private Result<(ImmutableArray<string> Names, string Name, ImmutableArray<ShortlistReview> Candidates)> Look(
        string list, Func<Problem?>? before, CancellationToken stop)
    {
        if (before?.Invoke() is { } problem)
        {
            return Result.Fail<(ImmutableArray<string>, string, ImmutableArray<ShortlistReview>)>(problem);
        }

        return desk!.Names().Then(names =>
        {
            string name = names.IsEmpty || names.Contains(list) ? list : names[0];
            return names.IsEmpty
                ? Result.Ok((names, name, ImmutableArray<ShortlistReview>.Empty))
                : desk.Read(name, stop).Map(candidates => (names, name, candidates));
        });
    }

    private string? Close()
    {
        Stop();
        IsOpen = false;
        At = 0;
        return null;
    }

    private string? Move(int step)
    {
        At = Math.Clamp(At + step, 0, Math.Max(0, Candidates.Length - 1));
        Scroll.Reset();
        return null;
    }

    private string? Turn(int step)
    {
        int at = _names.IndexOf(Name) + step;
        if (at >= 0 && at < _names.Length)
        {
            At = 0;
            Open(_names[at]);
        }

        return null;
    }

    private string? Remove(int? leaving)
    {
        if (Chosen is not { } chosen)
        {
            return null;
        }

        int number = chosen.Entry.Number;
        if (leaving != number)
        {
            _leaving = number;
            return FormattableString.Invariant($"Del once more takes candidate {number} off the list.");
        }

        string list = Name;
        Read(() => desk!.Remove(list, number), FormattableString.Invariant($"Candidate {number} was taken off."));
        return null;
    }

    private string? Study(Action<string, int> open)
    {
        if (Chosen is { } chosen)
        {
            open(Name, chosen.Entry.Number);
        }

        return null;
    }

    private string? AskFile()
    {
        string stem = new([.. Name.Select(sign => char.IsLetterOrDigit(sign) || sign is '-' or '_' or '.' ? sign : '-')]);
        Asking = new AskedFields(("file (.csv, .md or .html)", stem + ".html", 500));
        _replaces = false;
        return null;
    }

    private string? PressInFile(KeyPress key, AskedFields fields)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                Stop();
                Asking = null;
                return null;
            case KeyName.Enter:
                return Write(fields);
            default:
                _replaces = false;
                fields.Press(key);
                return null;
        }
    }

    // Whether a file is there is asked in the background too: it may be on a slow disk.
    private string? Write(AskedFields fields)
    {
        string path = fields.Fields[0].Text.Trim(), list = Name;
        bool replaces = _replaces;
        reading!.Start(
            stop => !replaces && desk!.IsThere(path) ? null : desk!.Export(list, path, replaces, stop),
            written =>
            {
                if (written is { IsOk: true })
                {
                    Asking = null;
                    Changed?.Invoke(written.Value + ".");
                    return;
                }

                _replaces = written is null;
                fields.Problem = written?.Problem?.ToString() ?? "It is there already: Enter once more replaces it, another name does not.";
                Changed?.Invoke(null);
            });
        return null;
    }
}
